import { describe, expect, it } from 'vitest';
import type { RemedyEdit } from '@/lib/netlist/findings/finding';
import { partBoxOf, pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { boxesOverlap, growBox } from '@/lib/document/geometry/point';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { placeNetlist } from '@/lib/document/place/place-netlist';
import { netlistOf } from '@/lib/document/testing/netlist-builder';
import { TestEditor } from '../testing/test-editor';

const take = (test: TestEditor, ...edits: RemedyEdit[]) => test.run('take-change', { edits });

/** Pairs of bodies that lie on each other without being joined pin to pin. */
function overlaps(test: TestEditor): string[] {
  const bodies = test.sheet.parts.filter((part) => part.kind !== 'net-name');
  return bodies.flatMap((a, index) => bodies.slice(index + 1).filter((b) =>
    boxesOverlap(partBoxOf(a), partBoxOf(b)) && !pinPlacesOf(a).some((p) => pinPlacesOf(b).some((q) => p.x === q.x && p.y === q.y)),
  ).map((b) => `${a.ref} on ${b.ref}`));
}

/** The stage without its pull-down. */
function floating(): TestEditor {
  const test = new TestEditor(gateStage()).click('R1').press('Delete');
  test.click({ x: 230, y: 350 }).press('Delete');
  return test.expectNet('Q1:G', 'R3:2');
}

describe('taking a proposed change', () => {
  it('adds a pull-down near the gate, wired to GATE and 0 V, as one undoable edit', () => {
    const test = floating();
    const before = test.hashes;
    take(test, { edit: 'add part', kind: 'resistor', facts: { value: 22_000 }, pins: { 1: 'GATE', 2: '0' } });
    test.expectNet('Q1:G', 'R3:2', 'R1:1').expectSelected('R1').expectSound();
    expect(test.netOf('R1:2')).toBe('0');
    const [resistor, gate] = [test.part('R1'), test.at('Q1:G')];
    expect(Math.hypot(resistor.x - gate.x, resistor.y - gate.y)).toBeLessThan(150);
    expect(resistor.facts.value).toBe(22_000);
    expect(overlaps(test)).toEqual([]);
    expect(test.press('Mod+Z').hashes).toEqual(before);
  });

  it('hangs a pull-down straight from a pin on the gate\'s side, its 0 V below, apart from others and their words', () => {
    const test = floating();
    take(test, { edit: 'add part', kind: 'resistor', facts: { value: 22_000 }, pins: { 1: 'GATE', 2: '0' } });
    const top = test.at('R1:1');
    const wire = test.sheet.wires.find((one) => [one.a, one.b].some((end) => end.at === 'pin' && end.part === test.part('R1').id));
    expect(wire?.bends).toEqual([]);
    const zero = test.sheet.parts.find((part) => part.kind === 'zero-volt' && part.x === test.at('R1:2').x && part.y === test.at('R1:2').y);
    expect(zero?.turn).toBe(0);
    expect(top.x).toBe(test.at('R1:2').x);
    const near = test.sheet.parts.filter((part) => part !== zero && part.ref !== 'R1').map((part) => growBox(partBoxOf(part), 4));
    expect(near.filter((box) => boxesOverlap(box, partBoxOf(test.part('R1'))))).toEqual([]);
  });

  it('puts a diode across a coil, stripe to the supply', () => {
    const test = new TestEditor(gateStage()).click('D2').press('Delete');
    const [supply, low] = [test.netOf('L1:1')!, test.netOf('L1:2')!];
    take(test, { edit: 'add part', kind: 'schottky', facts: { vr_max: 600 }, pins: { K: supply, A: low } });
    test.expectNet('L1:1', 'V1:+', 'D1:K').expectNet('L1:2', 'Q1:D', 'D1:A').expectSound();
    expect(overlaps(test)).toEqual([]);
  });

  it('works on a sheet that was drawn from a deck', async () => {
    const test = new TestEditor(await placeNetlist(netlistOf(`
      V1 dc-source + VCC - 0 role=supply
      L1 air-core-coil 1 VCC 2 SW
      Q1 nmos G GATE D SW S 0
      G1 signal-generator + DRV - 0
      R3 resistor 1 DRV 2 GATE`)));
    take(test, { edit: 'add part', kind: 'resistor', facts: { value: 22_000 }, pins: { 1: 'GATE', 2: '0' } },
      { edit: 'add part', kind: 'diode', facts: {}, pins: { K: 'VCC', A: 'SW' } });
    test.expectNet('Q1:G', 'R3:2', 'R1:1').expectNet('L1:1', 'V1:+', 'D1:K').expectNet('L1:2', 'Q1:D', 'D1:A').expectSound();
    expect(overlaps(test)).toEqual([]);
  });

  it('moves a pin to another net and leaves the rest of its old net together', () => {
    const test = new TestEditor(gateStage());
    take(test, { edit: 'move pin', part: 'R1', pin: '1', net: test.netOf('R3:1')! });
    test.expectNet('R3:1', 'G1:+', 'R1:1').expectNet('Q1:G', 'R3:2').expectSound();
    take(test, { edit: 'move pin', part: 'L1', pin: '2', net: '0' });
    test.expectNet('D2:A', 'Q1:D').expectSound();
    expect(test.netOf('L1:2')).toBe('0');
  });

  it('turns a part round where it stands', () => {
    const test = new TestEditor(gateStage());
    const at = test.part('D2');
    take(test, { edit: 'swap pins', part: 'D2', pins: ['A', 'K'] });
    test.expectNet('L1:1', 'V1:+', 'D2:A').expectNet('L1:2', 'Q1:D', 'D2:K').expectSound();
    expect(test.part('D2')).toMatchObject({ x: at.x, y: at.y, turn: 90 });
  });

  it('swaps pins that do not lie opposite', () => {
    const test = new TestEditor(gateStage());
    take(test, { edit: 'swap pins', part: 'Q1', pins: ['D', 'S'] });
    test.expectNet('L1:2', 'D2:A', 'Q1:S').expectSound();
    expect(test.netOf('Q1:D')).toBe('0');
  });

  it('sets facts, renames, marks left open', () => {
    const test = new TestEditor(gateStage());
    take(test, { edit: 'set facts', part: 'R1', facts: { pmax: null, value: 33_000 } }, { edit: 'rename part', partId: 'R3', ref: 'R4' },
      { edit: 'leave open', part: 'Q1', pin: 'D' }, { edit: 'rename net', from: 'GATE', to: 'G' });
    expect(test.part('R1').facts).toEqual({ value: 33_000 });
    expect(test.part('Q1').leftOpen).toEqual(['D']);
    expect(test.netOf('Q1:G')).toBe('G');
    test.expectSound().expectNet('Q1:G', 'R1:1', 'R4:2');
  });

  it.each<[string, RemedyEdit, string]>([
    ['a part that went', { edit: 'set facts', part: 'R9', facts: {} }, 'R9 is no longer'],
    ['a net that went', { edit: 'add part', kind: 'resistor', facts: {}, pins: { 1: 'ELSEWHERE', 2: '0' } }, 'no longer has a net'],
    ['an unknown kind', { edit: 'add part', kind: 'flux', facts: {}, pins: {} }, 'no part of kind'],
    ['a pin that the kind lacks', { edit: 'add part', kind: 'resistor', facts: {}, pins: { Z: '0' } }, 'no pin Z'],
    ['a designator in use', { edit: 'rename part', partId: 'R3', ref: 'R1' }, 'R1 is taken'],
    ['a net name that went', { edit: 'rename net', from: 'X', to: 'Y' }, 'No net is called X'],
  ])('refuses whole, with words, for %s', (_, edit, words) => {
    const test = new TestEditor(gateStage());
    const before = test.hashes;
    take(test, { edit: 'set facts', part: 'R1', facts: { value: 1 } }, edit);
    expect(test.editor.state.message).toContain(words);
    expect(test.hashes).toEqual(before);
  });
});
