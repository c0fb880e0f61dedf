import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';

/** Role → part ids or net names that a finding is about. */
export type Target = Readonly<Record<string, readonly string[]>>;

/**
 * Identity of a finding between revisions: rule, its version and the sorted stable ids with their roles. Never text,
 * position or display name of a part. 32 hexadecimal digits.
 */
export function fingerprintOf(rule: string, version: number, target: Target): string {
  const roles = Object.keys(target).sort().map((role) => [role, [...target[role]!].sort()]);
  return bytesToHex(sha256(utf8ToBytes(JSON.stringify([rule, version, roles])))).slice(0, 32);
}
