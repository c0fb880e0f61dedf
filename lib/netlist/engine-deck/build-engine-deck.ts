import { bleedOhms, limitOf } from '../kinds/engine-source';
import type { Corner, CurrentProbe, EngineElements } from '../kinds/kind-engine';
import { kindOf } from '../kinds/kind-registry';
import { pinReference } from '../connectivity/pin-reference';
import { engineNumber } from '../models/model-line';
import type { Netlist, NetlistPart } from '../netlist';
import type { OperatingPoint, Refusal } from '../points/point';
import { precheck, type ControlPin } from '../precheck/precheck';
import { effectiveParts, type PartSettings } from './effective-part';
import { EngineNames } from './engine-names';
import type { PointRequest } from './engine-port';
import { leakageLine } from './gate-leakage';
import { runnableParts } from './runnable-parts';
import { saveLines } from './save-lines';

export interface DeckOptions {
  readonly settings: PartSettings;
  readonly corner: Corner;
  /** °C; 25 for models from ratings, 27 where a part brought a card of its own, unless given. */
  readonly ambient?: number;
  /** Adds the gate leakage of every transistor, into the gate (1) or out of it (-1). */
  readonly gateLeakage?: 1 | -1;
}

export interface EngineDeck {
  readonly request: PointRequest;
  decode(values: Readonly<Record<string, number>>): OperatingPoint;
  readonly names: EngineNames;
  readonly assumed: readonly { readonly part: string; readonly fact: string; readonly words: string }[];
  /** Gates and bases whose drive is for a run with leakage to decide. */
  readonly weakControls: readonly ControlPin[];
}

/** A supply counts as limited from this part of its limit on (docs/engine.md 3.5). */
const limitedFrom = 0.999;
const sheetTemperature = 25;
const cardTemperature = 27;
/**
 * ngspice's own 1e-3 stops early in a breakdown: 0.4 % off at a 30 V zener, 5e-7 with this. A tenth of it again leaves
 * some circuits of many switches without a solution that they have.
 */
const relativeTolerance = 1e-4;

interface PlacedPart {
  readonly part: NetlistPart;
  readonly elements: EngineElements;
}

/**
 * The deck of one operating point, or why there is none. Nets without a DC path to 0 V are left out with the parts on
 * them and have no volts; a floating gate, a ring of sources and a missing fact leave no run.
 */
export function buildEngineDeck(netlist: Netlist, options: DeckOptions): EngineDeck | Refusal {
  const parts = effectiveParts(netlist, options.settings);
  const checked = precheck(parts);
  const runnable = runnableParts(parts, checked);
  if ('code' in runnable) return runnable;

  const names = new EngineNames();
  const ambient = options.ambient ?? (runnable.some(({ model }) => model !== undefined) ? cardTemperature : sheetTemperature);
  const placed: PlacedPart[] = [];
  for (const [index, part] of runnable.entries()) {
    const elements = elementsOf(part, `p${index + 1}`, netlist, options, ambient, names);
    if ('missing' in elements) return missingFact(part, elements.missing);
    placed.push({ part, elements });
  }

  const liveNets = netlist.nets.map(({ name }) => name).filter((net) => net !== '0' && checked.liveNets.has(net));
  const vectors = [
    ...liveNets.map((net) => `v(${names.node(net)})`),
    ...new Set(placed.flatMap(({ elements }) => Object.values(elements.currents).flat().map(({ vector }) => vector))),
  ];
  const leakage = options.gateLeakage;
  return {
    names,
    assumed: placed.flatMap(({ part, elements }) => elements.assumed.map((entry) => ({ part: part.ref, ...entry }))),
    weakControls: checked.weakControls.filter(({ part }) => runnable.includes(part)),
    request: {
      analysis: 'op',
      vectors,
      lines: [
        `.options temp=${engineNumber(ambient)} tnom=${sheetTemperature} reltol=${relativeTolerance}`,
        ...placed.flatMap(({ elements }) => elements.lines),
        ...(leakage === undefined ? [] : placed.flatMap(({ part }, index) => leakageLine(part, `p${index + 1}`, leakage, names))),
        ...saveLines(vectors),
        '.op',
      ],
    },
    decode: (values) => decode(values, liveNets, placed, parts, names),
  };
}

function elementsOf(
  part: NetlistPart, name: string, netlist: Netlist, options: DeckOptions, ambient: number, names: EngineNames,
): EngineElements | { readonly missing: string } {
  return kindOf(part.kind).engine.elements(part, {
    corner: options.corner,
    ambient,
    setting: options.settings[part.id] ?? {},
    name,
    node: (pin) => names.node(part.pins[pin] ?? '0'),
    innerNode: (key) => names.node(`${name} ${key}`, `inside ${part.ref}`),
    card: netlist.models.find((card) => card.name.toLowerCase() === part.model?.toLowerCase()),
    library: netlist,
  });
}

function missingFact(part: NetlistPart, fact: string): Refusal {
  const words = part.kind === 'box' ? `${part.ref} stands as a box: it is not simulated` : `${part.ref} has no ${fact}`;
  return { code: 'missing-fact', words, nodes: [], parts: [part.ref] };
}

function decode(
  values: Readonly<Record<string, number>>, liveNets: readonly string[], placed: readonly PlacedPart[],
  parts: readonly NetlistPart[], names: EngineNames,
): OperatingPoint {
  const sum = (probe: CurrentProbe): number => probe.reduce((total, { vector, sign }) => total + sign * (values[vector] ?? 0), 0);
  const amps: Record<string, number> = {};
  for (const part of parts.filter(isOpenAtDc)) for (const pin of Object.keys(part.pins)) amps[pinReference(part, pin)] = 0;
  for (const { part, elements } of placed) {
    for (const [pin, probe] of Object.entries(elements.currents)) {
      const into = sum(probe);
      amps[pinReference(part, pin)] = into;
      const [other, ...more] = Object.keys(part.pins).filter((name) => name !== pin);
      if (other !== undefined && more.length === 0 && !(other in elements.currents)) amps[pinReference(part, other)] = -into;
    }
  }
  return {
    volts: { 0: 0, ...Object.fromEntries(liveNets.map((net) => [net, values[`v(${names.node(net)})`] ?? Number.NaN])) },
    amps,
    limited: placed.filter(({ part, elements }) => isLimited(part, elements, sum, (net) => (net === '0' ? 0 : values[`v(${names.node(net)})`] ?? 0))).map(({ part }) => part.ref),
  };
}

/** A capacitor or an open contact carries nothing, wherever it hangs; what else is left out of a run has no amps. */
function isOpenAtDc(part: NetlistPart): boolean {
  return part.kind !== 'box' && kindOf(part.kind).engine.edges(part).every(({ stiffness }) => stiffness === 'none');
}

/** What a limited source gives at its pin is its limit less what its own bleeder takes. */
function isLimited(part: NetlistPart, elements: EngineElements, sum: (probe: CurrentProbe) => number, volts: (net: string) => number): boolean {
  const limit = limitOf(part, {});
  const probe = Object.values(elements.currents)[0];
  const [plus, minus] = Object.values(part.pins);
  const bled = Math.abs(volts(plus ?? '0') - volts(minus ?? '0')) / bleedOhms;
  return limit !== undefined && probe !== undefined && Math.abs(sum(probe)) + bled > limitedFrom * limit;
}
