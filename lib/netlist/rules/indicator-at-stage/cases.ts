import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, fetFacts, led, nFet, resistor } from '../testing/stage-deck';

const plan = [
  { name: '15 V', volts: 15, amps: 0.2 }, { name: '36 V', volts: 36, amps: 0.5 }, { name: '325 V', volts: 325, amps: 2 },
];
const gentle = [{ name: '12 V', volts: 12, amps: 1 }, { name: '18 V', volts: 18, amps: 1 }];
const indicator = (ohms: string, facts = 'pmax=0.25', ledFacts = 'vf=1.9 if_max=25m'): string =>
  deck('V1 vbus 0 15\n*@V1 role=supply', resistor('R1', 'vbus', 'a', ohms, facts), led('D1', 'a', '0', ledFacts));
const current: RuleCase = { name: 'only its current fails', deck: indicator('680', 'pmax=5'), plan: [{ name: '15 V', volts: 15, amps: 1 }, { name: '30 V', volts: 30, amps: 1 }], expect: { outcome: 'fail', severity: 'stop', holdPoint: '30 V' } };

export const cases: readonly RuleCase[] = [
  { name: 'R1 and D1 chosen for 15 V', deck: indicator('1.2k'), plan, expect: { outcome: 'fail', severity: 'stop', refs: ['R1', 'D1'], holdPoint: '36 V', says: /^R1 and D1 suit 15 V only: R1 over its 250 mW from 19\.\d V; D1 over its 25 mA from 3\d(\.\d)? V\. At 325 V: / } },
  { name: 'a gate network fed from the bus', deck: deck('V1 vbus 0 15\n*@V1 role=supply', resistor('R5', 'vbus', 'gate', '10k'), 'DZ 0 gate DZ\n*@DZ kind=zener vz=12', 'RL vbus drain 1k\n*@RL load=heater', nFet(fetFacts)), plan, expect: { outcome: 'fail', severity: 'stop', refs: ['R5', 'Q1'], holdPoint: '325 V' } },
  current,
  { name: 'within limits all along', deck: indicator('1.8k', 'pmax=0.5'), plan: gentle, expect: { outcome: 'pass' } },
  { name: 'sized for the top of the plan', deck: indicator('100k', 'pmax=3 vmax=500'), plan, expect: { outcome: 'pass' } },
  { name: 'a gate network at home', deck: deck('V1 vbus 0 15\n*@V1 role=supply', 'RL vbus drain 1k\n*@RL load=heater', nFet(), resistor('R3', 'drv', 'gate', '10'), resistor('R2', 'drv', '0', '22k'), control('11')), plan, expect: { outcome: 'pass' } },
  { name: 'fails at the first hold point already: the other rules speak', deck: indicator('220'), plan, expect: { outcome: 'not applicable' } },
  { name: 'no plan', deck: indicator('1.2k'), expect: { outcome: 'none' } },
  { name: 'no ratings at all', deck: indicator('1.2k', 'tolerance=5', 'vf=1.9'), plan, expect: { outcome: 'undetermined' } },
  withParameter(current, 'stopFactor', 2, { outcome: 'pass' }),
];
