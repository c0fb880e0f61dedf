import { describe, expect, it } from 'vitest';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { TestEditor } from './testing/test-editor';

/** R1 and R2 in line with a wire between them. */
const line = () => new TestEditor().place('resistor', 0, 0).place('resistor', 300, 0).run('draw-wire', { from: { x: 30, y: 0 }, to: { x: 270, y: 0 } });

describe('deleting', () => {
  it('lets a line run on where a test point or a name stood on it', () => {
    const test = line().place('test-point', 100, 0).run('name-net', { at: { x: 200, y: 0 }, name: 'SENSE' });
    expect(test.sheet.wires).toHaveLength(3);
    test.click('TP1').press('Delete').expectNet('R1:2', 'R2:1').expectSound();
    test.run('select-items', { ids: test.sheet.parts.filter((part) => part.kind === 'net-name').map((part) => part.id) }).press('Delete');
    test.expectNet('R1:2', 'R2:1').expectSound();
    expect(test.sheet.wires).toHaveLength(1);
    expect(test.sheet.junctions).toEqual([]);
  });

  it('keeps together what was joined through a pin that goes', () => {
    const test = line().place('capacitor', 130, 40, 90).run('draw-wire', { from: { x: 130, y: 10 }, to: { x: 130, y: 0 } });
    test.run('draw-wire', { from: { x: 130, y: 10 }, to: { x: 300, y: 60 } }).place('resistor', 330, 60);
    test.expectNet('R1:2', 'R2:1', 'C1:1', 'R3:1').click('C1').press('Delete');
    test.expectNet('R1:2', 'R2:1', 'R3:1').expectSound();
  });

  it('hands a wire on to another pin that stands at the same place', () => {
    const test = line().place('resistor', -60, 0).expectNet('R3:2', 'R1:1');
    test.place('resistor', 0, 100).run('draw-wire', { from: { x: -30, y: 100 }, to: { x: -30, y: 0 } });
    test.click('R1').press('Delete').expectNet('R3:2', 'R4:1').expectSound();
  });

  it('takes 0 V symbols and names along that stood on the pin alone', () => {
    const test = new TestEditor(gateStage()).click('R1').press('Delete').expectSound();
    expect(test.sheet.parts.map((part) => part.id)).not.toContain('Z3');
    expect(test.sheet.parts.map((part) => part.id)).toEqual(expect.arrayContaining(['N1', 'Z1', 'Z2', 'Z4']));
    test.expectNet('Q1:G', 'R3:2');
    expect(test.netOf('Q1:G')).toBe('GATE');
  });

  it('takes everything when everything is chosen, and gives it back', () => {
    const test = new TestEditor(gateStage());
    const before = test.hashes;
    test.press('Mod+A', 'Delete').expectSound();
    expect(test.sheet).toMatchObject({ parts: [], wires: [], junctions: [] });
    expect(test.sheet.holdPoints.every((point) => point.source === undefined)).toBe(true);
    expect(test.press('Mod+Z').hashes).toEqual(before);
  });
});
