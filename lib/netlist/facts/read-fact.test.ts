import { describe, expect, test } from 'vitest';
import { kindOf } from '../kinds/kind-registry';
import type { KindId } from '../kinds/kind-id';
import type { FactKey } from './fact-registry';
import { editableFact, factOfKind, formatFact, readFact } from './read-fact';

function reason(kind: KindId, key: FactKey, typed: string): string {
  const reading = readFact(kindOf(kind), key, typed);
  return reading.ok ? `read as ${String(reading.value)}` : reading.reason;
}

describe('readFact', () => {
  test.each<[KindId, FactKey, string, unknown]>([
    ['resistor', 'value', '4k7', 4_700], ['capacitor', 'value', '10n', 10e-9], ['dc-source', 'value', '-12 V', -12], ['fuse', 'value', '2A', 2],
    ['resistor', 'pmax', '0,25 W', 0.25], ['nmos', 'rds_on', '37 mΩ', 0.037], ['switch', 'closed_switch', 'Yes', true], ['ac-mains', 'fuse', '2 A', 2],
    ['ac-mains', 'fuse', 'no', false], ['nmos', 'part', ' IRF-like ', 'IRF-like'], ['resistor', 'range', '1k..10k', [1_000, 10_000]], ['pmos', 'vth_min', '-2', -2],
  ])('%s %s from %s', (kind, key, typed, value) => {
    expect(readFact(kindOf(kind), key, typed)).toEqual({ ok: true, value });
  });

  test.each<[KindId, FactKey, string, string]>([
    ['resistor', 'value', '33 kV', 'kV is a voltage; a resistor wants ohms: 33k, 33 kΩ or 33000.'],
    ['inductor', 'value', '10 V', 'V is a voltage; an inductor wants henries: 10u or 10 µH.'],
    ['dc-source', 'value', '10 A', 'A is a current; a DC source wants volts: 12, 12 V or 3V3.'],
    ['resistor', 'pmax', '-1', 'A power here cannot be negative; Power rating wants watts: 0.25, 0.25 W or 250 mW.'],
    ['fuse', 'value', '0', '0\u2009A is below what is possible here: at least 1\u2009mA.'],
    ['switch', 'closed_switch', 'maybe', 'Drawn closed wants yes or no.'],
    ['ac-mains', 'fuse', '2 V', 'Fused wants yes, no or a number with A. V is a voltage; Fused wants amps: 20m, 20 mA or 0.02.'],
    ['nmos', 'part', ' ', 'Part number is empty; type a word or leave the field out.'],
    ['nmos', 'part', 'x'.repeat(121), 'Part number takes at most 120 characters.'],
    ['nmos', 'part', 'a\nb', 'Part number is one line without control characters.'],
    ['resistor', 'range', '10k..1k', 'Range starts with the smaller value.'],
    ['resistor', 'range', '10k', 'Range wants two values: 1k..10k.'],
  ])('%s %s refuses %s', (kind, key, typed, words) => {
    expect(reason(kind, key, typed)).toBe(words);
  });
});

test('a note may have lines', () => {
  expect(readFact(kindOf('note'), 'text', 'one\ntwo')).toEqual({ ok: true, value: 'one\ntwo' });
});

test('printed and editable', () => {
  expect(formatFact(kindOf('resistor'), 'value', 4_700)).toBe('4.7\u2009kΩ');
  expect(editableFact(kindOf('resistor'), 'value', 1 / 3)).toBe('333.3333333333333\u2009mΩ');
  expect([true, false, 'red', [1, 1_000] as const].map((value) => formatFact(kindOf('led'), 'colour', value))).toEqual(['yes', 'no', 'red', '1..1000']);
});

test('the kind has the last word on label and bounds', () => {
  expect(factOfKind(kindOf('fuse'), 'value')).toMatchObject({ label: 'Rated current', unit: 'A', min: 0.001, subject: 'a fuse' });
});
