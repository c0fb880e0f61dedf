import type { Circuit } from '../../circuit/circuit';
import { clampsOf, tankOf } from '../../circuit/clamps';
import { switchedCoils } from '../../circuit/coils';
import { isFet, isTransistor } from '../../circuit/part-nature';
import { terminalsOf } from '../../circuit/terminals';
import type { NetlistPart } from '../../netlist';
import { voltsOf } from '../../points/point-set';
import type { FactKey } from '../../facts/fact-registry';
import type { Measure } from './stress';

/** A semiconductor that blocks a voltage: the fact that bounds it and how it is read. */
export interface Blocking {
  readonly part: NetlistPart;
  readonly fact: FactKey;
  readonly words: string;
  /** What is said of it: `drain to source`. */
  readonly across: string;
  /** Blocked volts at a point, what its clamp adds at turn-off included. */
  readonly measure: Measure;
  /** Volts that a clamp adds at turn-off, 0 without a coil. */
  readonly clampVolts: number;
  readonly inductive: boolean;
}

function clampVolts(circuit: Circuit, part: NetlistPart): { readonly volts: number; readonly inductive: boolean } {
  const stage = circuit.stages.find((one) => one.transistor.id === part.id);
  const coils = stage ? switchedCoils(circuit, stage) : [];
  const volts = coils.map((coil) => {
    const clamps = clampsOf(circuit, coil);
    return clamps.length === 0 ? 0 : Math.min(...clamps.map((clamp) => clamp.volts));
  });
  return { volts: Math.max(0, ...volts), inductive: coils.length > 0 };
}

/** Rails that feed a tank which the transistor keeps swinging: its peak is π times their volts (`docs/rules.md` 28). */
function tankRails(circuit: Circuit, part: NetlistPart): readonly string[] {
  const stage = circuit.stages.find((one) => one.transistor.id === part.id);
  return (stage ? switchedCoils(circuit, stage) : []).filter((coil) => tankOf(circuit, coil) !== null)
    .flatMap(({ far }) => [...far].filter((net) => circuit.rails.has(net)));
}

function transistorBlocking(circuit: Circuit, part: NetlistPart): Blocking {
  const { output, reference } = terminalsOf(part);
  const rails = tankRails(circuit, part);
  const { volts, inductive } = clampVolts(circuit, part);
  return {
    part, fact: isFet(part) ? 'vds_max' : 'vceo_max', words: isFet(part) ? 'V_DS maximum' : 'V_CEO maximum',
    across: isFet(part) ? 'V_DS' : 'V_CE', clampVolts: volts, inductive,
    measure: (point) => Math.max(
      Math.abs(voltsOf(point, output) - voltsOf(point, reference)) + volts,
      ...rails.map((net) => Math.PI * Math.abs(voltsOf(point, net) - voltsOf(point, reference))),
    ),
  };
}

function diodeBlocking(part: NetlistPart): Blocking {
  const [anode, cathode] = [part.pins.A ?? '', part.pins.K ?? ''];
  return {
    part, fact: 'vr_max', words: 'reverse voltage maximum', across: 'reverse voltage', clampVolts: 0, inductive: false,
    measure: (point) => voltsOf(point, cathode) - voltsOf(point, anode),
  };
}

/** Transistors and rectifying diodes of a circuit with what they block. */
export const blockingParts = (circuit: Circuit): readonly Blocking[] => circuit.netlist.parts.flatMap((part) => {
  if (isTransistor(part)) return [transistorBlocking(circuit, part)];
  return part.kind === 'diode' || part.kind === 'schottky' ? [diodeBlocking(part)] : [];
});
