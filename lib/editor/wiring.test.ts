import { describe, expect, it } from 'vitest';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { TestEditor } from './testing/test-editor';

const twoResistors = () => new TestEditor().place('resistor', 0, 0).place('resistor', 200, 100);

describe('drawing wires', () => {
  it('joins two pins by a drag, at right angles', () => {
    const test = twoResistors().press('2').drag('R1:2', 'R2:1').expectNet('R1:2', 'R2:1').expectSound();
    const path = wirePath(indexOf(test.sheet), test.sheet.wires[0]!);
    expect(path).toEqual([{ x: 30, y: 0 }, { x: 100, y: 0 }, { x: 100, y: 100 }, { x: 170, y: 100 }]);
  });

  it('joins by clicks and keeps the bends that were clicked', () => {
    const test = twoResistors().press('2').click('R1:2').click({ x: 60, y: 0 }).click({ x: 60, y: 140 });
    expect(test.editor.state.gesture).toMatchObject({ doing: 'wiring', from: 'R1:2' });
    test.click('R2:1').expectNet('R1:2', 'R2:1');
    expect(test.sheet.wires[0]?.bends).toEqual([[60, 0], [60, 140]]);
  });

  it('says what the wire would join', () => {
    const test = new TestEditor(gateStage()).press('2').click('V1:-').pointerMove('R1:1');
    expect(test.editor.state.gesture).toMatchObject({ doing: 'wiring', joins: 'GATE' });
  });

  it('works from a pin by dragging with the select tool', () => {
    twoResistors().drag('R1:2', 'R2:1').expectNet('R1:2', 'R2:1').expectSound();
  });

  it('makes a junction where it is dropped on a wire, none where it crosses', () => {
    const test = twoResistors().drag('R1:2', 'R2:1').place('resistor', 300, 0).press('2').drag('R3:1', { x: 100, y: 50 });
    test.expectNet('R1:2', 'R2:1', 'R3:1').expectSound();
    expect(test.sheet.junctions).toHaveLength(1);
    test.run('draw-wire', { from: { x: 60, y: -50 }, to: { x: 60, y: 60 } }).expectNet('R1:2', 'R2:1', 'R3:1').expectSound();
    test.run('join', { at: { x: 60, y: 0 } }).expectSound();
    expect(test.sheet.junctions.filter(({ x, y }) => x === 60 && y === 0)).toHaveLength(1);
  });

  it('ends loose on a double click and on Escape keeps what was laid', () => {
    const test = twoResistors().press('2').click('R1:2').click({ x: 80, y: 50 });
    test.editor.doublePress({ at: { x: 80, y: 50 } });
    expect(test.sheet.junctions).toMatchObject([{ x: 80, y: 50 }]);
    test.press('2').click('R2:2').click({ x: 300, y: 100 }).press('Escape').expectSound();
    expect(test.sheet.wires).toHaveLength(2);
    test.click('R2:2').press('Escape');
    expect(test.sheet.wires).toHaveLength(2);
  });

  it('is possible by keyboard: cursor and Enter', () => {
    const test = twoResistors();
    test.editor.pointerMove({ at: { x: 30, y: 0 } });
    test.press('2').click('R1:2').press(...Array<string>(14).fill('ArrowRight'), ...Array<string>(10).fill('ArrowDown'), 'Enter');
    test.expectNet('R1:2', 'R2:1').expectSound();
  });
});

