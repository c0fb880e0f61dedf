/** What a data sheet says of a MOSFET's channel; magnitudes, also of a P-channel. */
export interface ChannelSheet {
  /** V_GS(th), volts, of the corner wanted. */
  readonly threshold: number;
  /** I_D at which the threshold is stated, amps. */
  readonly thresholdCurrent: number;
  readonly onResistance: number;
  /** V_GS and I_D at which R_DS(on) is stated. */
  readonly onVolts: number;
  readonly onAmps: number;
  /** g_fs, siemens, at `transconductanceAmps` (`onAmps` unless given). */
  readonly transconductance?: number;
  readonly transconductanceAmps?: number;
  /** Plateau V_GS at `onAmps`. */
  readonly plateau?: number;
}

/** VDMOS parameters of the channel. */
export interface ChannelFit {
  readonly vto: number;
  readonly kp: number;
  readonly rs: number;
  readonly rd: number;
  readonly kpFrom: 'plateau' | 'transconductance' | 'on-resistance';
  /** R_DS(on) was kept and the transconductance gave way. */
  readonly kpRaised: boolean;
}

/** KSUBTHRES, volts: 115 mV a decade. */
export const subthreshold = 0.1;
/** Of R_DS(on) this much is laid on the source, at least `drainShare` on the drain. */
const sourceShare = 0.1;
const drainShare = 0.02;
const largestKp = 1e7;

/**
 * Fits ngspice's VDMOS law: v = s·ln(1 + e^((V_GS − VTO)/s)); saturated I_D = KP/2·v²; else I_D = KP·(v·V_DS − V_DS²/2).
 * I_D at V_GS = VTO is not zero, hence the threshold term. Null when no KP meets R_DS(on): the sheet contradicts itself.
 * Source: docs/engine.md 3.1, steps 1 to 4, verified against the engine.
 */
export function fitChannel(sheet: ChannelSheet): ChannelFit | null {
  const rs = sourceShare * sheet.onResistance;
  const first = firstKp(sheet, rs);
  let kp = first.kp;
  const enough = (candidate: number): boolean => drainResistance(sheet, candidate, rs) >= drainShare * sheet.onResistance;

  const kpRaised = !enough(kp);
  if (kpRaised) {
    let low = kp;
    let high = kp;
    while (!enough(high)) {
      high *= 2;
      if (high > largestKp) return null;
    }
    for (let step = 0; step < 80; step += 1) {
      const middle = Math.sqrt(low * high);
      if (enough(middle)) high = middle;
      else low = middle;
    }
    kp = high;
  }
  return { vto: thresholdVolts(sheet, kp, rs), kp, rs, rd: drainResistance(sheet, kp, rs), kpFrom: first.from, kpRaised };
}

function firstKp(sheet: ChannelSheet, rs: number): { readonly kp: number; readonly from: ChannelFit['kpFrom'] } {
  const { onAmps, threshold, transconductance: gfs, plateau } = sheet;
  if (gfs !== undefined && gfs * rs < 0.9) {
    const inner = gfs / (1 - gfs * rs);
    return { kp: (inner * inner) / (2 * (sheet.transconductanceAmps ?? onAmps)), from: 'transconductance' };
  }
  const overdrive = (plateau ?? 0) - onAmps * rs - threshold;
  if (plateau !== undefined && overdrive > 0) return { kp: (2 * onAmps) / overdrive ** 2, from: 'plateau' };
  const onOverdrive = Math.max(sheet.onVolts - threshold, subthreshold);
  return { kp: 1 / (0.5 * sheet.onResistance * onOverdrive), from: 'on-resistance' };
}

/** VTO at which I_D is exactly the stated current when V_GS = V_DS = V_GS(th). */
function thresholdVolts(sheet: ChannelSheet, kp: number, rs: number): number {
  const gate = Math.sqrt((2 * sheet.thresholdCurrent) / kp);
  return sheet.threshold - sheet.thresholdCurrent * rs - subthreshold * Math.log(Math.expm1(gate / subthreshold));
}

/** What is left of R_DS(on) for the drain; NaN when the channel cannot carry the current. */
function drainResistance(sheet: ChannelSheet, kp: number, rs: number): number {
  const volts = channelVolts({ vto: thresholdVolts(sheet, kp, rs), kp, rs }, sheet.onVolts, sheet.onAmps);
  return sheet.onResistance - rs - volts / sheet.onAmps;
}

/** Volts across the channel alone at a gate voltage and a drain current; NaN beyond saturation. */
export function channelVolts(
  fit: Pick<ChannelFit, 'vto' | 'kp' | 'rs'>, gateVolts: number, amps: number,
): number {
  const over = (gateVolts - amps * fit.rs - fit.vto) / subthreshold;
  const gate = over > 30 ? over * subthreshold : subthreshold * Math.log1p(Math.exp(over));
  return gate - Math.sqrt(gate * gate - (2 * amps) / fit.kp);
}
