import { type Algorithm, hash, verify } from '@node-rs/argon2';

/** argon2id with 19 MiB, 2 passes, 1 lane (the first of OWASP's equal choices, Password Storage Cheat Sheet). */
const options = { algorithm: 2 satisfies Algorithm.Argon2id as Algorithm, memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password.normalize('NFKC'), options);

let nobody: Promise<string> | undefined;

/**
 * True when `password` matches `stored`. Without an account pass undefined: the same work is done against a hash of
 * nobody's, so that the time taken does not tell whether an account exists.
 */
export async function passwordMatches(stored: string | undefined, password: string): Promise<boolean> {
  nobody ??= hashPassword('no account has this password');
  const matches = await verify(stored ?? await nobody, password.normalize('NFKC'));
  return stored !== undefined && matches;
}
