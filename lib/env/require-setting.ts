import { environment, type Environment } from './environment';

/** A setting that a process cannot run without. Throws an Error that names it when it is not set. */
export function requireSetting<K extends keyof Environment>(name: K): NonNullable<Environment[K]> {
  const value = environment()[name];
  if (value === undefined || value === null) throw new Error(`${name} is not set. \`npm start\` sets it; in production set it yourself (README.md, "Configuration").`);
  return value;
}
