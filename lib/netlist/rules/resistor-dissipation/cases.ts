import { withParameter, type RuleCase } from '../testing/rule-case';
import { deck, resistor } from '../testing/stage-deck';

/** 10 V on R: P = 100 / R. */
const loaded = (ohms: string, facts = 'pmax=0.25', volts = '10'): string => deck(`V1 vbus 0 ${volts}\n*@V1 role=supply`, resistor('R1', 'vbus', '0', ohms, facts));
const hot: RuleCase = { name: '88 % of the rating', deck: loaded('455'), expect: { outcome: 'fail', severity: 'caution' } };
const warm: RuleCase = { name: '70 % of the rating', deck: loaded('571'), expect: { outcome: 'fail', severity: 'advice' } };
const ambient = (celsius: number) => [{ name: 'hot box', ambient: celsius, values: {} }];
const plan = [{ name: 'proof', scenario: 'hot box', volts: 10, amps: 1 }];

export const cases: readonly RuleCase[] = [
  { name: '0.33 W in a quarter-watt part', deck: loaded('300'), expect: { outcome: 'fail', severity: 'stop', refs: ['R1'], says: 'R1 sheds 333 mW at 10 V in a 250 mW part' } },
  { name: 'just over', deck: loaded('399.9'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'at the rating it is a caution', deck: loaded('400'), expect: { outcome: 'fail', severity: 'caution' } },
  hot,
  { name: 'at 85 %, over the rating at +10 % only', deck: loaded('470.6'), expect: { outcome: 'fail', severity: 'caution', says: '+10 %' } },
  warm,
  { name: 'just under 60 %', deck: loaded('667'), expect: { outcome: 'pass' } },
  { name: 'the package decides: 0603', deck: loaded('900', 'package=0603'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'an axial part', deck: loaded('1k', 'package=axial'), expect: { outcome: 'pass' } },
  { name: '1 kΩ', deck: loaded('1k'), expect: { outcome: 'pass' } },
  { name: '10 kΩ', deck: loaded('10k'), expect: { outcome: 'pass' } },
  { name: 'at 112.5 °C half of the rating is left', deck: loaded('700'), plan, scenarios: ambient(112.5), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'at 70 °C all of it', deck: loaded('1k'), plan, scenarios: ambient(70), expect: { outcome: 'pass' } },
  { name: 'a sine heats by its rms value', deck: deck('V1 l 0 SIN(0 325.27 50)\n*@V1 rms=230', resistor('R1', 'l', '0', '220k', 'pmax=0.25 vmax=500')), expect: { outcome: 'fail', severity: 'caution', says: '240 mW' } },
  { name: 'a supply’s limit protects nothing', deck: deck('V1 vbus 0 10\n*@V1 role=supply ilim=10m', resistor('R1', 'vbus', '0', '300')), expect: { outcome: 'fail', severity: 'stop', says: 'supply limit left out' } },
  { name: 'no rating and no package', deck: loaded('300', 'tolerance=5'), expect: { outcome: 'undetermined', says: 'power rating' } },
  { name: 'a load is no resistor here', deck: loaded('10', 'load=heater'), expect: { outcome: 'none' } },
  withParameter(hot, 'cautionShare', 0.95, { outcome: 'fail', severity: 'caution', says: '+10 %' }),
  withParameter(warm, 'adviceShare', 0.75, { outcome: 'pass' }),
];
