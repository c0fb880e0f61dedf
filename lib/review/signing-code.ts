import type { ProblemCode } from '@/lib/errors/codes';

/** Requirements that refuse a sign-off; each has a problem code of the same name. */
const signingCodes = [
  'newer-revision', 'stale-hash', 'open-stop', 'objection', 'must-answer', 'rule-error', 'which-source',
] as const satisfies readonly ProblemCode[];
export type SigningCode = (typeof signingCodes)[number];

/** The code of a requirement that is not met. Throws on one that never refuses: that would be a fault of ours. */
export function signOffCode(requirement: string): SigningCode {
  const code = signingCodes.find((known) => known === requirement);
  if (!code) throw new Error(`Requirement ${requirement} has no code.`);
  return code;
}
