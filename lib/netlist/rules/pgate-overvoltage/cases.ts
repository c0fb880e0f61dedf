import { withParameter, type RuleCase } from '../testing/rule-case';

const stage = (rail: string, gate: string, facts = 'vgs_max=20') => `V1 vcc 0 ${rail}
*@V1 role=supply
RL d 0 100
*@RL load=heater
M1 d g vcc vcc PM
*@M1 kind=PMOS vds_max=100 vth_min=2 vth_max=4 rds_on=0.1 rds_on_spec_vgs=10 ${facts}
${gate}
M2 x in 0 0 NM
*@M2 kind=NMOS vds_max=100 vgs_max=20 vth_min=1 vth_max=2 rds_on=0.1 rds_on_spec_vgs=4.5
RPD in 0 10k
*@RPD pmax=0.25
VG in 0 PULSE(0 5 0 50n 50n 20u 40u)
*@VG role=pin
.model PM PMOS(VTO=-3 KP=5)
.model NM NMOS(VTO=1.5 KP=5)`;
const straight = 'RPU vcc g 10k\n*@RPU pmax=0.5\nRX g x 1\n*@RX pmax=0.5';
const divided = 'RPU vcc g 10k\n*@RPU pmax=0.5\nRX g x 22k\n*@RX pmax=0.5';

const warm: RuleCase = { name: '17 V on a 20 V gate', deck: stage('17', straight), expect: { outcome: 'fail', severity: 'caution', refs: ['M1'], says: 'of its 20 V' } };

/** `docs/rules.md` 6; common practice, no source. */
export const cases: readonly RuleCase[] = [
  { name: 'gate pulled to 0 V on a 36 V rail', deck: stage('36', straight), expect: { outcome: 'fail', severity: 'stop', refs: ['M1'], says: 'the oxide is rated 20 V', state: 'high' } },
  { name: 'a 12 V gate on 24 V', deck: stage('24', straight, 'vgs_max=12'), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'a rating printed with its sign', deck: stage('36', straight, 'vgs_max=-20'), expect: { outcome: 'fail', severity: 'stop' } },
  warm,
  { name: 'just over the rating', deck: stage('20.1', straight), expect: { outcome: 'fail', severity: 'stop' } },
  { name: 'just under 80 %', deck: stage('15.9', straight), expect: { outcome: 'pass' } },
  { name: 'the pull-up split into a divider', deck: stage('36', divided), expect: { outcome: 'pass' } },
  { name: 'a zener from gate to source', deck: stage('36', `${divided.replace('22k', '2.2k')}\nD1 g vcc DZ\n*@D1 kind=zener vz=12 pmax=0.5`), expect: { outcome: 'pass' } },
  { name: '12 V rail', deck: stage('12', straight), expect: { outcome: 'pass' } },
  { name: 'no rating given', deck: stage('36', straight, ''), expect: { outcome: 'undetermined', says: 'V_GS maximum' } },
  { name: 'no P-channel part', deck: 'V1 vcc 0 12\n*@V1 role=supply\nR1 vcc 0 10k\n*@R1 pmax=0.25', expect: { outcome: 'none' } },
  withParameter(warm, 'cautionShare', 0.9, { outcome: 'pass' }),
];
