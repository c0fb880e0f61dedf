import { expect, it } from 'vitest';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { TestEditor } from '../testing/test-editor';
import { joinedWords, spokenPart, spokenWire } from './part-spoken';

it('says what a part is and what it joins', () => {
  const stage = gateStage();
  const said = (ref: string) => spokenPart(stage, stage.parts.find((part) => part.id === ref)!).replaceAll('\u2009', ' ');
  expect(said('R1')).toBe('R1, 22 kΩ, from GATE to 0 V');
  expect(said('Q1')).toMatch(/^Q1, .*, G on GATE, D on D2:A, S on 0 V$/);
  expect(said('N1')).toBe('Net name GATE');
  expect(said('Z1')).toBe('0 V');
});

it('says once that a part is joined to nothing', () => {
  const test = new TestEditor().place('nmos', 0, 0).place('resistor', 200, 0);
  expect(spokenPart(test.sheet, test.part('Q1'))).toMatch(/^Q1, .*, joined to nothing$/);
  expect(joinedWords(test.sheet, test.part('R1'))).toBe('joined to nothing');
});

it('says which pins a wire joins', () => {
  expect(spokenWire(gateStage(), 'R3:2 gate')).toBe('Wire, net GATE: Q1:G, R3:2, R1:1');
});
