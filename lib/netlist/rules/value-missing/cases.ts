import type { FactKey } from '../../facts/fact-registry';
import type { Netlist } from '../../netlist';
import type { RuleCase } from '../testing/rule-case';

const stage = 'V1 vcc 0 12\n*@V1 role=supply\nR1 vcc 0 10k\n*@R1 pmax=0.25\nC1 vcc 0 100n\n*@C1 vmax=50';
const drive = 'V1 drv 0 PULSE(0 5 0 1u 1u 1m 2m)\n*@V1 role=generator\nR1 drv 0 10k\n*@R1 pmax=0.25';

const without = (ref: string, ...facts: readonly FactKey[]) => (netlist: Netlist): Netlist => ({
  ...netlist,
  parts: netlist.parts.map((part) => (part.ref === ref ? { ...part, facts: Object.fromEntries(Object.entries(part.facts).filter(([key]) => !facts.includes(key as FactKey))) } : part)),
});

/** `docs/rules.md` 53; common practice, no source. */
export const cases: readonly RuleCase[] = [
  { name: 'a resistor without ohms', deck: stage, edit: without('R1', 'value'), expect: { outcome: 'fail', severity: 'caution', refs: ['R1'], says: 'R1 has no resistance' } },
  { name: 'a capacitor without farads', deck: stage, edit: without('C1', 'value'), expect: { outcome: 'fail', refs: ['C1'], says: 'C1 has no capacitance' } },
  { name: 'a source without volts', deck: stage, edit: without('V1', 'value'), expect: { outcome: 'fail', refs: ['V1'], says: 'V1 has no voltage' } },
  { name: 'all given', deck: stage, expect: { outcome: 'pass' } },
  { name: 'a wave says the levels', deck: drive, expect: { outcome: 'pass' } },
  { name: 'a zener with a model card', deck: 'V1 a 0 12\n*@V1 role=supply\nD1 0 a DZ\n*@D1 kind=zener\n.model DZ D(BV=5.1)', expect: { outcome: 'pass' } },
  { name: 'a fuse of a deck, whose amps are a rating', deck: `V1 a 0 12\n*@V1 role=supply\nR1 a b 10m\n*@R1 kind=fuse\nR2 b 0 1k`, expect: { outcome: 'pass' } },
  { name: 'a piece of wire', deck: 'R1 0 0 1m\n*@R1 wire=yes', expect: { outcome: 'none' } },
];
