import type { Circuit } from '../circuit/circuit';
import { isAlternating } from '../circuit/source-role';
import { isVoltageSource } from '../circuit/part-nature';
import type { Corner, PartSetting } from '../kinds/kind-engine';
import { drivenStates, liftedStates, supplyOffStates, type Drive } from './drive-setting';
import type { Level, PointKey, Refusal } from './point';
import { drawnVolts, type Station } from './station';

/** One run that the rules need: its key and the part settings that make it. */
export interface PointSpec {
  readonly key: PointKey;
  readonly station: Station;
  /** °C of the scenario; undefined leaves the engine's own. */
  readonly ambient: number | undefined;
  readonly corner: Corner;
  /** By part id. */
  readonly settings: Readonly<Record<string, PartSetting>>;
  /** Why it cannot be run, told before any engine. */
  readonly refusal?: Refusal;
}

/** Top of the band of an alternating source: IEC 60038 gives ±10 % (`sources.md` 3). */
export const alternatingBandTop = 1.1;
const raised = 1.1;

type Settings = Readonly<Record<string, PartSetting>>;

function levelSettings(circuit: Circuit, station: Station, level: Level): Settings {
  const settings: Record<string, PartSetting> = { ...station.settings };
  const sign = level === 'peak -' ? -1 : 1;
  for (const part of circuit.sources.supplies) {
    const volts = settings[part.id]?.volts ?? drawnVolts(part);
    if (volts === undefined) continue;
    if (isAlternating(part)) settings[part.id] = { ...settings[part.id], volts: sign * Math.SQRT2 * volts * alternatingBandTop };
    else if (level === '+10 %' && (station.power === null || station.power.id === part.id)) settings[part.id] = { ...settings[part.id], volts: volts * raised };
  }
  return settings;
}

const hasAlternating = (circuit: Circuit): boolean => circuit.sources.supplies.some(isAlternating);

function merged(base: Settings, over: Settings): Settings {
  const result: Record<string, PartSetting> = { ...base };
  for (const [id, setting] of Object.entries(over)) result[id] = { ...result[id], ...setting };
  return result;
}

function whichSource(station: Station): Refusal | undefined {
  if (station.holdPoint === null || station.power) return undefined;
  return { code: 'which-source', words: `${station.holdPoint}: which source does the plan raise? Name it in the plan, or give one source the role supply or mains`, nodes: [], parts: [] };
}

function spec(circuit: Circuit, station: Station, level: Level, drive: Drive): PointSpec {
  const refusal = whichSource(station);
  return {
    key: {
      holdPoint: station.holdPoint, scenario: station.scenario, volts: station.volts, level, state: drive.state, corner: 'typ',
      ...(drive.control === undefined ? {} : { control: drive.control }),
    },
    station, ambient: station.scenario === null ? undefined : station.ambient, corner: 'typ',
    settings: merged(levelSettings(circuit, station, level), drive.settings),
    ...(refusal ? { refusal } : {}),
  };
}

/**
 * Runs that the rules need, as few as they need: driven states at the stated value and 10 % above (or at both peaks of
 * an alternating source), lifted and high-impedance states at the stated value. Thresholds are compared with data-sheet
 * corners by the rules themselves, so every run stands at the typical corner.
 */
export function planPoints(circuit: Circuit, stations: readonly Station[]): readonly PointSpec[] {
  if (!circuit.netlist.parts.some(isVoltageSource)) return [];
  const alternating = hasAlternating(circuit);
  const both: readonly Level[] = alternating ? ['peak +', 'peak -'] : ['nominal', '+10 %'];
  const stated: readonly Level[] = alternating ? both : ['nominal'];
  return stations.flatMap((station) => [
    ...both.flatMap((level) => drivenStates(circuit).map((drive) => spec(circuit, station, level, drive))),
    ...stated.flatMap((level) => [...liftedStates(circuit), ...supplyOffStates(circuit)].map((drive) => spec(circuit, station, level, drive))),
  ]);
}

/** The same run with the current limit of these supplies lifted: a limit never turns a fail into a pass. */
export function withoutLimit(point: PointSpec, supplies: readonly string[], circuit: Circuit): PointSpec {
  const lifted = Object.fromEntries(supplies.flatMap((ref) => circuit.partByRef(ref)?.id ?? []).map((id) => [id, { amps: null }]));
  return { ...point, key: { ...point.key, limitLifted: true }, settings: merged(point.settings, lifted) };
}
