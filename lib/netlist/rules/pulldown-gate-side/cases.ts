import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, fetFacts, heaterStage, lead, nFet, resistor } from '../testing/stage-deck';

const stage = (rs: string, rpd: string, high = '12', facts = fetFacts, source = 'role=generator'): string =>
  deck(heaterStage(), nFet(facts), resistor('R3', 'drv', 'gate', rs), resistor('R2', 'gate', '0', rpd), control(high, source));

const small: RuleCase = { name: '1 % of the drive', deck: stage('100', '9.9k'), expect: { outcome: 'fail', severity: 'advice', refs: ['R2', 'R3', 'Q1'] } };
const large: RuleCase = { name: '20 % of the drive', deck: stage('1k', '4k'), expect: { outcome: 'fail', severity: 'caution' } };
const protecting: RuleCase = { name: 'the divider keeps 24 V off the oxide', deck: stage('4.7k', '4.7k', '24'), expect: { outcome: 'none' } };

export const cases: readonly RuleCase[] = [
  small,
  large,
  { name: '3.3 V drive, part stated at 3.3 V', deck: stage('470', '10k', '3.3', 'vth_max=2 vth_min=1 vgs_max=12 rds_on=0.1 rds_on_spec_vgs=3.3'), expect: { outcome: 'fail', severity: 'caution', says: '3.15 V becomes 3.3 V' } },
  { name: 'just over 0.5 %', deck: stage('50.5', '10k'), expect: { outcome: 'fail', severity: 'advice' } },
  { name: 'at 0.5 %', deck: stage('50', '9950'), expect: { outcome: 'pass' } },
  { name: 'just under 0.5 %', deck: stage('49', '10k'), expect: { outcome: 'pass' } },
  { name: 'at 10 % it is an advice still', deck: stage('1k', '9k'), expect: { outcome: 'fail', severity: 'advice' } },
  { name: 'just over 10 %', deck: stage('1.01k', '9k'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: '10 Ω against 22 kΩ', deck: stage('10', '22k'), expect: { outcome: 'pass' } },
  { name: 'pull-down on the driver’s side', deck: deck(heaterStage(), nFet(), resistor('R3', 'drv', 'gate', '470'), resistor('R2', 'drv', '0', '10k'), control()), expect: { outcome: 'none' } },
  { name: 'a lead between driver and gate resistor', deck: deck(heaterStage(), nFet(), resistor('R3', 'inner', 'gate', '470'), lead('J1', 'drv', 'inner'), resistor('R2', 'gate', '0', '10k'), control()), expect: { outcome: 'none' } },
  protecting,
  { name: 'a zener sets V_GS', deck: deck(stage('1k', '4k'), 'DZ 0 gate DZ\n*@DZ kind=zener vz=12'), expect: { outcome: 'none' } },
  withParameter(small, 'adviceShare', 0.02, { outcome: 'pass' }),
  withParameter(large, 'cautionShare', 0.3, { outcome: 'fail', severity: 'caution' }),
  withParameter({ ...large, deck: stage('1k', '4k', '12', 'vth_min=2 vth_max=4 vgs_max=20 rds_on=40m') }, 'cautionShare', 0.3, { outcome: 'fail', severity: 'advice' }),
  withParameter(protecting, 'clampShare', 1.3, { outcome: 'fail', severity: 'caution' }),
];
