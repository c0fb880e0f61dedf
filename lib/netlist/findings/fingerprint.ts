import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';

/** Role → part ids or net names that a finding is about. */
export type Target = Readonly<Record<string, readonly string[]>>;

/** Fingerprints worked out lately: a sheet that is edited asks for the same ones again and again. */
const known = new Map<string, string>();
const knownLimit = 20_000;

/** What a fingerprint is made of, as text: equal for equal rule, version and target, whatever the order of ids. */
export function targetKey(rule: string, version: number, target: Target): string {
  const roles = Object.keys(target).sort().map((role) => [role, [...target[role]!].sort()]);
  return JSON.stringify([rule, version, roles]);
}

/**
 * Identity of a finding between revisions, from its `targetKey`: rule, its version and the sorted stable ids with their
 * roles. Never text, position or display name of a part. 32 hexadecimal digits.
 */
export function fingerprintOf(key: string): string {
  const before = known.get(key);
  if (before !== undefined) return before;
  const fingerprint = bytesToHex(sha256(utf8ToBytes(key))).slice(0, 32);
  if (known.size >= knownLimit) known.clear();
  known.set(key, fingerprint);
  return fingerprint;
}
