import { withParameter, type RuleCase } from '../testing/rule-case';
import { deck, led, resistor } from '../testing/stage-deck';

/** With V_F 2 V at 20 mA and 5 Ω inside, 25 mA flow at about 2.03 V. */
const indicator = (volts: string, ohms: string, facts = 'vf=2 if_max=25m i_test=20m'): string =>
  deck(`V1 vbus 0 ${volts}\n*@V1 role=supply`, resistor('R1', 'vbus', 'a', ohms, 'pmax=10 vmax=500'), led('D1', 'a', '0', facts));
const far: RuleCase = { name: '45 mA in a 25 mA LED', deck: indicator('12', '220'), expect: { outcome: 'fail', severity: 'stop', refs: ['R1', 'D1'], says: 'R1 lets 44' } };

export const cases: readonly RuleCase[] = [
  far,
  { name: '325 V on a resistor for 12 V', deck: indicator('325', '1k'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'the LED of a string with the least rating decides', deck: deck('V1 vbus 0 12\n*@V1 role=supply', resistor('R1', 'vbus', 'a', '330', 'pmax=1'), led('D1', 'a', 'b', 'vf=2 if_max=30m'), led('D2', 'b', '0', 'vf=2 if_max=15m')), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'just over 1.5 times', deck: indicator('12', '263'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'just under 1.5 times', deck: indicator('12', '267'), expect: { outcome: 'pass' } },
  { name: '10 mA', deck: indicator('12', '1k'), expect: { outcome: 'pass', says: 'D1 carries 10' } },
  { name: '1.6 times only at +10 %', deck: indicator('12', '275'), expect: { outcome: 'pass' } },
  { name: 'no maximum given', deck: indicator('12', '220', 'vf=2'), expect: { outcome: 'undetermined', says: 'I_F maximum' } },
  { name: 'fed through a capacitor from the mains', deck: deck('V1 l 0 SIN(0 325 50)\n*@V1 role=mains rms=230 f=50', 'C1 l a 220n\n*@C1 vmax_ac=275', 'R1 a b 1k', led('D1', 'b', '0'), led('D2', '0', 'b')), expect: { outcome: 'undetermined', says: 'transient' } },
  { name: 'no resistor at all: led-resistor-missing speaks', deck: deck('V1 vbus 0 5\n*@V1 role=supply', led('D1', 'vbus', '0')), expect: { outcome: 'none' } },
  { name: 'no LED', deck: 'V1 vbus 0 5\nR1 vbus 0 1k', expect: { outcome: 'none' } },
  withParameter(far, 'stopFactor', 2, { outcome: 'pass' }),
];
