import { withParameter, type RuleCase } from '../testing/rule-case';
import { deck, led, resistor } from '../testing/stage-deck';

const string = (volts: string, count: number, vf = '2', ohms = '100'): string => deck(
  `V1 vbus 0 ${volts}\n*@V1 role=supply`, resistor('R1', 'vbus', 'n0', ohms, 'pmax=1'),
  ...Array.from({ length: count }, (_, index) => led(`D${index + 1}`, `n${index}`, index === count - 1 ? '0' : `n${index + 1}`, `if_max=25m i_test=20m${vf === '' ? '' : ` vf=${vf}`}`)),
);
const tight: RuleCase = { name: 'three LEDs of 2 V on 6.3 V', deck: string('6.3', 3), expect: { outcome: 'fail', severity: 'advice' } };
const short: RuleCase = { name: 'three LEDs of 2 V on 5.5 V', deck: string('5.5', 3), expect: { outcome: 'fail', severity: 'caution', says: 'hardly light' } };

export const cases: readonly RuleCase[] = [
  tight,
  short,
  { name: 'a blue LED on 3.3 V', deck: string('3.3', 1, '3.2', '10'), expect: { outcome: 'fail', severity: 'advice', refs: ['R1', 'D1'] } },
  { name: 'just over 0.9', deck: string('6.66', 3), expect: { outcome: 'fail', severity: 'advice' } },
  { name: 'just under 0.9', deck: string('6.67', 3), expect: { outcome: 'pass' } },
  { name: 'no volt left', deck: string('6', 3), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'three LEDs of 2 V on 12 V', deck: string('12', 3, '2', '470'), expect: { outcome: 'pass' } },
  { name: 'one LED on 5 V', deck: string('5', 1, '2', '330'), expect: { outcome: 'pass' } },
  { name: 'V_F not given', deck: string('5', 2, ''), expect: { outcome: 'undetermined', says: 'V_F' } },
  { name: 'wrong way round it is never lit', deck: deck('V1 vbus 0 5\n*@V1 role=supply', resistor('R1', 'vbus', 'k', '330'), led('D1', '0', 'k')), expect: { outcome: 'not applicable' } },
  withParameter(tight, 'adviceShare', 0.97, { outcome: 'pass' }),
  withParameter(tight, 'cautionShare', 0.94, { outcome: 'fail', severity: 'caution' }),
  withParameter(short, 'litAmps', 1, { outcome: 'not applicable' }),
];
