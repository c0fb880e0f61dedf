import { withParameter, type RuleCase } from '../testing/rule-case';

const load = (a: string, b: string) => `R1 ${a} 0 10k\n*@R1 pmax=0.25\nR2 ${b} 0 10k\n*@R2 pmax=0.25`;
const supply = (net: string, volts = 12) => `V1 ${net} 0 ${volts}\n*@V1 role=supply`;

const mistyped: RuleCase = {
  name: 'a letter left out', deck: `${supply('supply')}\n${load('supply', 'suply')}`,
  expect: { outcome: 'fail', severity: 'caution', refs: ['R2', 'R1', 'V1'], says: 'suply and supply' },
};

const twoNames: RuleCase = { name: 'three letters are too few to compare', deck: `${supply('vcc')}\n${load('vcc', 'vdc')}`, expect: { outcome: 'pass' } };

const doubled: RuleCase = {
  name: 'two alike nets with two pins each', deck: `${supply('gate')}\n${load('gate', 'gato')}\nR3 gato 0 10k\n*@R3 pmax=0.25`, expect: { outcome: 'pass' },
};

/** `docs/rules.md` 54; common practice, no source. */
export const cases: readonly RuleCase[] = [
  mistyped,
  { name: 'a letter mistaken', deck: `${supply('drive')}\n${load('drive', 'drove')}`, expect: { outcome: 'fail', says: 'drove and drive' } },
  { name: 'apart by a hyphen only', deck: `${supply('dc-link')}\n${load('dc-link', 'dclink')}`, expect: { outcome: 'fail' } },
  { name: '5V and VCC, one of them fed', deck: `${supply('5v', 5)}\n${load('5v', 'vcc')}\nR3 vcc 0 10k\n*@R3 pmax=0.25`, expect: { outcome: 'fail', says: '5v and vcc' } },
  { name: 'GROUND beside 0 V', deck: `${supply('rail')}\n${load('rail', 'ground')}`, expect: { outcome: 'fail', says: 'ground and 0 V' } },
  { name: 'apart by a digit only', deck: `${supply('gate1')}\n${load('gate1', 'gate2')}`, expect: { outcome: 'pass' } },
  { name: 'a digit added', deck: `${supply('gate')}\n${load('gate', 'gate1')}`, expect: { outcome: 'pass' } },
  twoNames,
  doubled,
  { name: 'VCC and 5V, each with its source', deck: `${supply('vcc')}\nV2 5v 0 5\n*@V2 role=supply\n${load('vcc', '5v')}`, expect: { outcome: 'pass' } },
  { name: 'nothing to compare', deck: 'R1 0 0 10k\n*@R1 internal=winding', expect: { outcome: 'pass' } },
  { name: 'an empty sheet', deck: '', expect: { outcome: 'none' } },
  withParameter(twoNames, 'leastCharacters', 3, { outcome: 'fail' }),
  withParameter(doubled, 'lonePins', 2, { outcome: 'fail' }),
];
