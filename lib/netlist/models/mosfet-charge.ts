/** Capacitances of a sheet, farads, at `volts` of V_DS. */
export interface CapacitanceSheet {
  readonly ciss: number;
  readonly coss: number;
  readonly crss: number;
  readonly volts: number;
}

/** Gate charge of a sheet: coulombs, and the condition under which it stands. */
export interface GateChargeSheet {
  readonly qg: number;
  readonly qgd?: number;
  /** V_GS reached, volts. */
  readonly gateVolts: number;
  /** Bus from which V_DS falls, volts. */
  readonly busVolts: number;
  /** Volts lost in the source resistance, and across the channel when on. */
  readonly sourceVolts: number;
  readonly channelVolts: number;
  readonly plateau: number;
}

/** VDMOS parameters of the capacitances. */
export interface ChargeFit {
  readonly cgs: number;
  readonly cgdmax: number;
  readonly cgdmin: number;
  readonly a: number;
  readonly cjo: number;
  readonly from: 'gate charge' | 'assumed, five times C_rss' | 'C_rss throughout, Q_g contradicts it';
}

const bodyVolts = 0.8;
/** Without Q_g the gate-drain capacitance at V_DS = 0 is taken as this many times C_rss. */
const assumedRise = 5;

/**
 * Gate-drain capacitance of ngspice's VDMOS: S·atan(A·v) + Y below v = V_GD = 0 and S·tanh(A·v) + Y above, with
 * S = (CGDMAX − CGDMIN)/(1 + π/2) and Y = CGDMAX − S. For each A the total charge is linear in CGDMAX; A is the feasible
 * one nearest Q_gd, else nearest 1. Source: docs/engine.md 3.1, steps 5 and 6; the law itself sources.md 13.
 */
export function fitCharge(sheet: CapacitanceSheet, charge?: GateChargeSheet): ChargeFit {
  const cgs = Math.max(0, sheet.ciss - sheet.crss);
  const cjo = Math.max(0, sheet.coss - sheet.crss) * Math.sqrt(1 + sheet.volts / bodyVolts);
  if (charge === undefined) {
    const cgdmax = assumedRise * sheet.crss;
    return { cgs, cjo, a: 1, cgdmax, cgdmin: smallest(cgdmax, sheet, 1), from: 'assumed, five times C_rss' };
  }

  let best: { readonly a: number; readonly cgdmax: number; readonly cost: number } | null = null;
  for (let a = 0.1; a < 5.01; a *= 1.05) {
    const cgdmax = largestFor(a, cgs, sheet, charge);
    const ceiling = sheet.crss / (1 - fall(a, sheet.volts));
    if (!(cgdmax >= sheet.crss && cgdmax <= ceiling)) continue;
    const cost = charge.qgd === undefined
      ? Math.abs(Math.log(a))
      : Math.abs(gateDrainCharge(a, cgdmax, sheet, charge) / charge.qgd - 1);
    if (best === null || cost < best.cost) best = { a, cgdmax, cost };
  }
  if (best === null) {
    return { cgs, cjo, a: 1, cgdmax: sheet.crss, cgdmin: sheet.crss, from: 'C_rss throughout, Q_g contradicts it' };
  }
  return { cgs, cjo, a: best.a, cgdmax: best.cgdmax, cgdmin: smallest(best.cgdmax, sheet, best.a), from: 'gate charge' };
}

/** Part of the way from CGDMAX to CGDMIN that is done at V_DS = `volts`. */
function fall(a: number, volts: number): number {
  return (1 + Math.atan(a * volts)) / (1 + Math.PI / 2);
}

function smallest(cgdmax: number, sheet: CapacitanceSheet, a: number): number {
  return Math.max(0, cgdmax - (cgdmax - sheet.crss) / fall(a, sheet.volts));
}

/** CGDMAX that gives the stated total charge for this A. */
function largestFor(a: number, cgs: number, sheet: CapacitanceSheet, charge: GateChargeSheet): number {
  const k = share(a, sheet);
  const gate = charge.gateVolts - charge.sourceVolts;
  const reach = gate - charge.channelVolts;
  const bend = logCosh(a * reach) / a - atanIntegral(a, charge.busVolts);
  const span = charge.busVolts + reach;
  return (charge.qg - cgs * gate - sheet.crss * k * (span - bend)) / ((1 - k) * span + k * bend);
}

/** Charge while V_DS falls from the bus to the plateau's end. */
function gateDrainCharge(a: number, cgdmax: number, sheet: CapacitanceSheet, charge: GateChargeSheet): number {
  const s = share(a, sheet) * (cgdmax - sheet.crss);
  return (cgdmax - s) * charge.busVolts
    - s * atanIntegral(a, Math.max(0, charge.busVolts - charge.plateau))
    + (s * logCosh(a * Math.max(0, charge.plateau))) / a;
}

/** S as a part of CGDMAX − C_rss. */
function share(a: number, sheet: CapacitanceSheet): number {
  return 1 / (1 + Math.atan(a * sheet.volts));
}

function atanIntegral(a: number, volts: number): number {
  return volts * Math.atan(a * volts) - Math.log1p(a * a * volts * volts) / (2 * a);
}

function logCosh(x: number): number {
  return x + Math.log1p(Math.exp(-2 * x)) - Math.LN2;
}
