import { kindOf } from '../kinds/kind-registry';
import type { NetlistPart } from '../netlist';
import type { Refusal } from '../points/point';
import type { Precheck, PrecheckCode } from '../precheck/precheck';

/** Findings that leave no run worth making. Floating nets are left out of it instead, with what hangs on them. */
const blocking: readonly PrecheckCode[] = ['NO_GROUND', 'V_SHORTED', 'V_OR_L_LOOP', 'UNDRIVEN'];

/** The parts that a run can hold, all of whose pins have a DC path to 0 V; or why there can be no run. */
export function runnableParts(parts: readonly NetlistPart[], checked: Precheck): readonly NetlistPart[] | Refusal {
  const blocked = checked.findings.filter(({ code }) => blocking.includes(code));
  if (blocked.length > 0) {
    return {
      code: 'precheck',
      words: blocked.map(({ words }) => words).join('; '),
      nodes: [...new Set(blocked.flatMap(({ nets }) => nets))],
      parts: [...new Set(blocked.flatMap((finding) => finding.parts))],
    };
  }
  const live = (net: string): boolean => checked.liveNets.has(net);
  const stranded = parts.find((part) => isForcing(part) && Object.values(part.pins).some(live) && !Object.values(part.pins).every(live));
  if (stranded !== undefined) {
    const nodes = Object.values(stranded.pins).filter((net) => !live(net));
    return { code: 'precheck', words: `${stranded.ref} drives a current into ${nodes.join(', ')}, which has no DC path`, nodes, parts: [stranded.ref] };
  }
  return parts.filter((part) => Object.values(part.pins).every(live));
}

/** A current source has no edge that conducts and yet forces a current. */
function isForcing(part: NetlistPart): boolean {
  return part.kind === 'box' && kindOf(part.kind).engine.edges(part).some(({ stiffness }) => stiffness === 'none');
}
