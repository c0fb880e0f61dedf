import { partRecordSchema, type PartRecord } from '../records';
import { gather, reasonOf, spread, type Codec } from './codec';

/** A part is a flat map: `ref`, `kind`, `x`, `y`, `turn`, `mirror`, `fact:<key>`, `origin:<key>`, `open:<pin>`, `param:<key>` and more. */
export const partCodec: Codec<PartRecord> = {
  toFlat(part) {
    const flat: Record<string, unknown> = {
      ref: part.ref, kind: part.kind, x: part.x, y: part.y, turn: part.turn, mirror: part.mirror,
      ...spread(part.facts, 'fact'),
      ...spread(part.origins, 'origin'),
      ...spread(Object.fromEntries(part.leftOpen.map((pin) => [pin, true])), 'open'),
      ...spread(part.params ?? {}, 'param'),
    };
    if (part.wave) flat.wave = part.wave;
    if (part.model !== undefined) flat.model = part.model;
    if (part.boxPins) flat.boxPins = part.boxPins;
    return flat as ReturnType<Codec<PartRecord>['toFlat']>;
  },
  fromFlat(id, flat) {
    const params = gather(flat, 'param');
    const parsed = partRecordSchema.safeParse({
      id, ref: flat.ref, kind: flat.kind, x: flat.x, y: flat.y, turn: flat.turn, mirror: flat.mirror,
      facts: gather(flat, 'fact'),
      origins: gather(flat, 'origin'),
      leftOpen: Object.entries(gather(flat, 'open')).filter(([, marked]) => marked === true).map(([pin]) => pin),
      ...(flat.wave === undefined ? {} : { wave: flat.wave }),
      ...(flat.model === undefined ? {} : { model: flat.model }),
      ...(flat.boxPins === undefined ? {} : { boxPins: flat.boxPins }),
      ...(Object.keys(params).length === 0 ? {} : { params }),
    });
    return parsed.success ? { ok: true, record: parsed.data } : { ok: false, reason: reasonOf(parsed.error) };
  },
};
