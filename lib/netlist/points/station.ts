import type { Circuit } from '../circuit/circuit';
import { isAlternating, rmsOf, roleOf } from '../circuit/source-role';
import { isVoltageSource } from '../circuit/part-nature';
import { quantityOf } from '../circuit/part-facts';
import type { PartSetting } from '../kinds/kind-engine';
import type { HoldPoint, NetlistPart, Scenario } from '../netlist';

/** A place of the power-up plan, or the circuit as drawn, at which every state is examined. */
export interface Station {
  readonly holdPoint: string | null;
  readonly scenario: string | null;
  /** Volts of the power source: DC, or V rms of an alternating one. Null where no source could be told. */
  readonly volts: number | null;
  /** °C. */
  readonly ambient: number;
  readonly power: NetlistPart | null;
  /** By part id: scenario's values, then the hold point's. */
  readonly settings: Readonly<Record<string, PartSetting>>;
}

const roomTemperature = 25;

function scenarioSettings(circuit: Circuit, scenario: Scenario | undefined): Record<string, PartSetting> {
  const settings: Record<string, PartSetting> = {};
  for (const [ref, values] of Object.entries(scenario?.values ?? {})) {
    const part = circuit.partByRef(ref);
    if (part) settings[part.id] = values;
  }
  return settings;
}

const scenarioOf = (circuit: Circuit, name: string | undefined): Scenario | undefined =>
  circuit.netlist.scenarios.find((scenario) => scenario.name === name);

/** Stated volts of a source as drawn: DC, or V rms of an alternating one. */
export function drawnVolts(part: NetlistPart): number | undefined {
  return isAlternating(part) ? rmsOf(part) : quantityOf(part, 'value');
}

function holdPointStation(circuit: Circuit, point: HoldPoint): Station {
  const scenario = scenarioOf(circuit, point.scenario);
  const power = point.source === undefined ? planSource(circuit) : namedSource(circuit, point.source);
  const settings = scenarioSettings(circuit, scenario);
  if (power) settings[power.id] = { ...settings[power.id], volts: point.volts, amps: point.amps };
  return { holdPoint: point.name, scenario: point.scenario ?? null, volts: point.volts, ambient: scenario?.ambient ?? roomTemperature, power, settings };
}

/** The source that a plan names; null for a part that is none, whose volts nothing would follow. */
function namedSource(circuit: Circuit, ref: string): NetlistPart | null {
  const part = circuit.partByRef(ref);
  return part && isVoltageSource(part) ? part : null;
}

/** The source a plan raises when it names none: the only one whose role is supply or mains. */
function planSource({ netlist }: Circuit): NetlistPart | null {
  const marked = netlist.parts.filter((part) => isVoltageSource(part) && (roleOf(part) === 'supply' || roleOf(part) === 'mains'));
  return marked.length === 1 ? marked[0]! : null;
}

function drawnStation(circuit: Circuit, scenario: Scenario | undefined): Station {
  const { power } = circuit.sources;
  const settings = scenarioSettings(circuit, scenario);
  const volts = power ? settings[power.id]?.volts ?? drawnVolts(power) ?? null : null;
  return { holdPoint: null, scenario: scenario?.name ?? null, volts, ambient: scenario?.ambient ?? roomTemperature, power, settings };
}

/** What part of the plan is asked for; nothing means all of it. */
export interface PlanPart {
  readonly holdPoint?: string;
  readonly scenario?: string;
}

/** Places to examine, lowest volts first. Without a plan the circuit stands as drawn. */
export function stationsOf(circuit: Circuit, { holdPoint, scenario }: PlanPart = {}): readonly Station[] {
  const { holdPoints } = circuit.netlist;
  if (scenario !== undefined && holdPoint === undefined) return [drawnStation(circuit, scenarioOf(circuit, scenario))];
  const wanted = holdPoint === undefined ? holdPoints : holdPoints.filter((point) => point.name === holdPoint);
  if (wanted.length === 0) return [drawnStation(circuit, scenarioOf(circuit, scenario))];
  return [...wanted].sort((a, b) => a.volts - b.volts).map((point) => holdPointStation(circuit, point));
}
