import { withParameter, type RuleCase } from '../testing/rule-case';
import { deck, resistor } from '../testing/stage-deck';

const across = (volts: string, facts: string): string => deck(`V1 vbus 0 ${volts}\n*@V1 role=supply`, resistor('R1', 'vbus', '0', '1meg', facts));
const unknown: RuleCase = { name: '44 V without a rating', deck: across('44', 'pmax=0.25'), expect: { outcome: 'pass' } };

export const cases: readonly RuleCase[] = [
  { name: '325 V on a quarter-watt axial part', deck: across('325', 'pmax=0.25 package=axial'), expect: { outcome: 'fail', severity: 'stop', refs: ['R1'], says: 'rated 250 V' } },
  { name: '100 V on 0603', deck: across('100', 'package=0603'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'its own rating', deck: across('160', 'pmax=0.25 vmax=150'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'over at +10 % only', deck: across('145', 'pmax=0.25 vmax=150'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'just over', deck: across('75.1', 'package=0603'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'at the rating, over at +10 %', deck: across('75', 'package=0603'), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'just under at +10 % too', deck: across('68', 'package=0603'), expect: { outcome: 'pass' } },
  { name: '325 V on half a watt axial', deck: across('310', 'pmax=0.5 package=axial'), expect: { outcome: 'pass' } },
  { name: '12 V', deck: across('12', 'pmax=0.25'), expect: { outcome: 'pass' } },
  unknown,
  { name: '60 V without a rating', deck: across('60', 'pmax=0.25'), expect: { outcome: 'undetermined', says: 'vmax' } },
  { name: 'fed through a capacitor', deck: deck('V1 l 0 SIN(0 325 50)\n*@V1 role=mains rms=230', 'C1 l a 100n\n*@C1 vmax_ac=275', 'R1 a 0 10k\n*@R1 pmax=1 vmax=250'), expect: { outcome: 'undetermined', says: 'needs transient' } },
  { name: 'a load is no resistor here', deck: across('325', 'load=heater'), expect: { outcome: 'none' } },
  withParameter(unknown, 'anyResistor', 20, { outcome: 'undetermined' }),
];
