import type { NetlistPart } from '../netlist';
import { isYes, labelOf, quantityOf } from './part-facts';

/** How a two-pin part counts when a path is followed through it. */
export type EdgeNature =
  | 'resistor' | 'joint' | 'open' | 'coil' | 'capacitor' | 'junction' | 'source' | 'channel' | 'unknown';

const inductiveLoads = new Set(['motor', 'relay', 'solenoid', 'coil']);
const contactWords = new Set(['lamp', 'relay', 'switch', 'fuse', 'lead']);

export const isTransistor = (part: NetlistPart): boolean => isFet(part) || isBipolar(part);
export const isFet = (part: NetlistPart): boolean => part.kind === 'nmos' || part.kind === 'pmos';
export const isBipolar = (part: NetlistPart): boolean => part.kind === 'npn' || part.kind === 'pnp';
/** Turned on by light: its base is left open by nature. */
export const isOptical = (part: NetlistPart): boolean => isBipolar(part) && labelOf(part, 'kind') === 'opto-transistor';
/** Conducts with its upper terminal at the supply side: P-channel and PNP. */
export const isUpperPolarity = (part: NetlistPart): boolean => part.kind === 'pmos' || part.kind === 'pnp';

export const isVoltageSource = (part: NetlistPart): boolean =>
  part.kind === 'dc-source' || part.kind === 'dc-supply' || part.kind === 'signal-generator' || part.kind === 'ac-mains';

export const isDiode = (part: NetlistPart): boolean =>
  part.kind === 'diode' || part.kind === 'schottky' || part.kind === 'zener' || part.kind === 'led';

export const isCapacitor = (part: NetlistPart): boolean => part.kind === 'capacitor' || part.kind === 'polarised-capacitor';
export const isCoil = (part: NetlistPart): boolean => part.kind === 'inductor' || part.kind === 'air-core-coil';

/** A lead or plug contact that can be taken off by hand. */
export const isRemovable = (part: NetlistPart): boolean => part.kind === 'removable-lead' || part.kind === 'plug-contact';

/** Marked as a load: a part that does the work, no component of the driver. */
export const isLoad = (part: NetlistPart): boolean =>
  labelOf(part, 'load') !== undefined || ['lamp', 'relay', 'motor', 'heater'].includes(labelOf(part, 'kind') ?? '');

/** The inside of another part, never a part of its own. */
export const isInternal = (part: NetlistPart): boolean => part.facts.internal !== undefined && part.facts.internal !== false;

/** Stores current: a coil, or a load that has one. */
export function isInductive(part: NetlistPart): boolean {
  if (isYes(part, 'wire')) return false;
  if (labelOf(part, 'load') === 'heater' || labelOf(part, 'load') === 'lamp') return false;
  if (isCoil(part)) return true;
  return inductiveLoads.has(labelOf(part, 'load') ?? '') || ['relay', 'motor'].includes(labelOf(part, 'kind') ?? '');
}

/** A resistor in its own right: not a load, a wire, a contact or the inside of something. */
export function isOwnResistor(part: NetlistPart): boolean {
  if (part.kind !== 'resistor' || isLoad(part) || isInternal(part) || isYes(part, 'wire')) return false;
  return part.facts.contact === undefined && !contactWords.has(labelOf(part, 'kind') ?? '');
}

/** Closed as drawn. */
export const isClosed = (part: NetlistPart): boolean => isYes(part, 'closed_switch') || isYes(part, 'closed_contact');

/** How a two-pin part counts in a path, as drawn. */
export function natureOf(part: NetlistPart): EdgeNature {
  if (isVoltageSource(part)) return 'source';
  if (isDiode(part)) return 'junction';
  if (isCapacitor(part)) return 'capacitor';
  if (isCoil(part)) return 'coil';
  if (isRemovable(part) || part.kind === 'fuse') return 'joint';
  if (part.kind === 'switch') return isClosed(part) ? 'joint' : 'open';
  if (part.kind === 'resistor') return isYes(part, 'wire') ? 'joint' : 'resistor';
  return 'unknown';
}

/** Ohms of a part in a DC path: 0 for a joint, the winding's for a coil. Unknown values count as 0. */
export function ohmsOf(part: NetlistPart): number {
  if (part.kind === 'resistor') return Math.max(0, quantityOf(part, 'value') ?? 0);
  if (isCoil(part)) return quantityOf(part, 'dcr') ?? quantityOf(part, 'esr') ?? 0;
  return 0;
}
