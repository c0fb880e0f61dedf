import type { LadderPoint } from '@/components/ladder/ladder-point';
import type { Sheet } from '@/lib/document/records';
import type { HoldPointInput } from '@/lib/schemas/hold-point';

interface SheetPlan {
  readonly points: readonly (LadderPoint & { readonly source?: string })[];
  readonly plan: readonly { readonly name: string; readonly volts: number; readonly amps: number }[];
}

const supplyRoles: ReadonlySet<unknown> = new Set(['supply', 'mains', 'battery']);

/**
 * The power-up plan as the ladder draws it, from the sheet once it is there, from what the server told until then. An AC
 * source's volts are rms; the scale shows √2 of them.
 */
export function planOfSheet(sheet: Sheet | null, told: readonly HoldPointInput[]): SheetPlan {
  if (!sheet) {
    const points = told.map(({ name, volts, amps }) => ({ name, volts, amps, peak: volts }));
    return { points, plan: points };
  }
  const sources = sheet.parts.filter((part) => part.kind === 'ac-mains' || supplyRoles.has(part.facts.role));
  const points = [...sheet.holdPoints].sort((a, b) => a.volts - b.volts).map(({ name, volts, amps, source }) => {
    const part = sheet.parts.find((one) => one.id === source) ?? (sources.length === 1 ? sources[0] : undefined);
    return { name, volts, amps, peak: part?.kind === 'ac-mains' ? volts * Math.SQRT2 : volts };
  });
  return { points, plan: points };
}
