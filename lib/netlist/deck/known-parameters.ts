const words = (text: string): ReadonlySet<string> => new Set(text.split(/\s+/));

/** Parameters of a `.model` card that the engine knows, by type (ngspice manual, chapters on diodes, BJTs, MOSFETs, switches, R, C, L). */
const diode = words(`is js jsw n ns rs tt cjo cj0 cj vj pb m mj fc fcs cjp cjsw php mjsw ik ikf ikr nbv bv ibv nr isr eg xti tnom tref
  kf af area pj level ibvl nbvl vp gap1 gap2 cta tm1 tm2 tt1 tt2 trs trs1 trs2 tbv1 tcv fv_max bv_max id_max te_max pd_max rth0 cth0`);
const bipolar = words(`is bf nf vaf va ikf ik ise c2 ne br nr var vb ikr isc c4 nc rb irb rbm re rc cje vje pe mje me tf xtf vtf itf ptf
  cjc vjc pc mjc mc xcjc tr cjs csub vjs ps mjs ms xtb eg xti kf af fc tnom tref ibe ibc iss ns rco vo gamma qco level subs
  tre1 tre2 trc1 trc2 trb1 trb2 trm1 trm2 vbe_max vbc_max vce_max ic_max ib_max pd_max te_max rth0`);
const mosfet = words(`level vto vt0 kp gamma phi lambda rd rs cbd cbs is pb cgso cgdo cgbo rsh cj mj cjsw mjsw js tox ld u0 uo fc nsub tpg nss
  delta uexp ucrit vmax xj neff utra eta theta kappa nfs alpha kf af tnom ng w l vgs_max vgd_max vgb_max vds_max vbs_max vbd_max`);
const vdmos = words(`vto vth vt0 vth0 kp phi lambda theta rd rs rg rq vq mtriode tnom kf af subshift ksubthres subthres bv ibv nbv rds rb n tt eg xti
  is vj cjo m fc cgdmin cgdmax a cgs cjo rthjc rthca cthj mu texp0 texp1 tcvth tksubthres1 tksubthres2 trb1 trb2 trg1 trg2
  trs1 trs2 trd1 trd2 vgs_max vgd_max vds_max vgsr_max vgdr_max pd_max id_max idr_max te_max rth_ext derating scale`);

export const modelParameters: Readonly<Record<string, ReadonlySet<string>>> = {
  d: diode, npn: bipolar, pnp: bipolar, nmos: mosfet, pmos: mosfet, vdmos,
  sw: words('vt vh ron roff'),
  r: words('tc1 tc2 tce rsh defw defl narrow short tnom kf af r res bv_max lf wf ef'),
  c: words('cap cj cjsw defw defl narrow short tc1 tc2 tnom di thick bv_max'),
  l: words('ind csect dia length tc1 tc2 tnom nt mu'),
};

/** MOSFET levels that are read; the others have parameters by the hundred. */
export const mosfetLevels: ReadonlySet<number> = new Set([1, 2, 3, 6]);

/** Words of a card that are no numbers. */
export const modelFlags: ReadonlySet<string> = words('nchan pchan on off');

/** Parameters of an element, by its letter. */
export const instanceParameters: Readonly<Record<string, ReadonlySet<string>>> = {
  R: words('w l tc1 tc2 tce m scale temp dtemp ac noisy'),
  C: words('ic w l tc1 tc2 m scale temp dtemp'),
  L: words('ic nt tc1 tc2 m scale temp dtemp'),
  D: words('area pj w l m ic temp dtemp'),
  M: words('w l m ad as pd ps nrd nrs temp dtemp'),
  Q: words('area areab areac m temp dtemp'),
  V: words(''), I: words('m'), X: words(''),
};
