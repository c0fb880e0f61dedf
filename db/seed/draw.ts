import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import type { KindId } from '@/lib/netlist/kinds/kind-id';
import type { HoldPointRecord, PartRecord, Sheet, WireEnd } from '@/lib/document/records';
import { emptySheet } from '@/lib/document/write-sheet';

type Facts = PartRecord['facts'];
type Corner = readonly [x: number, y: number];

/** A part by hand: where its origin stands and what is known of it. `key` tells contacts of one plug apart. */
export interface DrawnPart {
  readonly key: string;
  readonly kind: KindId;
  readonly at: Corner;
  readonly facts?: Facts;
  readonly turn?: PartRecord['turn'];
  readonly mirror?: boolean;
  /** The key unless given; marks have none. */
  readonly ref?: string;
}

/** A wire: `R1:2` is a pin, `gate` a junction, pairs between them are corners. */
export type DrawnWire = readonly [from: string, ...middle: Corner[], to: string];

export interface Drawing {
  readonly title: string;
  readonly parts: readonly DrawnPart[];
  readonly junctions: Readonly<Record<string, Corner>>;
  readonly wires: readonly DrawnWire[];
  /** Ascending by volts; all of them raise the part `source`. */
  readonly plan: readonly { readonly name: string; readonly volts: number; readonly amps: number }[];
  readonly source: string;
}

const marks: ReadonlySet<KindId> = new Set(['zero-volt', 'net-name', 'note']);
/** Kinds whose facts come from a data sheet; what is known of the others somebody typed. */
const semiconductors: ReadonlySet<KindId> = new Set(['nmos', 'npn', 'diode', 'schottky', 'led']);

/** A sheet drawn by hand, with ids of its own. */
export function draw(drawing: Drawing, newId: () => string): Sheet {
  const partIds = new Map(drawing.parts.map(({ key }) => [key, newId()]));
  const junctionIds = new Map(Object.keys(drawing.junctions).map((name) => [name, newId()]));
  const idOf = (map: ReadonlyMap<string, string>, name: string): string => {
    const id = map.get(name);
    if (id === undefined) throw new Error(`The drawing has no ${name}.`);
    return id;
  };
  const endOf = (words: string): WireEnd => {
    const [part = '', pin] = words.split(':');
    return pin === undefined ? { at: 'junction', junction: idOf(junctionIds, part) } : { at: 'pin', part: idOf(partIds, part), pin };
  };
  return {
    ...emptySheet,
    title: drawing.title,
    parts: drawing.parts.map((part) => partRecord(part, idOf(partIds, part.key))),
    junctions: Object.entries(drawing.junctions).map(([name, [x, y]]) => ({ id: idOf(junctionIds, name), x, y })),
    wires: drawing.wires.map(([from, ...rest]) => ({
      id: newId(), a: endOf(from), b: endOf(rest.at(-1) as string),
      bends: (rest.slice(0, -1) as unknown as Corner[]).map(([x, y]): [number, number] => [x, y]),
    })),
    holdPoints: drawing.plan.map((point): HoldPointRecord => ({ id: newId(), source: idOf(partIds, drawing.source), ...point })),
  };
}

function partRecord({ key, kind, at: [x, y], facts = {}, turn = 0, mirror = false, ref }: DrawnPart, id: string): PartRecord {
  const origin = semiconductors.has(kind) ? 'data sheet' : 'typed';
  return {
    id, kind, x, y, turn, mirror, ref: marks.has(kind) ? '' : ref ?? key,
    facts: { ...kindOf(kind).defaults as Facts, ...facts },
    origins: Object.fromEntries(Object.keys(facts).map((fact) => [fact, origin])),
    leftOpen: [],
  };
}
