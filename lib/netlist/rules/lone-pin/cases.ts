import type { Netlist } from '../../netlist';
import { withParameter, type RuleCase } from '../testing/rule-case';

const supply = 'V1 vcc 0 12\n*@V1 role=supply\nR1 vcc 0 10k\n*@R1 pmax=0.25';

const leftOpen = (ref: string, pin: string) => (netlist: Netlist): Netlist =>
  ({ ...netlist, parts: netlist.parts.map((part) => (part.ref === ref ? { ...part, leftOpen: [pin] } : part)) });

const hanging: RuleCase = {
  name: 'a resistor that hangs on one side', deck: `${supply}\nR2 vcc nowhere 10k\n*@R2 pmax=0.25`,
  expect: { outcome: 'fail', severity: 'caution', refs: ['R2'], says: 'R2:2 on nowhere is joined to nothing else' },
};

const joined: RuleCase = { name: 'every pin joined', deck: `${supply}\nR2 vcc 0 10k\n*@R2 pmax=0.25`, expect: { outcome: 'none' } };

/** `docs/rules.md` 54; common practice, no source. */
export const cases: readonly RuleCase[] = [
  hanging,
  { name: 'a gate that nothing reaches', deck: `${supply}\nM1 vcc g 0 0 NM\n*@M1 kind=NMOS vth_min=2\n.model NM NMOS(VTO=3)`, expect: { outcome: 'fail', refs: ['M1'], says: 'M1:G' } },
  { name: 'one end of a capacitor', deck: `${supply}\nC1 vcc tail 100n\n*@C1 vmax=50`, expect: { outcome: 'fail', refs: ['C1'], says: 'C1:2' } },
  { ...hanging, name: 'the same, marked left open', edit: leftOpen('R2', '2'), expect: { outcome: 'pass', says: 'on purpose' } },
  { name: 'only one pin on 0 V', deck: 'V1 l n 12\n*@V1 role=supply\nR1 l n 10k\n*@R1 pmax=0.25\nR2 n 0 1meg\n*@R2 pmax=0.25', expect: { outcome: 'none' } },
  { name: 'the base of an optocoupler', deck: `${supply}\nQ1 vcc b 0 NX\n*@Q1 kind=opto-transistor\n.model NX NPN`, expect: { outcome: 'none' } },
  { name: 'a capacitor left open on purpose', deck: `${supply}\nC1 vcc tail 100n\n*@C1 vmax=50`, edit: leftOpen('C1', '2'), expect: { outcome: 'pass' } },
  { name: 'a gate left open on purpose is gate-floating’s business', deck: `${supply}\nM1 vcc g 0 0 NM\n*@M1 kind=NMOS vth_min=2\n.model NM NMOS(VTO=3)`, edit: leftOpen('M1', 'G'), expect: { outcome: 'pass' } },
  joined,
  { name: 'earth is a join by itself', deck: `${supply}\nR2 vcc pe 1meg\n*@R2 pmax=0.25\n*@pe kind=earth`, expect: { outcome: 'none' } },
  { name: 'the inside of a part', deck: `${supply}\nR2 vcc inner 100\n*@R2 internal=winding`, expect: { outcome: 'none' } },
  withParameter(hanging, 'leastPins', 1, { outcome: 'none' }),
];
