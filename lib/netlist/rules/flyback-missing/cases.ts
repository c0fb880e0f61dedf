import { withParameter, type RuleCase } from '../testing/rule-case';

const supply = 'V1 vcc 0 12\n*@V1 role=supply';
const npn = `Q1 c b 0 NX
*@Q1 kind=NPN vceo_max=40 ic_max=0.6 hfe_min=100
RB drv b 1k
*@RB pmax=0.25
RBE b 0 10k
*@RBE pmax=0.25
VG drv 0 PULSE(0 5 0 1u 1u 1m 2m)
*@VG role=pin
.model NX NPN(IS=1e-14 BF=150)`;
const relay = 'L1 vcc x 0.5\n*@L1 load=relay\nRC x c 100\n*@RC internal=winding';
const diode = (anode: string, cathode: string) => `D1 ${anode} ${cathode} DX\n*@D1 kind=diode vr_max=1000 if_max=1\n.model DX D(IS=1e-9 N=1.8)`;

/** A 1.3 µH wire at 1.67 A: 1.8 µJ (`docs/rules.md` C). */
const fet = (facts: string, drive = 'PULSE(0 12 0 50n 50n 1m 2m)') => `M1 d g 0 0 NM
*@M1 kind=NMOS vds_max=100 vgs_max=20 vth_min=2 vth_max=4 rds_on=0.037 rds_on_spec_vgs=10 ${facts}
RG drv g 100
*@RG pmax=0.25
RPD drv 0 22k
*@RPD pmax=0.25
VG drv 0 ${drive}
*@VG role=generator
.model NM NMOS(VTO=3 KP=20)`;
const wire = (henries: string) => `R1 vcc m 7.15\n*@R1 load=heater\nL1 m d ${henries}`;

const bare: RuleCase = {
  name: 'a relay without a diode', deck: `${supply}\n${relay}\n${npn}`,
  expect: { outcome: 'fail', severity: 'stop', refs: ['L1', 'Q1'], says: 'L1 has no way on for its current when Q1 opens' },
};
const atLimit = (henries: string, name: string, expect: RuleCase['expect']): RuleCase => ({ name, deck: `${supply}\n${wire(henries)}\n${fet('e_as=100u')}`, expect });

/** `docs/rules.md` 1 and C; V = L·di/dt, E = ½·L·I². */
export const cases: readonly RuleCase[] = [
  bare,
  { name: 'a motor on a MOSFET without avalanche rating', deck: `${supply}\nL1 vcc x 2m\n*@L1 load=motor\nRW x d 2\n*@RW internal=winding\n${fet('')}`, expect: { outcome: 'fail', refs: ['L1', 'M1'] } },
  { name: 'a diode to a net that is not the coil’s other end', deck: `${supply}\n${relay}\n${npn}\nR9 vcc far 10k\n*@R9 pmax=0.25\n${diode('0', 'c')}`, expect: { outcome: 'fail' } },
  { name: 'a diode across the coil', deck: `${supply}\n${relay}\n${npn}\n${diode('c', 'vcc')}`, expect: { outcome: 'pass' } },
  { name: 'a diode with a resistor in series', deck: `${supply}\n${relay}\n${npn}\nR9 k vcc 47\n*@R9 pmax=1\n${diode('c', 'k')}`, expect: { outcome: 'pass' } },
  { name: 'a zener across the switch', deck: `${supply}\n${relay}\n${npn}\nD2 0 c DZ\n*@D2 kind=zener vz=24\n.model DZ D(BV=24)`, expect: { outcome: 'pass' } },
  { name: 'an RC across the switch', deck: `${supply}\n${relay}\n${npn}\nR9 c s 100\n*@R9 pmax=1\nC9 s 0 100n\n*@C9 vmax=400`, expect: { outcome: 'pass' } },
  { name: 'wire inductance against 81 mJ', deck: `${supply}\n${wire('1.3u')}\n${fet('e_as=81m')}`, expect: { outcome: 'pass', says: 'takes that itself' } },
  atLimit('17.9u', 'just under a quarter of E_AS', { outcome: 'pass' }),
  atLimit('18.5u', 'just over a quarter of E_AS', { outcome: 'fail' }),
  { name: 'the energy of every turn-off together', deck: `${supply}\n${wire('1.3u')}\n${fet('e_as=81m rth_ja=62', 'PULSE(0 12 0 50n 50n 2u 5u)')}\n*@VG fsw=200k`, expect: { outcome: 'fail' } },
  { name: 'a diode the wrong way round is flyback-reversed', deck: `${supply}\n${relay}\n${npn}\n${diode('vcc', 'c')}`, expect: { outcome: 'not applicable' } },
  { name: 'no coil', deck: `${supply}\nR1 vcc d 6\n*@R1 load=heater\n${fet('')}`, expect: { outcome: 'none' } },
  withParameter(atLimit('18.5u', 'half of E_AS', { outcome: 'fail' }), 'energyShare', 0.5, { outcome: 'pass' }),
  withParameter({ name: 'more heating allowed', deck: `${supply}\n${wire('1.3u')}\n${fet('e_as=81m rth_ja=62', 'PULSE(0 12 0 50n 50n 2u 5u)')}\n*@VG fsw=200k`, expect: { outcome: 'fail' } }, 'heating', 100, { outcome: 'pass' }),
  withParameter(bare, 'fastFrom', 100, { outcome: 'fail' }),
];
