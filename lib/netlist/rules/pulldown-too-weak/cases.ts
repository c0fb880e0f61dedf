import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, fetFacts, heaterStage, lead, nFet, resistor } from '../testing/stage-deck';

/** A pin with its own pull-up to 5 V drives the gate through 100 Ω. */
const pinStage = (rpd: string, pullUp = '20k', facts = fetFacts): string => deck(
  heaterStage(), nFet(facts), resistor('R3', 'drv', 'gate', '100'), resistor('R2', 'drv', '0', rpd),
  'V3 vdd 0 5', `R9 drv vdd ${pullUp}`, '*@R9 internal=pin-pull-up',
);
const leaky = (rpd: string, facts = fetFacts): string => deck(heaterStage(), nFet(facts), resistor('R3', 'drv', 'gate', '100'), resistor('R2', 'gate', '0', rpd), control());
const weak: RuleCase = { name: '22 kΩ against a pin’s 20 kΩ', deck: pinStage('22k'), expect: { outcome: 'fail', severity: 'caution', refs: ['R2', 'Q1'], says: 'R2 is too weak' } };

export const cases: readonly RuleCase[] = [
  weak,
  { name: 'just over half of the threshold', deck: pinStage('5.01k'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'at half of the threshold', deck: pinStage('5k'), expect: { outcome: 'pass' } },
  { name: 'just under', deck: pinStage('4.99k'), expect: { outcome: 'pass' } },
  { name: '4.7 kΩ against 50 kΩ', deck: pinStage('4.7k', '50k'), expect: { outcome: 'pass', says: 'R2 keeps Q1 gate' } },
  { name: '10 MΩ against leakage', deck: leaky('10meg'), expect: { outcome: 'fail', severity: 'caution', says: '1 µA of leakage' } },
  { name: '22 kΩ against leakage', deck: leaky('22k'), expect: { outcome: 'pass' } },
  { name: 'no threshold given', deck: leaky('22k', 'vgs_max=20 rds_on=40m'), expect: { outcome: 'undetermined', says: 'V_GS(th) minimum' } },
  { name: 'a lead on the way: lifted-lead speaks', deck: deck(heaterStage(), nFet(), lead('J1', 'drv', 'gate'), resistor('R2', 'gate', '0', '10meg'), control()), expect: { outcome: 'none' } },
  { name: 'no pull-down', deck: deck(heaterStage(), nFet(), resistor('R3', 'drv', 'gate', '100'), control()), expect: { outcome: 'none' } },
  withParameter(weak, 'thresholdShare', 1.5, { outcome: 'pass' }),
];
