import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, heaterStage, nFet, resistor } from '../testing/stage-deck';

const stage = (rs: string, rpd: string, high = '12', facts = 'role=generator', at = 'gate'): string =>
  deck(heaterStage(), nFet(), resistor('R3', 'drv', 'gate', rs), resistor('R2', at, '0', rpd), control(high, facts));

const costly: RuleCase = { name: '1 kΩ behind 1 kΩ takes half of the drive', deck: stage('1k', '1k'), expect: { outcome: 'fail', severity: 'caution', refs: ['R2', 'Q1', 'V2'], says: 'R2 takes 50 % of the drive' } };
const greedy: RuleCase = { name: '6 mA of a 20 mA pin', deck: stage('10', '820', '5', 'role=pin', 'drv'), expect: { outcome: 'fail', severity: 'caution', says: 'more than a quarter' } };
const protecting: RuleCase = { name: 'the divider keeps 24 V off the oxide', deck: stage('4.7k', '4.7k', '24'), expect: { outcome: 'none' } };

export const cases: readonly RuleCase[] = [
  costly,
  greedy,
  { name: '50 Ω generator into 220 Ω', deck: stage('1', '220', '12', 'role=generator rs=50', 'drv'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'just over 10 %', deck: stage('1k', '8.9k'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'at 10 %', deck: stage('1k', '9k'), expect: { outcome: 'pass' } },
  { name: 'just under 10 %', deck: stage('1k', '9.1k'), expect: { outcome: 'pass' } },
  { name: 'just over a quarter of the pin’s own limit', deck: stage('10', '1990', '5', 'role=pin io_max=10m', 'drv'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'a quarter of the pin’s own limit', deck: stage('10', '2k', '5', 'role=pin io_max=10m', 'drv'), expect: { outcome: 'pass' } },
  { name: '22 kΩ', deck: stage('10', '22k', '11', 'role=generator rs=50', 'drv'), expect: { outcome: 'pass' } },
  protecting,
  { name: 'no pull-down', deck: deck(heaterStage(), nFet(), resistor('R3', 'drv', 'gate', '100'), control()), expect: { outcome: 'none' } },
  withParameter(costly, 'driveShare', 0.6, { outcome: 'pass' }),
  withParameter(greedy, 'driverShare', 0.5, { outcome: 'pass' }),
  withParameter(protecting, 'clampShare', 1.3, { outcome: 'fail', severity: 'caution' }),
];
