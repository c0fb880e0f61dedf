import type { RuleCase } from '../testing/rule-case';

const supply = 'V1 vcc 0 12\n*@V1 role=supply';
const relay = (a: string, b: string) => `L1 ${a} x 0.5\n*@L1 load=relay\nRC x ${b} 100\n*@RC internal=winding`;
const npn = `Q1 c b 0 NX
*@Q1 kind=NPN vceo_max=40 ic_max=0.6 hfe_min=100
RB drv b 1k
*@RB pmax=0.25
RBE b 0 10k
*@RBE pmax=0.25
VG drv 0 PULSE(0 5 0 1u 1u 1m 2m)
*@VG role=pin
.model NX NPN(IS=1e-14 BF=150)`;
const pnp = `Q1 c b vcc PX
*@Q1 kind=PNP vceo_max=40 ic_max=0.6 hfe_min=100
RB drv b 1k
*@RB pmax=0.25
RBE b vcc 10k
*@RBE pmax=0.25
VG drv 0 PULSE(0 12 0 1u 1u 1m 2m)
*@VG role=pin
.model PX PNP(IS=1e-14 BF=150)`;
const diode = (anode: string, cathode: string, kind = 'diode') => `D1 ${anode} ${cathode} DX\n*@D1 kind=${kind} vr_max=1000 if_max=1\n.model DX D(IS=1e-9 N=1.8)`;

/** `docs/rules.md` 8; common practice, no source. */
export const cases: readonly RuleCase[] = [
  { name: 'anode at the supply, low-side switch', deck: `${supply}\n${relay('vcc', 'c')}\n${npn}\n${diode('vcc', 'c')}`, expect: { outcome: 'fail', severity: 'stop', refs: ['D1', 'L1', 'Q1'], says: 'D1 is the wrong way round' } },
  { name: 'a Schottky the wrong way round', deck: `${supply}\n${relay('vcc', 'c')}\n${npn}\n${diode('vcc', 'c', 'schottky')}`, expect: { outcome: 'fail' } },
  { name: 'high-side switch, anode at the switch', deck: `${supply}\n${relay('c', '0')}\n${pnp}\n${diode('c', '0')}`, expect: { outcome: 'fail', refs: ['D1', 'L1', 'Q1'] } },
  { name: 'stripe to plus', deck: `${supply}\n${relay('vcc', 'c')}\n${npn}\n${diode('c', 'vcc')}`, expect: { outcome: 'pass' } },
  { name: 'a Schottky, stripe to plus', deck: `${supply}\n${relay('vcc', 'c')}\n${npn}\n${diode('c', 'vcc', 'schottky')}`, expect: { outcome: 'pass' } },
  { name: 'high-side switch, stripe to the switch', deck: `${supply}\n${relay('c', '0')}\n${pnp}\n${diode('0', 'c')}`, expect: { outcome: 'pass' } },
  { name: 'no diode at all is flyback-missing', deck: `${supply}\n${relay('vcc', 'c')}\n${npn}`, expect: { outcome: 'none' } },
  { name: 'a diode elsewhere', deck: `${supply}\n${relay('vcc', 'c')}\n${npn}\nR9 vcc a 10k\n*@R9 pmax=0.25\n${diode('a', '0')}`, expect: { outcome: 'none' } },
];
