import { isLoopbackHost } from './loopback';
import { environmentSchema, type EnvironmentVariables } from './schema';

/** The parsed environment, with what follows from it. */
export interface Environment extends EnvironmentVariables {
  /** True while PUBLIC_URL is a loopback address: demo people, the mailbox page and the local fakes exist only then. */
  readonly local: boolean;
  /** True when PUBLIC_URL is https: secure cookies and HSTS. */
  readonly secure: boolean;
}

/** Parses variables. Throws one Error that names every variable that is wrong and why; values are not repeated. */
export function parseEnvironment(variables: Readonly<Record<string, string | undefined>>): Environment {
  const parsed = environmentSchema.safeParse(variables);
  if (!parsed.success) {
    const lines = parsed.error.issues.map((issue) => `  ${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The environment cannot be used:\n${lines.join('\n')}`);
  }
  const address = new URL(parsed.data.PUBLIC_URL);
  return Object.freeze({ ...parsed.data, local: isLoopbackHost(address.hostname), secure: address.protocol === 'https:' });
}

let current: Environment | undefined;

/** The process's environment, parsed at the first call and never again. Throws as `parseEnvironment` does. */
export function environment(): Environment {
  current ??= parseEnvironment(process.env);
  return current;
}
