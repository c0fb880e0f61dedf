import { junctionRecordSchema, wireRecordSchema, type JunctionRecord, type WireRecord } from '../records';
import { reasonOf, type Codec } from './codec';

/** Each end is one value, so that an end moved by one person and bends set by another both stay. */
export const wireCodec: Codec<WireRecord> = {
  toFlat: (wire) => ({ a: wire.a, b: wire.b, bends: wire.bends }),
  fromFlat(id, flat) {
    const parsed = wireRecordSchema.safeParse({ id, a: flat.a, b: flat.b, bends: flat.bends ?? [] });
    return parsed.success ? { ok: true, record: parsed.data } : { ok: false, reason: reasonOf(parsed.error) };
  },
};

export const junctionCodec: Codec<JunctionRecord> = {
  toFlat: (junction) => ({ x: junction.x, y: junction.y }),
  fromFlat(id, flat) {
    const parsed = junctionRecordSchema.safeParse({ id, x: flat.x, y: flat.y });
    return parsed.success ? { ok: true, record: parsed.data } : { ok: false, reason: reasonOf(parsed.error) };
  },
};
