import type { NetlistPart } from '../netlist';

/** The net on a pin; '' when the part lacks it. */
export const netAt = (part: NetlistPart, pin: string): string => part.pins[pin] ?? '';

/** Terminals of a transistor by what they do: gate or base, source or emitter, drain or collector. */
export interface Terminals {
  readonly control: string;
  readonly reference: string;
  readonly output: string;
  readonly controlPin: string;
  readonly referencePin: string;
  readonly outputPin: string;
}

export function terminalsOf(part: NetlistPart): Terminals {
  const fet = part.kind === 'nmos' || part.kind === 'pmos';
  const [controlPin, referencePin, outputPin] = fet ? ['G', 'S', 'D'] as const : ['B', 'E', 'C'] as const;
  return {
    controlPin, referencePin, outputPin,
    control: netAt(part, controlPin), reference: netAt(part, referencePin), output: netAt(part, outputPin),
  };
}

const upperPins = ['+', 'L', 'A', '1'];

/** The two pins of a two-pin part, plus, line, anode or 1 first; null for parts with another number of pins. */
export function endsOf(part: NetlistPart): readonly [string, string] | null {
  const pins = Object.keys(part.pins);
  if (pins.length !== 2) return null;
  const first = pins.find((pin) => upperPins.includes(pin)) ?? pins[0]!;
  return [first, pins.find((pin) => pin !== first)!];
}

/** Nets of the two ends of a two-pin part, plus, line, anode or 1 first. */
export function endNets(part: NetlistPart): readonly [string, string] | null {
  const ends = endsOf(part);
  return ends ? [netAt(part, ends[0]), netAt(part, ends[1])] : null;
}
