import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import type { KindId } from '@/lib/netlist/kinds/kind-id';
import type { PartRecord, Sheet, WireEnd, WireRecord } from '../records';
import { emptySheet } from '../write-sheet';

/** A part at a place, with its kind's defaults; tests and the builder of the demo sheet use ids equal to designators. */
export function partAt(kind: KindId, ref: string, x: number, y: number, more: Partial<PartRecord> = {}): PartRecord {
  const facts = kindOf(kind).defaults as PartRecord['facts'];
  return { id: ref, ref, kind, x, y, turn: 0, mirror: false, facts, origins: {}, leftOpen: [], ...more };
}

/** `Q1:G` is a pin, anything else a junction. */
export function endOf(words: string): WireEnd {
  const [part, pin] = words.split(':');
  return part && pin ? { at: 'pin', part, pin } : { at: 'junction', junction: words };
}

export function wireOf(from: string, to: string, bends: WireRecord['bends'] = []): WireRecord {
  return { id: `${from} ${to}`, a: endOf(from), b: endOf(to), bends };
}

export function sheetOf(content: Partial<Sheet>): Sheet {
  return { ...emptySheet, ...content };
}
