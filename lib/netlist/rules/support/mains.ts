import type { Circuit } from '../../circuit/circuit';
import { isTransistor } from '../../circuit/part-nature';
import { endNets, terminalsOf } from '../../circuit/terminals';
import type { NetlistPart } from '../../netlist';

/** Whether a mains source feeds a part: `margin-at-mains` then speaks of its voltage. */
export function isMainsFed(circuit: Circuit, part: NetlistPart): boolean {
  if (circuit.mainsNets.size === 0) return false;
  if (isTransistor(part)) {
    const { output, reference } = terminalsOf(part);
    return circuit.mainsNets.has(output) || circuit.mainsNets.has(reference);
  }
  return (endNets(part) ?? []).some((net) => circuit.mainsNets.has(net));
}
