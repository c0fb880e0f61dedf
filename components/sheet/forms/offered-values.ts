import { neighbours, type SeriesName } from '@/lib/netlist/series/preferred-values';
import { headNumber } from '@/lib/netlist/quantity/typed-text';
import { prefixExponent } from '@/lib/netlist/quantity/prefix';

/** Number that was meant by what is typed, whatever unit follows: `33 kV` means 33,000. Null when there is none. */
function meantNumber(typed: string): number | null {
  const number = headNumber(typed.trim().replace(',', '.'));
  if (!('digits' in number)) return null;
  const exponent = prefixExponent(number.rest.trim().charAt(0)) ?? 0;
  const value = Number(number.digits) * 10 ** exponent;
  return Number.isFinite(value) && value > 0 ? value : null;
}

/** Up to three values of a series round what is typed, else round the value kept: below, at and above. */
export function offeredValues(typed: string, kept: unknown, series: SeriesName): readonly number[] {
  const value = meantNumber(typed) ?? (typeof kept === 'number' && kept > 0 ? kept : null);
  if (value === null) return [];
  const [below, above] = neighbours(value, series);
  if (below !== above) return [below, above];
  return [neighbours(below * 0.999, series)[0], below, neighbours(above * 1.001, series)[1]];
}
