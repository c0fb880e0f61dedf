import { withParameter, type RuleCase } from '../testing/rule-case';
import { deck, led, resistor } from '../testing/stage-deck';

const indicator = (volts: string, ohms: string, facts = 'vf=2 if_max=25m i_test=20m'): string =>
  deck(`V1 vbus 0 ${volts}\n*@V1 role=supply`, resistor('R1', 'vbus', 'a', ohms, 'pmax=10 vmax=500'), led('D1', 'a', '0', facts));
const onPin = (ohms: string): string => deck('V2 pin 0 5\n*@V2 role=pin io_max=10m', resistor('R1', 'pin', 'a', ohms), led('D1', 'a', '0', 'vf=2 if_max=25m'));
const over: RuleCase = { name: '30 mA in a 25 mA LED', deck: indicator('12', '330'), expect: { outcome: 'fail', severity: 'caution', refs: ['R1', 'D1'] } };
const pin: RuleCase = { name: '9.4 mA from a 10 mA pin', deck: onPin('330'), expect: { outcome: 'fail', severity: 'caution', refs: ['R1', 'D1', 'V2'] } };

export const cases: readonly RuleCase[] = [
  over,
  pin,
  { name: 'over the rating at +10 % only', deck: indicator('12', '420'), expect: { outcome: 'fail', severity: 'caution', says: '+10 %' } },
  { name: 'just over the rating', deck: indicator('12', '397'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'within the rating at +10 % too', deck: indicator('12', '450'), expect: { outcome: 'pass' } },
  { name: '10 mA', deck: indicator('12', '1k'), expect: { outcome: 'pass' } },
  { name: '3 mA from a pin', deck: onPin('1k'), expect: { outcome: 'pass' } },
  { name: 'far over: led-resistor-undersized speaks', deck: indicator('12', '150'), expect: { outcome: 'not applicable' } },
  { name: 'no maximum given', deck: indicator('12', '330', 'vf=2'), expect: { outcome: 'undetermined', says: 'I_F maximum' } },
  { name: 'no LED', deck: 'V1 vbus 0 5\nR1 vbus 0 1k', expect: { outcome: 'none' } },
  withParameter({ ...over, name: 'far over' , deck: indicator('12', '220') }, 'stopFactor', 2, { outcome: 'fail', severity: 'caution' }),
  withParameter(pin, 'pinShare', 1, { outcome: 'pass' }),
];
