import { voltsWords } from '@/components/ladder/plan-words';
import { factRegistry, type FactKey } from '@/lib/netlist/facts/fact-registry';
import { formatFact } from '@/lib/netlist/facts/read-fact';
import type { Finding, RemedyEdit } from '@/lib/netlist/findings/finding';
import { kindRegistry } from '@/lib/netlist/kinds/kind-registry';
import type { Kind } from '@/lib/netlist/kinds/kind';
import type { FactValue } from '@/lib/netlist/netlist';

/** Head and rest of a message: its first sentence stands as a heading. */
export function splitMessage(message: string): { readonly head: string; readonly rest: string } {
  const cut = /^(.{12,}?[^\d\s])[.:]\s+(?=\S)/u.exec(message);
  if (!cut || cut[1] === undefined || message.length < 60) return { head: message.replace(/\.$/u, ''), rest: '' };
  return { head: cut[1], rest: message.slice(cut[0].length) };
}

/** From which voltage on a finding is true, as the head of its entry says it. */
export function fromWords(finding: Finding, plan: readonly { readonly name: string; readonly volts: number }[]): string {
  const crossing = finding.evidence.find((evidence) => evidence.quantity === 'crossing' && typeof evidence.value === 'number');
  if (finding.holdPoint === null || plan.length === 0) return 'as drawn';
  if (crossing && typeof crossing.value === 'number') return `from ${voltsWords(Number(crossing.value.toPrecision(3)))}`;
  if (finding.holdPoint === plan[0]?.name) return 'every hold point';
  const volts = finding.fromVolts === null ? finding.holdPoint : voltsWords(finding.fromVolts);
  return finding.holdPoint === plan.at(-1)?.name ? `at ${volts}` : `from ${volts}`;
}

/** True when the sheet is shown below the voltage from which the finding is true. */
export function notReached(finding: Finding, shownVolts: number | null): boolean {
  return shownVolts !== null && finding.fromVolts !== null && finding.fromVolts > shownVolts;
}

function factsWords(kindId: string, values: Readonly<Record<string, unknown>>): string {
  const kind = (kindRegistry as Partial<Record<string, Kind>>)[kindId];
  return Object.entries(values).flatMap(([key, value]) => {
    if (value === null || value === undefined) return [];
    const known = kind && key in factRegistry;
    return [known ? formatFact(kind, key as FactKey, value as FactValue) : `${key} ${String(value)}`];
  }).join(', ');
}

/** Nets that people named, or 0 V; an unnamed net's number means nothing to a reader, and the remedy's words say where it is. */
const namedNet = (net: string): string | null => (net === '0' ? '0 V' : /^N[0-9]+$/.test(net) ? null : net);

const placeWords = (nets: readonly (string | null)[]): string => (nets.includes(null) ? '' : ` from ${nets.join(' to ')}`);

/** One edit of a proposed change, in words. */
export function editWords(edit: RemedyEdit): string {
  switch (edit.edit) {
    case 'add part': {
      const kind = (kindRegistry as Partial<Record<string, Kind>>)[edit.kind];
      return `${kind?.title ?? edit.kind} ${factsWords(edit.kind, edit.facts)}${placeWords(Object.values(edit.pins).map(namedNet))}`;
    }
    case 'set facts': return `${edit.part}: ${factsWords('', edit.facts)}`;
    case 'move pin': return `${edit.part}:${edit.pin} moves to ${namedNet(edit.net) ?? 'another net'}`;
    case 'swap pins': return `${edit.part} is turned round`;
    case 'rename part': return `The part is called ${edit.ref}`;
    case 'leave open': return `${edit.part}:${edit.pin} is marked as left open`;
    case 'rename net': return `Net ${edit.from} is called ${edit.to}`;
  }
}
