import { afterAll, describe, expect, it } from 'vitest';
import { netlistFromDeck } from '@/lib/netlist/deck/netlist-from-deck';
import { asDrawn } from '@/lib/netlist/engine-deck/as-drawn';
import { runPoint } from '@/lib/netlist/engine-deck/run-point';
import { createNodeEngine } from '@/lib/spice/node-engine';
import { nativePoint } from './support/native-ngspice';
import { readTestDeck } from './support/test-deck';

const engine = createNodeEngine();
afterAll(() => engine.dispose());

/**
 * Decks as people write them, read by the product and run by its engine, against Debian's ngspice 39 on the same text:
 * every node within 0.1 % or 1 µV.
 */
const decks: readonly (readonly [string, readonly string[]])[] = [
  ['divider with suffixes and continuation', ['V1 IN 0 DC 12', 'R1 IN mid 10k', '+ tc1=1m', 'R2 mid 0 4.7K', 'R3 mid 0 0.1meg']],
  ['diode with its own card at 27 °C', ['V1 a 0 5', 'R1 a b 1k', 'D1 b 0 DX', '.model DX D(IS=222p N=1.65 RS=68.6m)']],
  ['diode with its own card at 85 °C', ['.temp 85', 'V1 a 0 5', 'R1 a b 1k', 'D1 b 0 DX', '.model DX D(IS=222p N=1.65 RS=68.6m)']],
  ['diode at another nominal temperature', ['.options temp=60 tnom=50', 'V1 a 0 5', 'R1 a b 1k', 'D1 b 0 DX', '.model DX D(IS=222p N=1.65)']],
  ['zener in breakdown', ['V1 a 0 24', 'R1 a b 1k', 'D1 0 b DZ', '.model DZ D(IS=1n BV=12 IBV=5m RS=10)']],
  ['level 1 switch with width and length', [
    'V1 v 0 15', 'V2 c 0 PULSE(10 0 1u 10n 10n 1u 2u)', 'R1 v d 10', 'R2 c g 100', 'R3 g 0 22k', 'M1 d g 0 0 MN W=1e-2 L=1e-6',
    '.model MN NMOS(LEVEL=1 VTO=3 KP=20u RD=20m RS=5m LAMBDA=1m)',
  ]],
  ['P-channel high side', [
    'V1 v 0 24', 'R1 g 0 10k', 'R2 v g 10k', 'M1 d g v v MP W=2e-2 L=1e-6', 'R3 d 0 47', '.model MP PMOS(VTO=-3 KP=10u)',
  ]],
  ['VDMOS on', [
    'V1 v 0 15', 'V2 c 0 10', 'R1 v d 10', 'R2 c g 470', 'R3 g 0 22k', 'M1 d g 0 MV',
    '.model MV VDMOS(VTO=3 KP=16 RD=20m RS=4m RG=1 CGS=1n CGDMAX=1n CGDMIN=40p IS=1p N=1.1 RB=10m BV=100)',
  ]],
  ['P-channel VDMOS', [
    'V1 v 0 15', 'R1 v g 10k', 'R2 g 0 10k', 'M1 d g v MV', 'R3 d 0 22', '.model MV VDMOS(PCHAN VTO=-3 KP=6 RD=50m RS=10m)',
  ]],
  ['NPN and PNP', [
    'V1 v 0 12', 'V2 c 0 5', 'R1 c b 4.7k', 'Q1 x b 0 QN', 'R2 v y 10k', 'R3 y x 1k', 'Q2 o y v QP', 'R4 o 0 220',
    '.model QN NPN(BF=200 IS=1e-14 VAF=100 RC=0.5)', '.model QP PNP(BF=150 IS=2e-14 VAF=60)',
  ]],
  ['sources at their DC value and at t = 0', [
    'V1 a 0 DC 3 SIN(5 2 1k)', 'V2 b 0 SIN(1 2 50 0 0 30)', 'V3 c 0 PULSE(2 9 0 1n 1n 1u 2u)', 'V4 d 0 PWL(0 4 1m 8)', 'V5 e 0 EXP(1.5 4 1u 1u)',
    'V6 f 0 AC 1', 'R1 a s 1k', 'R2 b s 1k', 'R3 c s 1k', 'R4 d s 1k', 'R5 e s 1k', 'R6 f s 1k', 'R7 s 0 1k',
  ]],
  ['current source, coil and capacitor', ['I1 0 a 2m', 'R1 a b 1k', 'L1 b c 10m', 'R2 c 0 2k', 'C1 a 0 1u', 'R3 a 0 10k']],
  ['nested subcircuits, inner models and names', [
    '.param VBUS=24', 'V1 in 0 {VBUS}', 'X1 in out LIMIT', 'R9 out 0 100',
    '.subckt LIMIT p q', 'R1 p n 47', 'X2 n q DROP', 'R2 n 0 10k', '.ends',
    '.subckt DROP a k', 'D1 a m DX', 'D2 m k DX', '.model DX D(IS=1n N=1.8)', '.ends',
  ]],
  ['subcircuit of a power MOSFET', [
    'V1 v 0 15', 'V2 c 0 5', 'R1 v d 22', 'R2 c g 100', 'R3 g 0 10k', 'XQ1 d g 0 QMOS', '*@XQ1 kind=NMOS ref=Q1 pins=D:d,G:g,S:0 vds_max=100',
    '.subckt QMOS d g s', 'M1 d g s s CH W=1e-4 L=1e-4', 'D1 s d BD', 'C1 g s 1n',
    '.model CH NMOS(LEVEL=1 VTO=2.5 KP=8 RD=20m RS=5m)', '.model BD D(IS=1p N=1.1 BV=100)', '.ends',
  ]],
  ['bridge with a floating source', [
    'V1 a b DC 20', 'D1 a p DR', 'D2 b p DR', 'D3 0 a DR', 'D4 0 b DR', 'C1 p 0 1000u', 'R1 p 0 100', 'R2 b 0 1meg', '.model DR D(IS=6e-8 N=2 RS=0.146)',
  ]],
];

