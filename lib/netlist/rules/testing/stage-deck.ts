/** Facts of a 100 V MOSFET in TO-220 that no case quarrels with unless it says so. */
export const fetFacts = 'vds_max=100 vgs_max=20 vth_min=2 vth_typ=3 vth_max=4 rds_on=40m rds_on_spec_vgs=10 id_max=30 qg=60n';

/** An N-channel MOSFET `Q1` between `drain` and 0 V with its gate on `gate`; `facts` replaces or adds to the usual ones. */
export const nFet = (facts = fetFacts, gate = 'gate', drain = 'drain', source = '0'): string =>
  `MQ1 ${drain} ${gate} ${source} ${source} NM\n*@MQ1 ref=Q1 kind=NMOS ${facts}`;

/** A P-channel MOSFET `Q1` from `source` down to `drain`. */
export const pFet = (facts = fetFacts, gate = 'gate', drain = 'drain', source = 'vbus'): string =>
  `MQ1 ${drain} ${gate} ${source} ${source} PM\n*@MQ1 ref=Q1 kind=PMOS ${facts}`;

/** 12 V supply `V1` on `vbus` and a 24 Ω heater from it to `drain`. */
export const heaterStage = (volts = '12'): string => `V1 vbus 0 ${volts}\n*@V1 role=supply\nRL vbus drain 24\n*@RL load=heater`;

/** Control source `V2` on `drv`: 0 and `high` volts behind `rs` ohms. */
export const control = (high = '12', facts = 'role=generator rs=50'): string => `V2 drv 0 0\n*@V2 high=${high} low=0 ${facts}`;

/** A resistor with a comfortable rating. */
export const resistor = (ref: string, a: string, b: string, ohms: string, facts = 'pmax=0.25 vmax=250'): string => `${ref} ${a} ${b} ${ohms}\n*@${ref} ${facts}`;

/** A removable lead. */
export const lead = (ref: string, a: string, b: string): string => `R${ref} ${a} ${b} 1m\n*@R${ref} ref=${ref} kind=lead`;

/** An LED with its ratings. */
export const led = (ref: string, anode: string, cathode: string, facts = 'vf=2 if_max=25m'): string => `${ref} ${anode} ${cathode} DLED\n*@${ref} kind=LED ${facts}`;

export const deck = (...lines: readonly string[]): string => lines.join('\n');
