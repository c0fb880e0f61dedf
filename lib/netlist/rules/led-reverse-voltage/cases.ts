import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, led, resistor } from '../testing/stage-deck';

const backwards = (volts: string, facts?: string): string =>
  deck(`V1 vbus 0 ${volts}\n*@V1 role=supply`, resistor('R1', 'vbus', 'k', '1k', 'pmax=1'), led('D1', '0', 'k', facts));
const twelve: RuleCase = { name: '12 V backwards', deck: backwards('12'), expect: { outcome: 'fail', severity: 'stop', refs: ['D1', 'R1'], says: 'D1 stands 12 V backwards' } };
const alternating = (extra = ''): string => deck('V1 l 0 SIN(0 17 50)\n*@V1 rms=12', resistor('R1', 'l', 'a', '1k', 'pmax=1'), led('D1', 'a', '0'), extra);

export const cases: readonly RuleCase[] = [
  twelve,
  { name: 'the other half cycle of 12 V AC', deck: alternating(), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'driven through another rail while the control is low', deck: deck('V1 vbus 0 12\n*@V1 role=supply', control('12', 'role=generator'), resistor('R1', 'drv', 'a', '1k'), led('D1', 'a', 'vbus')), expect: { outcome: 'fail', severity: 'stop', state: 'as drawn' } },
  { name: 'driven backwards while its rail is off', deck: deck('V1 vbus 0 12\n*@V1 role=supply', 'V2 drv 0 12\n*@V2 role=generator high=12 low=0', resistor('R1', 'vbus', 'a', '1k'), led('D1', 'a', 'drv')), expect: { outcome: 'fail', severity: 'stop', state: 'off V1' } },
  { name: 'just over 5 V', deck: backwards('5.05'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'over 5 V at +10 % only', deck: backwards('4.8'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: '4 V', deck: backwards('4'), expect: { outcome: 'pass' } },
  { name: 'the sheet allows 15 V', deck: backwards('12', 'vf=2 if_max=25m vr_max=15'), expect: { outcome: 'pass' } },
  { name: 'a diode the other way round', deck: alternating('D2 0 a DX\n*@D2 vr_max=100 if_max=0.2'), expect: { outcome: 'pass' } },
  { name: 'a diode in series', deck: deck('V1 l 0 SIN(0 17 50)\n*@V1 rms=12', resistor('R1', 'l', 'x', '1k', 'pmax=1'), 'D2 x a DX\n*@D2 vr_max=100 if_max=0.2', led('D1', 'a', '0')), expect: { outcome: 'not applicable' } },
  { name: 'fed through a capacitor', deck: deck('V1 l 0 SIN(0 17 50)\n*@V1 rms=12', 'RL l 0 100\n*@RL load=heater', 'C1 l x 1u\n*@C1 vmax=63', resistor('R1', 'x', 'a', '1k', 'pmax=1'), led('D1', 'a', '0'), 'D2 0 a DX\n*@D2 vr_max=100 if_max=0.2'), expect: { outcome: 'undetermined', says: 'needs transient' } },
  { name: 'lit', deck: deck('V1 vbus 0 12', resistor('R1', 'vbus', 'a', '1k'), led('D1', 'a', '0')), expect: { outcome: 'pass' } },
  { name: 'no LED', deck: 'V1 vbus 0 12\nR1 vbus 0 1k', expect: { outcome: 'none' } },
  withParameter(twelve, 'assumedVr', 14, { outcome: 'pass' }),
];
