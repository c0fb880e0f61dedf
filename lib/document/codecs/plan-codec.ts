import { holdPointRecordSchema, scenarioRecordSchema, type HoldPointRecord, type ScenarioRecord } from '../records';
import type { FlatValue } from '../stored-sheet';
import { gather, reasonOf, type Codec } from './codec';

/** Source values stand under `volts:<part id>` and `amps:<part id>`. */
export const scenarioCodec: Codec<ScenarioRecord> = {
  toFlat(scenario) {
    const flat: Record<string, FlatValue> = { name: scenario.name, ambient: scenario.ambient };
    for (const [part, value] of Object.entries(scenario.values)) {
      if (value.volts !== undefined) flat[`volts:${part}`] = value.volts;
      if (value.amps !== undefined) flat[`amps:${part}`] = value.amps;
    }
    return flat;
  },
  fromFlat(id, flat) {
    const values: Record<string, { volts?: FlatValue; amps?: FlatValue }> = {};
    for (const [part, volts] of Object.entries(gather(flat, 'volts'))) values[part] = { ...values[part], volts };
    for (const [part, amps] of Object.entries(gather(flat, 'amps'))) values[part] = { ...values[part], amps };
    const parsed = scenarioRecordSchema.safeParse({ id, name: flat.name, ambient: flat.ambient, values });
    return parsed.success ? { ok: true, record: parsed.data } : { ok: false, reason: reasonOf(parsed.error) };
  },
};

export const holdPointCodec: Codec<HoldPointRecord> = {
  toFlat(point) {
    const flat: Record<string, FlatValue> = { name: point.name, volts: point.volts, amps: point.amps };
    if (point.scenario !== undefined) flat.scenario = point.scenario;
    if (point.source !== undefined) flat.source = point.source;
    return flat;
  },
  fromFlat(id, flat) {
    const parsed = holdPointRecordSchema.safeParse({
      id, name: flat.name, volts: flat.volts, amps: flat.amps,
      ...(flat.scenario === undefined ? {} : { scenario: flat.scenario }),
      ...(flat.source === undefined ? {} : { source: flat.source }),
    });
    return parsed.success ? { ok: true, record: parsed.data } : { ok: false, reason: reasonOf(parsed.error) };
  },
};
