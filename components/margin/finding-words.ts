import { voltsWords } from '@/components/ladder/plan-words';
import type { Finding, RemedyEdit } from '@/lib/netlist/findings/finding';

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
  if (crossing && typeof crossing.value === 'number') return `from ${voltsWords(crossing.value)}`;
  if (finding.holdPoint === plan[0]?.name) return 'every hold point';
  const volts = finding.fromVolts === null ? finding.holdPoint : voltsWords(finding.fromVolts);
  return finding.holdPoint === plan.at(-1)?.name ? `at ${volts}` : `from ${volts}`;
}

/** True when the sheet is shown below the voltage from which the finding is true. */
export function notReached(finding: Finding, shownVolts: number | null): boolean {
  return shownVolts !== null && finding.fromVolts !== null && finding.fromVolts > shownVolts;
}

function facts(values: Readonly<Record<string, unknown>>): string {
  return Object.entries(values).filter(([, value]) => value !== null).map(([key, value]) => `${key} ${String(value)}`).join(', ');
}

/** One edit of a proposed change, in words. */
export function editWords(edit: RemedyEdit): string {
  switch (edit.edit) {
    case 'add part': return `Add ${edit.kind} ${facts(edit.facts)} between ${Object.values(edit.pins).join(' and ')}`;
    case 'set facts': return `${edit.part}: ${facts(edit.facts)}`;
    case 'move pin': return `Move ${edit.part}:${edit.pin} to ${edit.net}`;
    case 'swap pins': return `Turn ${edit.part} round`;
    case 'rename part': return `Call it ${edit.ref}`;
    case 'leave open': return `Mark ${edit.part}:${edit.pin} as left open`;
    case 'rename net': return `Call net ${edit.from} ${edit.to}`;
  }
}
