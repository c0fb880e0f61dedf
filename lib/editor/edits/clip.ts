import { z } from 'zod';
import { junctionRecordSchema, partRecordSchema, wireRecordSchema, type PartRecord, type Sheet, type WireEnd } from '@/lib/document/records';
import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import { freeRef } from './designators';
import type { NewId } from './edit';
import { movedSet } from './moved-set';
import { tidyWiring } from './tidy-wiring';

export const clipSchema = z.object({
  holdoff: z.literal('clip'),
  parts: z.array(partRecordSchema).max(2_000), wires: z.array(wireRecordSchema).max(4_000), junctions: z.array(junctionRecordSchema).max(4_000),
});

/** A piece of a sheet, as it stands on the clipboard. */
export type Clip = z.infer<typeof clipSchema>;

/** The chosen parts with the wires among them; null when nothing that can be copied is chosen. */
export function copyItems(sheet: Sheet, ids: ReadonlySet<string>): Clip | null {
  const moved = movedSet(sheet, ids);
  const wires = sheet.wires.filter((wire) => moved.has(wire.a) && moved.has(wire.b));
  const parts = sheet.parts.filter((part) => moved.parts.has(part.id));
  const used = new Set(wires.flatMap((wire) => [wire.a, wire.b]).flatMap((end) => (end.at === 'junction' ? [end.junction] : [])));
  if (parts.length === 0 && wires.length === 0) return null;
  return { holdoff: 'clip', parts: [...parts], wires: [...wires], junctions: sheet.junctions.filter((junction) => used.has(junction.id)) };
}

/** Clipboard text as a clip; null when it is none. */
export function parseClip(text: string): Clip | null {
  try {
    const parsed = clipSchema.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

/** Puts a clip on the sheet, shifted, under new ids and free designators; contacts of one plug go on sharing theirs. */
export function pasteClip(sheet: Sheet, clip: Clip, dx: number, dy: number, newId: NewId): { readonly sheet: Sheet; readonly pasted: ReadonlySet<string> } {
  const ids = new Map<string, string>();
  for (const item of [...clip.parts, ...clip.wires, ...clip.junctions]) ids.set(item.id, newId());
  const fresh = (id: string) => ids.get(id) ?? id;
  const refs = new Map<string, string>();
  const taken: string[] = [];
  const refOf = (part: PartRecord): string => {
    if (part.kind !== 'box' && kindOf(part.kind).letter === null) return '';
    const shared = part.kind === 'plug-contact' ? refs.get(part.ref) : undefined;
    if (shared !== undefined) return shared;
    const ref = freeRef(sheet, part.kind, taken);
    taken.push(ref);
    refs.set(part.ref, ref);
    return ref;
  };
  const end = (old: WireEnd): WireEnd => (old.at === 'pin' ? { ...old, part: fresh(old.part) } : { ...old, junction: fresh(old.junction) });
  const parts = clip.parts.map((part) => ({ ...part, id: fresh(part.id), ref: refOf(part), x: part.x + dx, y: part.y + dy }));
  const wires = clip.wires.map((wire) => ({
    id: fresh(wire.id), a: end(wire.a), b: end(wire.b), bends: wire.bends.map(([x, y]): [number, number] => [x + dx, y + dy]),
  }));
  const junctions = clip.junctions.map((junction) => ({ ...junction, id: fresh(junction.id), x: junction.x + dx, y: junction.y + dy }));
  const whole = {
    ...sheet, parts: [...sheet.parts, ...parts], wires: [...sheet.wires, ...wires], junctions: [...sheet.junctions, ...junctions],
  };
  return { sheet: tidyWiring(whole), pasted: new Set([...parts, ...wires].map((item) => item.id)) };
}
