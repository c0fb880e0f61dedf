import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import type { KindId } from '@/lib/netlist/kinds/kind-id';
import type { PartRecord, Sheet, WireEnd, WireRecord } from '../records';
import { emptySheet } from '../write-sheet';

/** A part at a place, with its kind's defaults; its id is the designator given, which marks do not show. */
export function partAt(kind: KindId, ref: string, x: number, y: number, more: Partial<PartRecord> = {}): PartRecord {
  const facts = kindOf(kind).defaults as PartRecord['facts'];
  return { id: ref, ref: kindOf(kind).letter === null ? '' : ref, kind, x, y, turn: 0, mirror: false, facts, origins: {}, leftOpen: [], ...more };
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
