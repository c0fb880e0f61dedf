import { withParameter, type RuleCase } from '../testing/rule-case';

const stage = (high: string, more = '', facts = 'vgs_max=20') => `V1 vcc 0 24
*@V1 role=supply
RL vcc d 100
*@RL load=heater
M1 d g 0 0 NM
*@M1 kind=NMOS vds_max=100 vth_min=2 vth_max=4 rds_on=0.044 rds_on_spec_vgs=10 ${facts}
RG drv g 470
*@RG pmax=0.25
RPD g 0 100k
*@RPD pmax=0.25
VG drv 0 PULSE(0 ${high} 0 50n 50n 4u 40u)
*@VG role=generator
.model NM NMOS(VTO=3 KP=20)
${more}`;

/** Drive that puts exactly `volts` on the gate behind 470 Ω and 100 kΩ. */
const driveFor = (volts: number): string => String((volts * 100_470) / 100_000);

const warm: RuleCase = { name: '17 V on a 20 V gate', deck: stage(driveFor(17)), expect: { outcome: 'fail', severity: 'caution', refs: ['M1', 'VG'], says: '85 % of its 20 V' } };

/** `docs/rules.md` 21; the 20 V limit of a 2N7000 is continuous, ±40 V is for 50 µs (`docs/sources.md` 12.3, 15.8). */
export const cases: readonly RuleCase[] = [
  {
    name: 'a high-side gate whose rail is up while the bus is off',
    deck: 'V1 bus 0 40\n*@V1 role=supply\nV3 v52 0 52\n*@V3 role=supply\nM1 bus g s s NM\n*@M1 kind=NMOS vds_max=100 vgs_max=20 vth_min=2 vth_max=4 rds_on=0.044 rds_on_spec_vgs=10\nRL s 0 20\n*@RL load=heater\nR1 v52 g 10k\n*@R1 pmax=0.5\nVG pin 0 0\n*@VG role=pin high=5 low=0\nR3 pin b 4.7k\nR4 b 0 47k\nQ1 g b 0 NX\n*@Q1 kind=NPN vceo_max=80\n.model NM NMOS(VTO=3 KP=20)\n.model NX NPN',
    expect: { outcome: 'fail', severity: 'stop', refs: ['M1'] },
  },
  { name: '24 V drive', deck: stage('24'), expect: { outcome: 'fail', severity: 'stop', refs: ['M1', 'VG'], says: 'the oxide is rated 20 V', state: 'high' } },
  { name: 'negative drive counts as well', deck: stage('12', '').replace('PULSE(0 12', 'PULSE(-24 12'), expect: { outcome: 'fail', severity: 'stop' } },
  warm,
  { name: 'just over 80 %', deck: stage(driveFor(16.1)), expect: { outcome: 'fail', severity: 'caution' } },
  { name: 'just under 80 %', deck: stage(driveFor(15.9)), expect: { outcome: 'pass' } },
  { name: 'just over the rating', deck: stage(driveFor(20.1)), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'just under the rating', deck: stage(driveFor(19.9)), expect: { outcome: 'fail', severity: 'caution' } },
  { name: '12 V drive', deck: stage('12'), expect: { outcome: 'pass' } },
  { name: 'a 12 V zener takes the 24 V', deck: stage('24', 'D1 0 g DZ\n*@D1 kind=zener vz=12 pmax=0.5'), expect: { outcome: 'pass' } },
  { name: 'no rating given', deck: stage('24', '', ''), expect: { outcome: 'undetermined', says: 'V_GS maximum' } },
  { name: 'no MOSFET', deck: 'V1 vcc 0 12\n*@V1 role=supply\nR1 vcc 0 10k\n*@R1 pmax=0.25', expect: { outcome: 'none' } },
  withParameter(warm, 'cautionShare', 0.9, { outcome: 'pass' }),
];
