import { withParameter, type RuleCase } from '../testing/rule-case';
import { control, deck, nFet, resistor } from '../testing/stage-deck';

const drive = deck(resistor('R3', 'drv', 'gate', '10'), resistor('R2', 'drv', '0', '22k'), control('12', 'role=generator fsw=25k'));
const facts = (vds: number): string => `vds_max=${vds} vgs_max=20 vth_min=2 vth_typ=3 vth_max=4 rds_on=0.2 rds_on_spec_vgs=10`;
const filled = 'isolated=yes fuse=2 bleeder=yes earth=no';
const heater = 'RL vbus drain 200\n*@RL load=heater';
const coil = 'L1 vbus drain 180u\n*@L1 dcr=3.6\nD2 drain vbus DX\n*@D2 vr_max=600';
const bus = (vds: number, load = heater, more = filled, volts = '325'): string => deck(`V1 vbus 0 ${volts}\n*@V1 role=mains ${more}`, load, nFet(facts(vds)), drive);
const close: RuleCase = { name: '400 V part on 325 V', deck: bus(400), expect: { outcome: 'fail', severity: 'caution', refs: ['Q1'], says: '+10 %' } };
const ringing: RuleCase = { name: 'ringing passes 80 % of 450 V', deck: bus(450, coil), expect: { outcome: 'fail', severity: 'caution', says: '5 % ringing' } };
const reservoir = (vmax: number): string => deck(`V1 vbus 0 325\n*@V1 role=mains ${filled}`, `C1 vbus 0 470u\n*@C1 vmax=${vmax}`, 'R1 vbus 0 100k');
const electrolytic: RuleCase = { name: '358 V on a 400 V capacitor', deck: reservoir(400), expect: { outcome: 'fail', severity: 'caution', refs: ['C1'] } };

export const cases: readonly RuleCase[] = [
  { name: '350 V part on 325 V, the band decides', deck: bus(350), expect: { outcome: 'fail', severity: 'stop', refs: ['Q1'] } },
  close,
  ringing,
  electrolytic,
  { name: 'a 350 V capacitor', deck: reservoir(350), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'just over the rating at +10 %', deck: bus(357), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'at the rating it is a caution', deck: bus(358), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'just under 80 %', deck: bus(447), expect: { outcome: 'pass' } },
  { name: 'a 600 V part', deck: bus(600, coil), expect: { outcome: 'pass' } },
  { name: 'a 450 V capacitor', deck: reservoir(450), expect: { outcome: 'pass' } },
  { name: 'AC mains across a 275 V part', deck: deck(`V1 l 0 SIN(0 325.27 50)\n*@V1 role=mains rms=230 f=50 ${filled}`, 'C1 l 0 100n\n*@C1 vmax_ac=275', 'R1 l 0 1meg'), expect: { outcome: 'pass' } },
  { name: 'above the touch-safe limit, nothing said of it', deck: bus(600, heater, 'ilim=2'), expect: { outcome: 'fail', severity: 'advice', refs: ['V1'], says: 'does not say its isolation, fuse, bleeder and earth' } },
  { name: 'touch-safe', deck: bus(100, heater, 'ilim=2', '48'), expect: { outcome: 'pass' } },
  { name: 'no V_DS maximum', deck: deck(`V1 vbus 0 325\n*@V1 role=mains ${filled}`, heater, nFet('vgs_max=20 vth_min=2 vth_max=4 rds_on=40m'), drive), expect: { outcome: 'undetermined', says: 'V_DS maximum' } },
  { name: 'no source', deck: 'R1 a 0 1k\nR2 a 0 1k', expect: { outcome: 'none' } },
  withParameter(close, 'deviceShare', 0.95, { outcome: 'pass' }),
  withParameter(ringing, 'ringing', 0, { outcome: 'pass' }),
  withParameter(electrolytic, 'capacitorShare', 0.95, { outcome: 'pass' }),
];