describe('op["as drawn"] equals native ngspice', () => {
  it.each(decks)('%s', async (_, lines) => {
    const run = await asDrawn(engine, readTestDeck([...lines, '.op']));
    if (run.status !== 'ok') throw new Error(run.refusal.words);
    const native = nativePoint([...lines, '.op']);
    expect(Object.keys(run.volts).length).toBeGreaterThan(0);
    for (const [node, volts] of Object.entries(run.volts)) {
      const expected = native[`v(${node})`];
      expect(expected, `native has no node ${node}`).toBeDefined();
      expect(Math.abs(volts - (expected ?? 0)), node).toBeLessThanOrEqual(Math.max(1e-6, 1e-3 * Math.abs(expected ?? 0)));
    }
    const drawn = Object.keys(native).flatMap((name) => /^v\(([a-z0-9.]+)\)$/.exec(name)?.[1] ?? []);
    expect(Object.keys(run.volts)).toEqual(expect.arrayContaining(drawn));
  });

  it.each([
    ['a floating gate, by its node', ['V1 v 0 12', 'R1 v d 10', 'M1 d g 0 0 MN', 'C1 g 0 1n', '.model MN NMOS(VTO=3)'], 'engine', ['g']],
    ['a resistor of 0 ohm', ['V1 v 0 12', 'R1 v d 0', 'R2 d 0 10'], 'engine', []],
    ['a box that is not simulated', ['V1 v 0 12', 'R1 v 0 10', 'J1 v a 0 JX'], 'not-run', []],
  ])('refuses %s', async (_, lines, code, nodes) => {
    const run = await asDrawn(engine, readTestDeck(lines));
    if (run.status === 'ok') throw new Error('was not refused');
    expect(run.refusal.code).toBe(code);
    expect(run.refusal.nodes).toEqual(nodes);
  });
});

describe('a state of a read deck equals native ngspice with its source at that level', () => {
  const stage = (drive: number): readonly string[] => [
    'V1 v 0 15', `V2 c 0 ${drive}`, 'X1 v a LIM', 'R1 a 0 1k', 'I1 0 b 1m', 'R2 b 0 1k', 'M1 d g 0 MN', 'R3 v d 100', 'R4 c g 100', 'R5 g 0 22k',
    'M2 e g 0 0 ML W=1e-3 L=1e-6', 'R6 v e 1k', 'Q1 k h 0 QN', 'R7 c h 10k', 'R8 v k 1k', 'D2 k w DX', 'R9 w 0 1k',
    '.model MN VDMOS(VTO=3 KP=16 RD=20m RS=4m)', '.model ML NMOS(LEVEL=1 VTO=2 KP=2m)', '.model QN NPN(BF=150)', '.model DX D(IS=1n N=1.5 RS=1)',
    '.subckt LIM p q', 'R1 p n 100', 'D1 n q DX', '.ends',
  ];
  const { netlist } = netlistFromDeck(readTestDeck(stage(0)));
  const drive = netlist.parts.find(({ ref }) => ref === 'V2')?.id ?? '';

  it.each([0, 3.3, 5, 10])('drive at %f V', async (volts) => {
    const run = await runPoint(engine, netlist, { settings: { [drive]: { volts } }, corner: 'typ' });
    if (run.status !== 'ok') throw new Error(run.refusal.words);
    const native = nativePoint([...stage(volts), '.op']);
    for (const [net, value] of Object.entries(run.op.volts)) {
      const expected = net === '0' ? 0 : native[`v(${net})`] ?? Number.NaN;
      expect(Math.abs(value - expected), net).toBeLessThanOrEqual(Math.max(1e-6, 1e-3 * Math.abs(expected)));
    }
    expect(run.op.amps['V1:+']).toBeCloseTo(native['i(v1)'] ?? Number.NaN, 6);
  });
});
