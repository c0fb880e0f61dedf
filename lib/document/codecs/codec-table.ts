import type { HoldPointRecord, JunctionRecord, PartRecord, ScenarioRecord, WireRecord } from '../records';
import type { CollectionName } from '../stored-sheet';
import type { Codec } from './codec';
import { partCodec } from './part-codec';
import { holdPointCodec, scenarioCodec } from './plan-codec';
import { junctionCodec, wireCodec } from './wire-codec';

export interface RecordOf {
  parts: PartRecord;
  wires: WireRecord;
  junctions: JunctionRecord;
  scenarios: ScenarioRecord;
  holdPoints: HoldPointRecord;
}

/** One codec for each collection of the stored sheet. */
export const codecs: { readonly [Name in CollectionName]: Codec<RecordOf[Name]> } = {
  parts: partCodec,
  wires: wireCodec,
  junctions: junctionCodec,
  scenarios: scenarioCodec,
  holdPoints: holdPointCodec,
};
