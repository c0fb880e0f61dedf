import type { RuleCase } from '../testing/rule-case';

const supply = 'V1 vcc 0 12\n*@V1 role=supply';
const resistor = (value: string, facts = 'pmax=0.25') => `${supply}\nR1 vcc 0 ${value}\n*@R1 ${facts}`;

/** Values: IEC 60063 (`docs/sources.md` 4). Letters: ASME Y14.44 (`docs/sources.md` 5). */
export const cases: readonly RuleCase[] = [
  { name: 'a resistor that nobody makes', deck: resistor('4.8k'), expect: { outcome: 'fail', severity: 'advice', refs: ['R1'], says: 'nearest of E24 and E96' } },
  { name: 'a capacitor off the series', deck: `${supply}\nC1 vcc 0 50n\n*@C1 vmax=50`, expect: { outcome: 'fail', refs: ['C1'], says: '51 nF' } },
  { name: 'a transistor called M', deck: `${supply}\nM1 vcc g 0 0 NM\n*@M1 kind=NMOS vth_min=2\nR1 g 0 10k\n*@R1 pmax=0.25\n.model NM NMOS(VTO=3)`, expect: { outcome: 'fail', refs: ['M1'], says: 'usually is Q' } },
  { name: 'E24', deck: resistor('4.7k'), expect: { outcome: 'pass' } },
  { name: 'E96', deck: resistor('4.75k'), expect: { outcome: 'pass' } },
  { name: 'a transistor called Q', deck: `${supply}\nMQ1 vcc g 0 0 NM\n*@MQ1 ref=Q1 kind=NMOS vth_min=2\nR1 g 0 10k\n*@R1 pmax=0.25\n.model NM NMOS(VTO=3)`, expect: { outcome: 'pass' } },
  { name: 'D for an LED is in everyday use', deck: `${supply}\nR1 vcc a 1k\n*@R1 pmax=0.25\nD1 a 0 DL\n*@D1 kind=LED if_max=0.02\n.model DL D(N=2)`, expect: { outcome: 'pass' } },
  { name: 'a load is what it is', deck: 'RL 0 0 5.3\n*@RL internal=winding', expect: { outcome: 'none' } },
];
