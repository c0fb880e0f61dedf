import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, led, nFet, resistor } from '../testing/stage-deck';

const supply = 'V1 vbus 0 12\n*@V1 role=supply';
const bare: RuleCase = { name: 'LED straight across the supply', deck: deck(supply, led('D1', 'vbus', '0', 'colour=red')), expect: { outcome: 'fail', severity: 'stop', refs: ['D1'], says: 'D1 has no resistor in its path' } };

export const cases: readonly RuleCase[] = [
  bare,
  { name: 'LED in the drain of a switch', deck: deck(supply, led('D1', 'vbus', 'drain'), nFet(), resistor('R3', 'drv', 'gate', '10'), resistor('R2', 'drv', '0', '22k'), control()), expect: { outcome: 'fail', severity: 'stop', refs: ['D1', 'Q1'] } },
  { name: 'a pin’s own 25 Ω is no series resistor', deck: deck('V2 inside 0 5\n*@V2 role=pin', 'R9 inside pin 25\n*@R9 internal=pin-resistance', led('D1', 'pin', '0')), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'a rectifier in the way limits nothing', deck: deck(supply, 'D2 vbus a DX\n*@D2 vr_max=100', led('D1', 'a', '0')), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'a cell below the LED’s own voltage drives little through it', deck: deck('V1 bat 0 3\n*@V1 role=battery rs=20', led('D1', 'bat', '0', 'vf=3.2 if_max=20m')), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'resistor above', deck: deck(supply, resistor('R1', 'vbus', 'a', '1k'), led('D1', 'a', '0')), expect: { outcome: 'pass' } },
  { name: 'resistor below', deck: deck(supply, led('D1', 'vbus', 'k'), resistor('R1', 'k', '0', '1k')), expect: { outcome: 'pass' } },
  { name: 'one resistor for two LEDs side by side', deck: deck(supply, resistor('R1', 'vbus', 'a', '1k'), led('D1', 'a', '0'), led('D2', 'a', '0')), expect: { outcome: 'pass' } },
  { name: 'resistor behind the switch', deck: deck(supply, led('D1', 'vbus', 'drain'), nFet(undefined, 'gate', 'drain', 'src'), resistor('R1', 'src', '0', '470'), resistor('R2', 'gate', '0', '22k'), control('10').replace('drv', 'gate')), expect: { outcome: 'pass' } },
  { name: 'wrong way round it never conducts', deck: deck(supply, led('D1', '0', 'vbus')), expect: { outcome: 'pass' } },
  { name: 'no LED', deck: supply, expect: { outcome: 'none' } },
  withParameter(bare, 'assumedIfMax', 0.01, { outcome: 'fail', severity: 'stop' }),
  withParameter(bare, 'assumedVf', 3, { outcome: 'fail', severity: 'stop' }),
];
