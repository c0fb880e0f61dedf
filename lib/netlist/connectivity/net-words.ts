import type { Netlist } from '../netlist';

/**
 * A net as people know it: `0 V`, the name they gave it, or a pin on it; a plug's contact only where nothing else is. Said of
 * the part `of`, an unnamed net is called by a pin of another one, or `nothing` where there is none.
 */
export function netWords({ nets }: Pick<Netlist, 'nets'>, name: string, of?: string): string {
  if (name === '0') return '0 V';
  const net = nets.find((one) => one.name === name);
  if (!net || net.givenNames.length > 0) return name;
  const pins = net.pins.filter((pin) => of === undefined || !pin.startsWith(`${of}:`));
  return pins.find((pin) => !pin.includes('/')) ?? pins[0] ?? 'nothing';
}
