import type { NetlistPart } from '../netlist';
import { isYes, labelOf, quantityOf } from './part-facts';
import { isVoltageSource } from './part-nature';

export type SourceRole = 'pin' | 'supply' | 'mains' | 'generator' | 'battery' | 'ground-return';

const byKind: Readonly<Record<string, SourceRole>> = {
  'signal-generator': 'generator', 'dc-supply': 'supply', 'ac-mains': 'mains',
};
const pinWords = new Set(['gpio', 'controller-pin', 'open-drain-gpio']);
const roles: ReadonlySet<string> = new Set(['pin', 'supply', 'mains', 'generator', 'battery', 'ground-return']);

/** Role of a source: its fact, else what its kind says; undefined where nobody said. */
export function roleOf(part: NetlistPart): SourceRole | undefined {
  const role = labelOf(part, 'role');
  if (role !== undefined && roles.has(role)) return role as SourceRole;
  if (pinWords.has(labelOf(part, 'kind') ?? '')) return 'pin';
  // A deck's source with a wave is read as a generator; nobody has said what it is for.
  return part.kind === 'signal-generator' && part.wave ? undefined : byKind[part.kind];
}

export const isMains = (part: NetlistPart): boolean => isVoltageSource(part) && (roleOf(part) === 'mains' || isYes(part, 'mains'));

/** A source whose stated value may rise by its own nature: +10 % decides like the stated value itself. */
export const hasBand = (part: NetlistPart): boolean => isMains(part) || roleOf(part) === 'battery' || roleOf(part) === 'generator';

/** Drawn as an alternating source: mains, or a sine without a control's role. */
export const isAlternating = (part: NetlistPart): boolean =>
  part.kind === 'ac-mains' || (part.wave?.shape === 'sin' && (part.wave.args[1] ?? 0) !== 0) || quantityOf(part, 'rms') !== undefined;

/** Volts rms of an alternating source; undefined when it states none. */
export function rmsOf(part: NetlistPart): number | undefined {
  const peak = quantityOf(part, 'peak') ?? (part.wave?.shape === 'sin' ? Math.abs(part.wave.args[1] ?? 0) : undefined);
  return quantityOf(part, 'rms') ?? (peak === undefined ? quantityOf(part, 'value') : peak / Math.SQRT2);
}
