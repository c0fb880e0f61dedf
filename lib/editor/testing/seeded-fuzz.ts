import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import type { Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import { kindIds } from '@/lib/netlist/kinds/kind-id';
import type { TestEditor } from './test-editor';

/** Numbers from 0 to 1, the same for the same seed (mulberry32). */
export function seeded(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

/** Does one thing that a person might do, chosen by `random`; answers what it was, for the report of a failing seed. */
export function randomStep(test: TestEditor, random: () => number): string {
  const pick = <T>(list: readonly T[]): T | undefined => list[Math.floor(random() * list.length)];
  const somewhere = (): Point => ({ x: Math.floor(random() * 50) * 10, y: Math.floor(random() * 40) * 10 });
  const place = (): Point => {
    const { sheet } = test;
    const index = indexOf(sheet);
    const onWires = sheet.wires.flatMap((wire) => wirePath(index, wire));
    const choice = random();
    if (choice < 0.4) return pick(sheet.parts.flatMap(pinPlacesOf)) ?? somewhere();
    if (choice < 0.6) return pick(onWires) ?? somewhere();
    return somewhere();
  };
  const at = ({ x, y }: Point) => ({ x, y });
  const some = () => pick(test.sheet.parts)?.id ?? '';
  const steps: readonly (readonly [string, () => void])[] = [
    ['place', () => test.run('place-part', { kind: pick(kindIds.filter((kind) => kind !== 'box')) ?? 'resistor', at: somewhere(), turn: pick([0, 90, 180, 270] as const) ?? 0 })],
    ['wire', () => test.run('draw-wire', { from: at(place()), to: at(place()), bends: random() < 0.4 ? [somewhere()] : [] })],
    ['drag with a tool', () => test.press(pick(['1', '2']) ?? '1').drag(at(place()), at(place())).press('Escape', 'Escape', '1')],
    ['choose some', () => test.run('select-items', { ids: [some(), some(), pick(test.sheet.wires)?.id ?? ''] })],
    ['move', () => test.run('move', { dx: Math.floor(random() * 11 - 5) * 10, dy: Math.floor(random() * 11 - 5) * 10 })],
    ['nudge', () => test.press(pick(['ArrowLeft', 'ArrowRight', 'ArrowUp', 'ArrowDown']) ?? 'ArrowUp')],
    ['pose', () => test.press(pick(['.', ',', '-']) ?? '.')],
    ['delete', () => test.press('Delete')],
    ['copy', () => test.press('Mod+C', 'Mod+V')],
    ['duplicate', () => test.press('Mod+D')],
    ['name', () => test.run('name-net', { at: at(place()), name: pick(['GATE', 'SW', 'DRV']) ?? 'X' })],
    ['join', () => test.run('join', { at: at(place()) })],
    ['line', () => test.run('drag-line', { wire: pick(test.sheet.wires)?.id ?? '', segment: Math.floor(random() * 3), to: somewhere() })],
    ['cut', () => test.run('split-wire', { wire: pick(test.sheet.wires)?.id ?? '', at: at(place()) })],
    ['open', () => { const part = pick(test.sheet.parts); const pin = part && pinPlacesOf(part)[0]; if (part && pin) test.run('mark-open', { part: part.id, pin: pin.pin, open: random() < 0.5 }); }],
    ['undo', () => test.press('Mod+Z')],
    ['redo', () => test.press('Mod+Shift+Z')],
  ];
  const [name, step] = pick(steps) as (typeof steps)[number];
  step();
  return name;
}
