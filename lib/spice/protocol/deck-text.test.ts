import { expect, it } from 'vitest';
import { deckText, freshNonce, lineFault } from './deck-text';

it.each([
  'Rp1 n1 0 1.000000000e+3', '.model mp2 VDMOS(VTO=3)', '.options temp=25 tnom=25', '.save v(n1)', '.op',
  'Bp3 0 n2 I = min(5.0e-1, (1.2e+1-V(n2))/1.0e-2)',
])('lets %s through', (line) => {
  expect(lineFault(line)).toBeNull();
});

it.each([
  '.control', '.include /etc/passwd', '.lib x', '.param a=1', 'alias run', '', 'R1 a 0 {x}', 'R1 a 0 1k\nquit',
  'R1 a 0 1k ; quit', '* comment', 'R1 ä 0 1k', 'Atrick a b model',
])('stops %j', (line) => {
  expect(lineFault(line)).not.toBeNull();
});

it('puts a new title above every deck', () => {
  const [first, second] = [freshNonce(), freshNonce()];
  expect(first).toMatch(/^n[0-9a-f]{24}$/);
  expect(first).not.toBe(second);
  expect(deckText(first, ['.op'])).toBe(`${first}\n.op\n.end\n`);
});
