import { describe, expect, it } from 'vitest';
import * as Y from 'yjs';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { commands, type CommandName } from './commands/command-list';
import { TestEditor } from './testing/test-editor';

describe('placing parts', () => {
  it('gives the lowest free designator, snaps, and chooses what was placed', () => {
    new TestEditor().place('resistor', 3, 7).place('resistor', 100, 0).place('nmos', 200, 0)
      .expectRefs('R1', 'R2', 'Q1').expectSelected('Q1').expectSound();
  });

  it('works by keyboard alone: hold, turn, move, put down', () => {
    const test = new TestEditor().run('hold-part', { kind: 'resistor', at: { x: 100, y: 100 } });
    test.press('.', 'ArrowRight', 'ArrowRight', 'ArrowDown', 'Enter');
    expect(test.part('R1')).toMatchObject({ x: 120, y: 110, turn: 90 });
    expect(test.editor.state).toMatchObject({ tool: 'select', ghost: null });
  });

  it('follows the pointer and keeps another one in hand with Shift', () => {
    const test = new TestEditor().run('hold-part', { kind: 'capacitor' });
    test.pointerMove({ x: 42, y: 38 });
    expect(test.editor.state.ghost?.at).toEqual({ x: 40, y: 40 });
    test.click({ x: 42, y: 38 }, { shift: true }).click({ x: 200, y: 40 }).expectRefs('C1', 'C2');
    expect(test.editor.state.ghost).toBeNull();
  });

  it('stands in line with a wire that it is dropped on', () => {
    const test = new TestEditor().place('resistor', 0, 0).place('resistor', 200, 0).run('draw-wire', { from: { x: 30, y: 0 }, to: { x: 170, y: 0 } });
    test.place('fuse', 100, 0).expectNet('R1:2', 'F1:1').expectNet('F1:2', 'R2:1').expectSound();
    expect(test.sheet.wires).toHaveLength(2);
  });

  it('takes a line off again that a part in line leaves when it is deleted', () => {
    const test = new TestEditor().place('resistor', 0, 0).place('resistor', 200, 0).run('draw-wire', { from: { x: 30, y: 0 }, to: { x: 170, y: 0 } }).place('fuse', 100, 0);
    test.press('Delete').expectNet('R1:2').expectNet('R2:1').expectSound();
    expect(test.sheet.wires).toHaveLength(0);
  });
});

describe('designators', () => {
  it('are unique and refused with the next free one', () => {
    const test = new TestEditor().place('resistor', 0, 0).place('resistor', 0, 100);
    expect(test.editor.run('rename-part', { part: test.part('R2').id, ref: 'r1' })).toBe(false);
    expect(test.editor.state.message).toContain('R1 is taken. The next free one is R3.');
    test.run('rename-part', { part: test.part('R2').id, ref: 'R12' }).expectRefs('R1', 'R12');
  });

  it('are shared by the contacts of one plug, also when copied', () => {
    const test = new TestEditor().place('plug-contact', 0, 0).place('plug-contact', 0, 100);
    test.run('rename-part', { part: test.part('J2').id, ref: 'J1' }).expectRefs('J1', 'J1');
    test.press('Mod+A', 'Mod+C', 'Mod+V').expectRefs('J1', 'J1', 'J2', 'J2').expectSound();
  });
});

describe('values', () => {
  it('are set with their origin and refused out of bounds, the old value staying', () => {
    const test = new TestEditor(gateStage());
    test.run('set-facts', { part: 'R1', facts: { pmax: 0.5 } });
    expect(test.part('R1').facts.pmax).toBe(0.5);
    expect(test.part('R1').origins.pmax).toBeUndefined();
    expect(test.editor.run('set-facts', { part: 'Q1', facts: { vgs_max: 900 } })).toBe(false);
    expect(test.part('Q1').facts.vgs_max).toBe(20);
    expect(test.editor.state.message).toContain('at most 100 V');
  });
});

