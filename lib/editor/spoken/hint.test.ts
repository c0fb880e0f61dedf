import { expect, it } from 'vitest';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { TestEditor } from '../testing/test-editor';
import { hoverWords, toolHint } from './hint';

it('says what the tool in hand waits for', () => {
  const test = new TestEditor(gateStage());
  const hint = () => toolHint(test.editor.state);
  expect(hint()).toBeNull();
  test.click('R1');
  expect(hint()).toBe('R1 selected: , . turn, - mirrors');
  test.press('2').click('R1:2');
  expect(hint()).toBe('Wire from R1:2: click or Enter bends, Esc ends');
  test.press('Escape', 'Mod+A');
  expect(hint()).toMatch(/^\d+ selected$/);
  test.run('hold-part', { kind: 'resistor' });
  expect(hint()).toContain('puts it down');
});

it('says what the pointer is over', () => {
  const test = new TestEditor(gateStage());
  const over = () => hoverWords(test.editor.state)?.replaceAll('\u2009', ' ');
  test.pointerMove('R1');
  expect(over()).toBe('R1, 22 kΩ, from GATE to 0 V');
  test.pointerMove({ x: 150, y: 40 });
  expect(over()).toBe('Unnamed net: D2:K, L1:1, V1:+');
  test.pointerMove({ x: 700, y: 700 });
  expect(over()).toBeUndefined();
});
