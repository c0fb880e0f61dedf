import { FlattenFault, flattenSubcircuit, type FlatElement } from '../../engine-deck/flatten';
import { isSimulated, writtenElement } from '../../engine-deck/written-element';
import { engineNumber } from '../../models/model-line';
import { ownCard } from '../../models/own-card';
import type { NetlistPart } from '../../netlist';
import type { EngineContext, EngineElements, KindEdge, KindEngine } from '../kind-engine';
import { drawnLevel } from '../engine-source-level';

/** A box that is not simulated lacks a kind: nothing else would say what it does. */
const notExamined = { missing: 'kind' };

/**
 * Boxes that are simulated as written: a current source, and a subcircuit. What a subcircuit joins inside is left to the
 * engine, so its pins count as joined in some state.
 */
export const boxEngine: KindEngine = {
  controlPins: [],
  edges(part) {
    const [first, ...others] = Object.keys(part.pins);
    if (first === undefined) return [];
    return others.map((pin): KindEdge => ({ from: first, to: pin, stiffness: part.facts.element === 'I' ? 'none' : 'soft' }));
  },
  elements(part, context) {
    return part.facts.element === 'I' ? currentSource(part, context) : subcircuit(part, context);
  },
};

function currentSource(part: NetlistPart, { name, node }: EngineContext): EngineElements | { readonly missing: string } {
  const [from, to] = Object.keys(part.pins);
  const amps = drawnLevel(part);
  if (from === undefined || to === undefined) return notExamined;
  if (amps === undefined) return { missing: 'value' };
  return {
    lines: [`I${name} ${node(from)} ${node(to)} ${engineNumber(amps)}`],
    currents: { [from]: [{ vector: `i(@i${name}[current])`, sign: 1 }] },
    assumed: [],
  };
}

/** A 0 V ammeter stands in every pin. */
function subcircuit(part: NetlistPart, { name, node, innerNode, library }: EngineContext): EngineElements | { readonly missing: string } {
  const pins = Object.keys(part.pins);
  const found = library.subcircuits.find((entry) => entry.name.toLowerCase() === part.model?.toLowerCase());
  if (found === undefined) return notExamined;
  const flat = flatOrNull(() => flattenSubcircuit(found, pins.map((pin) => `pin ${pin}`), library));
  if (flat === null || !flat.every(isSimulated)) return notExamined;

  const meters = pins.map((pin, index) => `V${name}q${index} ${node(pin)} ${innerNode(`pin ${pin}`)} 0`);
  const place = (inner: string): string => (inner === '0' ? '0' : innerNode(inner));
  return {
    lines: [...meters, ...flat.flatMap((element, index) => writtenElement(withOwnCard(element), `${name}q${index}`, place))],
    currents: Object.fromEntries(pins.map((pin, index) => [pin, [{ vector: `i(v${name}q${index})`, sign: 1 as const }]])),
    assumed: [],
  };
}

/** A card inside keeps its own temperature among models that stand for 25 °C. */
function withOwnCard(flat: FlatElement): FlatElement {
  return flat.card === undefined ? flat : { ...flat, card: { ...flat.card, ...ownCard(flat.card) } };
}

function flatOrNull(make: () => readonly FlatElement[]): readonly FlatElement[] | null {
  try {
    return make();
  } catch (fault) {
    if (fault instanceof FlattenFault) return null;
    throw fault;
  }
}
