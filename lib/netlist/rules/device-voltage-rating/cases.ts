import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, nFet, resistor } from '../testing/stage-deck';

const drive = deck(resistor('R3', 'drv', 'gate', '10'), resistor('R2', 'drv', '0', '22k'), control());
const facts = (vds: number): string => `vds_max=${vds} vgs_max=20 vth_min=2 vth_typ=3 vth_max=4 rds_on=40m rds_on_spec_vgs=10`;
const switching = (volts: string, vds: number, load = 'RL vbus drain 24\n*@RL load=heater'): string => deck(`V1 vbus 0 ${volts}\n*@V1 role=supply`, load, nFet(facts(vds)), drive);
const relay = 'L1 vbus drain 10m\n*@L1 dcr=100';
const oscillator = (volts: string, vds: number): string => deck(
  `V1 vbus 0 ${volts}\n*@V1 role=supply`, 'L1 vbus mid 100u\n*@L1 dcr=10m', 'L2 drain mid 2u\n*@L2 dcr=5m', 'L3 mid other 2u\n*@L3 dcr=5m', 'C1 drain other 680n\n*@C1 vmax=630',
  resistor('R1', 'vbus', 'gate', '470', 'pmax=3'), resistor('R2', 'vbus', 'g2', '470', 'pmax=3'), resistor('R3', 'gate', '0', '470', 'pmax=3'), resistor('R4', 'g2', '0', '470', 'pmax=3'),
  'D1 gate other DX\n*@D1 vr_max=400\nD2 g2 drain DX\n*@D2 vr_max=400', nFet(facts(vds)), `MQ2 other g2 0 0 NM\n*@MQ2 ref=Q2 kind=NMOS ${facts(vds + 20)}`,
);
const close: RuleCase = { name: '48 V on 55 V', deck: switching('48', 55), expect: { outcome: 'fail', severity: 'caution', refs: ['Q1'], says: '87.3 %' } };

export const cases: readonly RuleCase[] = [
  { name: '60 V on 55 V', deck: switching('60', 55), expect: { outcome: 'fail', severity: 'stop', refs: ['Q1'], says: 'Q1 is to block 60 V' } },
  close,
  { name: 'a zener across the coil adds to the supply', deck: deck(switching('24', 40, relay), 'DZ drain vz DZ\n*@DZ kind=diode vr_max=100', 'DC vbus vz DZZ\n*@DC kind=zener vz=24'), expect: { outcome: 'fail', severity: 'stop', says: 'of its clamp included' } },
  { name: 'just over, by the diode’s volt', deck: deck(switching('54.1', 55, relay), 'D1 drain vbus DX\n*@D1 vr_max=200'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'over at +10 % only', deck: switching('53', 55), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'at 80 %', deck: switching('44', 55), expect: { outcome: 'pass' } },
  { name: 'just over 80 %', deck: switching('44.1', 55), expect: { outcome: 'fail', severity: 'caution' } },
  { name: '12 V on 100 V', deck: switching('12', 100), expect: { outcome: 'pass' } },
  { name: 'a relay with its diode', deck: deck(switching('24', 60, relay), 'D1 drain vbus DX\n*@D1 vr_max=100'), expect: { outcome: 'pass' } },
  { name: 'a diode blocks the supply', deck: deck('V1 vbus 0 60\n*@V1 role=supply', 'D1 0 vbus DX\n*@D1 vr_max=50', 'R1 vbus 0 10k'), expect: { outcome: 'fail', severity: 'stop', refs: ['D1'] } },
  { name: 'a self-oscillating pair rings to π times its supply', deck: oscillator('24', 80), expect: { outcome: 'fail', severity: 'caution', refs: ['Q1'] } },
  { name: 'with room for π times its supply', deck: oscillator('24', 200), expect: { outcome: 'pass' } },
  { name: 'no V_DS maximum', deck: deck('V1 vbus 0 12\n*@V1 role=supply\nRL vbus drain 24\n*@RL load=heater', nFet('vgs_max=20 vth_min=2 vth_max=4 rds_on=40m'), drive), expect: { outcome: 'undetermined', says: 'V_DS maximum' } },
  { name: 'fed by the mains: margin-at-mains speaks', deck: switching('325', 400).replace('role=supply', 'role=mains'), expect: { outcome: 'none' } },
  { name: 'a diode fed through a capacitor', deck: 'V1 l 0 SIN(0 33.9 50)\n*@V1 rms=24\nC1 l a 1u\nD1 0 a DX\n*@D1 vr_max=50\nR1 a 0 10k', expect: { outcome: 'undetermined', says: 'needs transient' } },
  { name: 'no switch and no diode', deck: 'V1 vbus 0 60\nR1 vbus 0 1k', expect: { outcome: 'none' } },
  withParameter(close, 'cautionShare', 0.9, { outcome: 'pass' }),
];