describe('moving', () => {
  it('keeps connections and a person\'s bends', () => {
    const test = twoResistors().press('2').click('R1:2').click({ x: 60, y: 0 }).click({ x: 60, y: 100 }).click('R2:1').press('1');
    test.drag('R1', { x: 0, y: -40 }).expectNet('R1:2', 'R2:1').expectSound();
    expect(test.sheet.wires[0]?.bends).toEqual([[60, -40], [60, 100]]);
  });

  it('draws a wire between pins that touched', () => {
    const test = new TestEditor().place('resistor', 0, 0).place('resistor', 60, 0).expectNet('R1:2', 'R2:1');
    test.drag('R2', { x: 100, y: 40 }).expectNet('R1:2', 'R2:1').expectSound();
    expect(test.sheet.wires).toHaveLength(1);
    test.drag('R2', { x: 60, y: 0 }).expectNet('R1:2', 'R2:1');
    expect(test.sheet.wires).toHaveLength(0);
  });

  it('takes everything that is chosen along, with inner wires and junctions', () => {
    const test = new TestEditor(gateStage());
    const [before] = test.hashes;
    test.press('Mod+A').drag('Q1', { x: 400, y: 360 }).expectSound();
    expect(test.hashes[0]).toBe(before);
    expect(test.sheet.junctions).toContainEqual({ id: 'top', x: 420, y: 160 });
    test.press('.').expectSound();
    expect(test.hashes[0]).toBe(before);
    test.press('-').expectSound();
    expect(test.hashes[0]).toBe(before);
  });

  it('keeps what is joined when one part of a stage is turned, mirrored or nudged', () => {
    for (const ref of ['Q1', 'R1', 'R3', 'L1', 'D2', 'V1', 'G1']) {
      const test = new TestEditor(gateStage()).click(ref);
      const [before] = test.hashes;
      test.press('.').expectSound();
      expect([ref, test.hashes[0]]).toEqual([ref, before]);
    }
  });
});

describe('lines', () => {
  it('are shifted by a run and by a corner', () => {
    const test = twoResistors().drag('R1:2', 'R2:1');
    const wire = test.sheet.wires[0]!.id;
    test.click({ x: 100, y: 50 }).drag({ x: 100, y: 50 }, { x: 130, y: 50 }).expectSound();
    expect(test.sheet.wires[0]?.bends).toEqual([[130, 0], [130, 100]]);
    test.run('drag-line', { wire, corner: 1, to: { x: 90, y: 30 } }).expectNet('R1:2', 'R2:1').expectSound();
  });

  it('are cut into two loose ends', () => {
    const test = twoResistors().drag('R1:2', 'R2:1');
    test.run('split-wire', { wire: test.sheet.wires[0]!.id, at: { x: 100, y: 50 } }).expectNet('R1:2').expectNet('R2:1').expectSound();
    expect(test.sheet.junctions.map(({ y }) => y)).toEqual([40, 60]);
  });

  it('run on as one when the third wire at their junction goes', () => {
    const test = twoResistors().drag('R1:2', 'R2:1').place('resistor', 300, 0).press('2').drag('R3:1', { x: 100, y: 50 }).press('1').click('R3').press('Delete');
    expect(test.sheet.junctions).toEqual([]);
    expect(test.sheet.wires).toHaveLength(1);
    test.expectNet('R1:2', 'R2:1').expectSound();
  });
});

describe('net names', () => {
  it('join nets of equal names and are changed in place', () => {
    const test = twoResistors().press('3').click('R1:2');
    expect(test.editor.state.gesture).toMatchObject({ doing: 'asking', what: 'net-name', at: { x: 30, y: 0 } });
    test.run('name-net', { at: { x: 30, y: 0 }, name: ' SW ' }).run('name-net', { at: { x: 170, y: 100 }, name: 'SW' });
    expect(test.editor.state.gesture.doing).toBe('nothing');
    test.expectNet('R1:2', 'R2:1').expectSound();
    test.run('name-net', { at: { x: 170, y: 100 }, name: 'OTHER' }).expectNet('R2:1');
    expect(test.editor.run('name-net', { at: { x: 0, y: 0 }, name: '  ' })).toBe(false);
  });

  it('name the wire that they are put on', () => {
    const test = twoResistors().drag('R1:2', 'R2:1').run('name-net', { at: { x: 60, y: 0 }, name: 'SENSE' });
    expect(test.netOf('R2:1')).toBe('SENSE');
    test.expectSound();
  });

  it('take left-open marks and notes along as drawings only', () => {
    const test = new TestEditor(gateStage());
    const [before] = test.hashes;
    test.run('mark-open', { part: 'Q1', pin: 'D', open: true }).run('place-note', { at: { x: 500, y: 0 }, text: 'Keep the lead short' }).expectSound();
    expect(test.part('Q1').leftOpen).toEqual(['D']);
    expect(test.hashes[0]).toBe(before);
  });
});
