import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, fetFacts, heaterStage, lead, nFet, resistor } from '../testing/stage-deck';

const bare = deck(heaterStage(), nFet());
const pin = control('5', 'role=pin');
const pinDriven: RuleCase = { name: 'a pin drives it after boot', deck: deck(bare, resistor('R3', 'drv', 'gate', '100'), pin), expect: { outcome: 'fail', severity: 'caution', refs: ['Q1', 'V2'], state: 'high-z' } };
const leaky: RuleCase = { name: 'a leaky gate wants a smaller resistor', deck: deck(heaterStage(), nFet(`${fetFacts} igss=8u`), resistor('R3', 'drv', 'gate', '100'), pin), expect: { outcome: 'fail', severity: 'caution' } };
const unknown: RuleCase = { name: 'nothing known of the transistor', deck: deck(heaterStage(), nFet('rds_on=40m vgs_max=20'), resistor('R3', 'drv', 'gate', '100'), pin), expect: { outcome: 'fail', severity: 'caution' } };

export const cases: readonly RuleCase[] = [
  { name: 'nothing at all on the gate', deck: bare, expect: { outcome: 'fail', severity: 'stop', refs: ['Q1'], says: 'Q1 gate has no DC path to source' } },
  { name: 'series resistor to a lead that goes nowhere', deck: deck(bare, resistor('R3', 'inner', 'gate', '10'), lead('J1', 'away', 'inner')), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'a capacitor is no DC path', deck: deck(bare, 'C1 gate 0 1n\n*@C1 vmax=50', 'C2 gate drv 10n\n*@C2 vmax=50', pin), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'open switch to the supply', deck: deck(bare, 'RS1 vbus gate 1m\n*@RS1 ref=S1 kind=switch'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'switch drawn closed, floating once it opens', deck: deck(bare, 'RS1 vbus gate 1m\n*@RS1 ref=S1 kind=switch closed_switch=yes'), expect: { outcome: 'fail', severity: 'stop', says: 'once S1 is open' } },
  { name: 'one open-drain transistor without pull-up', deck: deck(bare, 'MQ2 gate g2 0 0 NM\n*@MQ2 ref=Q2 kind=NMOS vth_typ=2 rds_on=1', resistor('R5', 'drv', 'g2', '100'), resistor('R6', 'g2', '0', '22k'), pin), expect: { outcome: 'fail', severity: 'stop', says: 'while the transistor that drives it is off' } },
  { name: 'a zener alone holds no gate', deck: deck(bare, 'DZ 0 gate DZ\n*@DZ kind=zener vz=12'), expect: { outcome: 'fail', severity: 'stop' } },
  pinDriven,
  { name: 'a controller pin told by its inside', deck: deck(bare, 'D9 gate vdd DX\n*@D9 internal=pin-protection-diode', 'V3 vdd 0 5'), expect: { outcome: 'fail', severity: 'caution' } },
  leaky,
  unknown,
  { name: 'pull-down at the gate', deck: deck(bare, resistor('R3', 'drv', 'gate', '100'), resistor('R2', 'gate', '0', '22k'), pin), expect: { outcome: 'pass' } },
  { name: 'pull-down at the pin', deck: deck(bare, resistor('R3', 'drv', 'gate', '100'), resistor('R2', 'drv', '0', '22k'), pin), expect: { outcome: 'pass' } },
  { name: 'gate tied to its source', deck: deck(heaterStage(), nFet(fetFacts, '0')), expect: { outcome: 'pass' } },
  { name: 'totem pole of two transistors', deck: deck(bare, 'Q2 vbus b gate QN\n*@Q2 kind=NPN', 'Q3 0 b gate QP\n*@Q3 kind=PNP', resistor('R7', 'drv', 'b', '1k'), pin), expect: { outcome: 'pass' } },
  { name: 'pulled up to the supply with an open-drain transistor', deck: deck(bare, resistor('R8', 'vbus', 'gate', '10k'), 'MQ2 gate g2 0 0 NM\n*@MQ2 ref=Q2 kind=NMOS vth_typ=2 rds_on=1', resistor('R6', 'g2', '0', '22k'), resistor('R5', 'drv', 'g2', '100'), pin), expect: { outcome: 'pass' } },
  { name: 'a part that is not examined drives it', deck: deck(bare, 'X1 gate vbus 0 DRIVER\n.subckt DRIVER a b c\nR1 a c 1k\n.ends'), expect: { outcome: 'undetermined' } },
  { name: 'light drives an optocoupler', deck: deck('V1 vbus 0 12\n*@V1 role=supply', resistor('R1', 'vbus', 'c', '4.7k'), 'Q1 c b 0 NX\n*@Q1 kind=opto-transistor\n.model NX NPN'), expect: { outcome: 'none' } },
  { name: 'no transistor', deck: heaterStage(), expect: { outcome: 'none' } },
  withParameter(leaky, 'thresholdShare', 0.2, { outcome: 'fail', severity: 'caution' }),
  withParameter(unknown, 'assumedThreshold', 0.5, { outcome: 'fail', severity: 'caution' }),
];
