import { engineNumber } from '../models/model-line';

/** Start values belong to transients; an operating point has none. */
const skipped = new Set(['ic', 'off']);

/** Instance parameters as the engine takes them, with a leading space each. */
export function engineParameters(params: Readonly<Record<string, number>> | undefined): string {
  return Object.entries(params ?? {})
    .filter(([key]) => /^[a-z][a-z0-9]*$/.test(key) && !skipped.has(key))
    .map(([key, value]) => ` ${key}=${engineNumber(value)}`)
    .join('');
}
