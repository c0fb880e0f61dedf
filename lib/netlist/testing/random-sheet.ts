import { pinEnd, type EndKey } from '../connectivity/end-key';
import type { DrawnPart, NetlistSource } from '../connectivity/netlist-source';
import { pinNames } from '../connectivity/pin-names';
import { factRegistry, isFactKey } from '../facts/fact-registry';
import { kindIds, type KindId } from '../kinds/kind-id';
import { kindOf } from '../kinds/kind-registry';
import type { FactValue } from '../netlist';
import type { SeededRandom } from './seeded-random';

const drawable = kindIds.filter((kind) => kind !== 'box' && kind !== 'note');
const netNames = ['GATE', 'gate', 'BUS+', '12 V rail', 'N1', 'GND', 'out', 'Ω-net', '325'];

function randomFacts(kind: KindId, random: SeededRandom): Record<string, FactValue> {
  if (kind === 'net-name') return { name: random.pick(netNames) };
  const facts: Record<string, FactValue> = {};
  for (const { fact } of kindOf(kind).fields) if (random.chance(0.4)) facts[fact] = randomFact(fact, random);
  if (random.chance(0.1)) facts.note = random.pick(['runs hot', 'second source = D2', '"quoted"']);
  return facts;
}

function randomFact(fact: string, random: SeededRandom): FactValue {
  const definition = isFactKey(fact) ? factRegistry[fact] : undefined;
  if (definition?.type === 'label') return random.pick(definition.choices ?? ['TO-220', 'two words', 'a=b', 'x"y', '12']);
  if (definition?.type === 'flag') return random.chance(0.5);
  if (definition?.type === 'range') return [1, 10];
  return Number((random.next() * 10 ** (random.below(6) - 3)).toPrecision(1 + random.below(5))) + 1e-6;
}

function randomPart(index: number, random: SeededRandom): DrawnPart {
  const kind = random.pick(drawable);
  const { letter } = kindOf(kind);
  const facts = randomFacts(kind, random);
  if (kind === 'plug-contact') facts.contact = String(index);
  if (kind === 'switch') facts.closed_switch = random.chance(0.5);
  return { id: `id${index}`, ref: letter === null ? '' : `${letter}${index}`, kind, facts, origins: {}, leftOpen: [] };
}

/** A sheet of `count` parts and marks joined at random, designators all different. Wiring makes no electrical sense. */
export function randomSheet(count: number, random: SeededRandom): NetlistSource {
  const parts = Array.from({ length: count }, (_, index) => randomPart(index, random));
  const ends = parts.flatMap((part) => pinNames(part).map((pin) => pinEnd(part.id, pin)));
  const joins = ends.filter(() => random.chance(0.6)).map((end): [EndKey, EndKey] => [end, random.pick(ends)]);
  return { title: 'Random sheet', parts, joins, scenarios: [], holdPoints: [], models: [], subcircuits: [] };
}
