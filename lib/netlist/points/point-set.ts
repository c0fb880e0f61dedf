import type { Circuit } from '../circuit/circuit';
import { quantityOf } from '../circuit/part-facts';
import { isFet, isUpperPolarity } from '../circuit/part-nature';
import { isSwitchedCoil } from '../circuit/stages';
import { hasBand } from '../circuit/source-role';
import type { OperatingPoint, PointKey, PointResult, Refusal } from './point';
import type { Station } from './station';

/** An operating point with what a rule needs to know of it. */
export interface RunPoint {
  readonly key: PointKey;
  readonly op: OperatingPoint;
  readonly station: Station;
  /** Decides stops: the stated value, or the top of a band that the source has by nature. */
  readonly stated: boolean;
  /** A stage driven at a frequency into a coil conducts statically here: currents and watts say nothing. */
  readonly staticOn: boolean;
}

export interface RefusedPoint {
  readonly key: PointKey;
  readonly refusal: Refusal;
  readonly station: Station;
}

/** Operating points of a circuit over plan, states and levels. */
export interface PointSet {
  readonly stations: readonly Station[];
  readonly ok: readonly RunPoint[];
  readonly refused: readonly RefusedPoint[];
  /** Points of one station, in planned order. */
  at(station: Station): readonly RunPoint[];
}

/** Volts of a net against 0 V. */
export const voltsOf = (point: RunPoint, net: string): number => (net === '0' ? 0 : point.op.volts[net] ?? NaN);

/** Gate or base volts above which a transistor conducts, where no threshold is given (common practice, no source). */
const assumedOn = { fet: 1, bipolar: 0.5 };

function staticOn(circuit: Circuit, volts: (net: string) => number): boolean {
  return circuit.stages.some((stage) => {
    if (!isSwitchedCoil(stage)) return false;
    const { transistor, terminals } = stage;
    const drive = (volts(terminals.control) - volts(terminals.reference)) * (isUpperPolarity(transistor) ? -1 : 1);
    const threshold = isFet(transistor)
      ? Math.abs(quantityOf(transistor, 'vth_min') ?? quantityOf(transistor, 'vth_typ') ?? assumedOn.fet) : assumedOn.bipolar;
    return drive > threshold;
  });
}

/** Pairs results with their stations. Results without numbers are kept as refused, with their reason. */
export function buildPointSet(circuit: Circuit, stations: readonly Station[], results: readonly { readonly station: Station; readonly result: PointResult }[]): PointSet {
  const ok: RunPoint[] = [];
  const refused: RefusedPoint[] = [];
  for (const { station, result } of results) {
    if (result.status === 'refused') refused.push({ key: result.key, refusal: result.refusal, station });
    else {
      const { key, op } = result;
      const rises = station.power !== null && hasBand(station.power);
      ok.push({ key, op, station, stated: key.level !== '+10 %' || rises, staticOn: staticOn(circuit, (net) => (net === '0' ? 0 : op.volts[net] ?? NaN)) });
    }
  }
  return { stations, ok, refused, at: (station) => ok.filter((point) => point.station === station) };
}

export const noPoints: PointSet = { stations: [], ok: [], refused: [], at: () => [] };