describe('history', () => {
  it('undoes and redoes one edit at a time, with the selection', () => {
    const test = new TestEditor(gateStage());
    const before = test.hashes;
    test.click('R1').press('Delete').expectSelected();
    test.press('Mod+Z').expectSelected('R1').expectSound();
    expect(test.hashes).toEqual(before);
    test.press('Mod+Shift+Z').expectSound();
    expect(test.sheet.parts.some((part) => part.ref === 'R1')).toBe(false);
  });

  it('never undoes what was loaded or what someone else did', () => {
    const mine = new TestEditor(gateStage());
    const theirs = new TestEditor(undefined, { doc: new Y.Doc(), idPrefix: 't' });
    mine.doc.on('update', (update: Uint8Array, origin: unknown) => origin !== 'remote' && Y.applyUpdate(theirs.doc, update, 'remote'));
    theirs.doc.on('update', (update: Uint8Array, origin: unknown) => origin !== 'remote' && Y.applyUpdate(mine.doc, update, 'remote'));
    Y.applyUpdate(theirs.doc, Y.encodeStateAsUpdate(mine.doc), 'remote');
    expect(mine.editor.state.canUndo).toBe(false);
    mine.click('R3').press('Delete');
    theirs.place('fuse', 600, 0);
    mine.press('Mod+Z');
    expect(mine.sheet).toEqual(theirs.sheet);
    expect(mine.sheet.parts.map((part) => part.ref)).toEqual(expect.arrayContaining(['R3', 'F1']));
    expect(theirs.editor.state.canUndo).toBe(true);
    theirs.press('Mod+Z');
    expect(mine.sheet.parts.some((part) => part.ref === 'F1')).toBe(false);
  });

  it('covers plan and scenarios', () => {
    const test = new TestEditor(gateStage());
    test.run('set-plan', { points: [{ name: 'Only', volts: 24, amps: 1, source: 'V1' }] });
    expect(test.sheet.holdPoints.map((point) => point.name)).toEqual(['Only']);
    test.press('Mod+Z');
    expect(test.sheet.holdPoints.map((point) => point.name)).toEqual(['15 V', '36 V']);
    expect(test.editor.run('set-plan', { points: [{ name: 'Bad', volts: -1, amps: 1 }] })).toBe(false);
  });
});

describe('a read-only sheet', () => {
  it('can be looked at and nothing else', () => {
    const test = new TestEditor(gateStage(), { readOnly: true });
    const before = test.hashes;
    test.click('R1').expectSelected('R1').press('Delete', '.', 'ArrowLeft', 'Mod+D', 'Mod+V').drag('R1', { x: 0, y: 0 });
    test.press('2').drag('R1:1', { x: 500, y: 500 }).press('3').click('R1:1').press('4').click({ x: 9, y: 9 });
    expect(test.hashes).toEqual(before);
    expect(test.editor.state.message).toContain('read-only');
  });
});

describe('commands', () => {
  it('have names of their own, keys of their own and never a bare letter', () => {
    const keys = (Object.keys(commands) as CommandName[]).flatMap((name) => {
      expect(commands[name].name).toBe(name);
      return commands[name].keys as readonly string[];
    });
    expect(new Set(keys).size).toBe(keys.length);
    expect(keys.filter((key) => /^(Shift\+)?[A-Za-z]$/.test(key))).toEqual([]);
  });

  it('stand on digits in strip order', () => {
    expect(['tool-select', 'tool-wire', 'tool-net-name', 'tool-note', 'tool-lift', 'tool-add'].map((name) => commands[name as 'tool-add'].keys[0])).toEqual(['1', '2', '3', '4', '5', '0']);
  });

  it('leave single keys alone when they are switched off', () => {
    const test = new TestEditor(gateStage()).click('R1');
    test.press('Mod+Shift+K', '.', '2');
    expect(test.part('R1').turn).toBe(90);
    expect(test.editor.state.tool).toBe('select');
    test.press('Mod+Shift+K', '.');
    expect(test.part('R1').turn).toBe(180);
  });

  it('show a lead lifted without an edit', () => {
    const test = new TestEditor().place('removable-lead', 0, 0);
    const before = test.hashes;
    test.press('5').click('W1');
    expect([...test.editor.state.lifted]).toEqual(['W1']);
    expect(test.hashes).toEqual(before);
    test.click('W1');
    expect(test.editor.state.lifted.size).toBe(0);
  });
});
