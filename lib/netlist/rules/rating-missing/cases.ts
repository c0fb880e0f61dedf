import type { RuleCase } from '../testing/rule-case';

const supply = 'V1 vcc 0 12\n*@V1 role=supply';
const resistor = (facts: string) => `${supply}\nR1 vcc 0 10k\n*@R1 ${facts}`;

/** `docs/rules.md` 53; common practice, no source. */
export const cases: readonly RuleCase[] = [
  { name: 'a resistor without watts', deck: resistor('tolerance=1'), expect: { outcome: 'fail', severity: 'advice', refs: ['R1'], says: 'rules that need it cannot decide' } },
  { name: 'a capacitor without volts', deck: `${supply}\nC1 vcc 0 100n`, expect: { outcome: 'fail', refs: ['C1'] } },
  { name: 'a transistor without its limits', deck: `${supply}\nM1 vcc g 0 0 NM\n*@M1 kind=NMOS vth_min=2 vth_max=4\nR1 g 0 10k\n*@R1 pmax=0.25\n.model NM NMOS(VTO=3)`, expect: { outcome: 'fail', refs: ['M1'], says: /them cannot decide/ } },
  { name: 'an LED without its current', deck: `${supply}\nR1 vcc a 1k\n*@R1 pmax=0.25\nD1 a 0 DL\n*@D1 kind=LED vf=2\n.model DL D(N=2)`, expect: { outcome: 'fail', refs: ['D1'] } },
  { name: 'watts given', deck: resistor('pmax=0.25'), expect: { outcome: 'pass' } },
  { name: 'a package that says the watts', deck: resistor('package=0805'), expect: { outcome: 'pass' } },
  { name: 'an AC rating for a DC one', deck: `${supply}\nC1 vcc 0 100n\n*@C1 vmax_ac=275`, expect: { outcome: 'pass' } },
  { name: 'a load', deck: resistor('load=heater'), expect: { outcome: 'none' } },
  { name: 'a winding', deck: resistor('internal=winding'), expect: { outcome: 'none' } },
];
