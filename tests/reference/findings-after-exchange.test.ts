import { afterAll, beforeAll, expect, test } from 'vitest';
import { checkDeck } from '@/lib/check/check-deck';
import { netlistFromDeck } from '@/lib/netlist/deck/netlist-from-deck';
import { writeDeck } from '@/lib/netlist/deck/write-deck';
import { createNodeEngine } from '@/lib/spice/node-engine';
import { readTestDeck } from './support/test-deck';

const engine = createNodeEngine();
beforeAll(() => engine.warm());
afterAll(() => engine.dispose());

async function verdicts(deck: string): Promise<string[]> {
  const { report, readable } = await checkDeck(deck, engine);
  expect(readable).toBe(true);
  return [...report.findings, ...report.undetermined]
    .map(({ rule, outcome, severity, refs, state, corner, message, fingerprint }) => [rule, outcome, severity, refs, state, corner, message, fingerprint].join(' | ')).sort();
}

const gateStage = [
  'V1 bus 0 DC 15', '*@V1 role=supply ilim=0.2', 'V2 drv 0 PULSE(0 11 0 10n 10n 20u 40u)', '*@V2 role=generator high=11 low=0 rs=50 fsw=25k',
  'RW1 drv ctl 1m', '*@RW1 kind=lead ref=W1', 'R1 ctl gate 47', '*@R1 pmax=0.25', 'R2 bus led 1k', '*@R2 pmax=0.125',
  'D1 led 0 NONE', '*@D1 kind=LED vf=2 if_max=20m vr_max=5 colour=red', 'L1 bus drain 10u', 'C1 bus 0 100u', '*@C1 plus=bus vmax=16',
  'XQ1 drain gate 0 FET', '*@XQ1 kind=NMOS ref=Q1 pins=D:drain,G:gate,S:0 vds_max=100 vgs_max=20 vth_min=2 vth_max=4 rds_on=37m rds_on_spec_vgs=10 id_max=16 qg=71n ciss=1.96n crss=40p',
];
const mains = [
  'V1 l 0 SIN(0 325 50)', '*@V1 role=mains', 'R1 l a 100k', '*@R1 pmax=1 package=0805', 'D1 a k DD', '.model DD D(IS=1e-14 N=1.5)',
  'C1 k 0 10u', '*@C1 polarised=yes vmax=250',
];
const ownModel = ['V1 bus 0 24', 'R1 bus d 100', 'M1 d g 0 0 MM', '.model MM NMOS(LEVEL=1 VTO=3 KP=2)', '*@M1 vds_max=20 vgs_max=20', 'V2 g 0 5', '*@V2 kind=GPIO'];

test.each([['a gate stage with ratings', gateStage], ['rectified mains', mains], ['a transistor with its own model', ownModel]])(
  'findings are the same before and after a deck is written and read again: %s', async (_, lines) => {
    const before = await verdicts(['t', ...lines].join('\n'));
    const after = await verdicts(writeDeck(netlistFromDeck(readTestDeck(lines)).netlist));
    expect(before.length).toBeGreaterThan(2);
    expect(after).toEqual(before);
  });
