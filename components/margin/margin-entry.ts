import type { Finding } from '@/lib/netlist/findings/finding';
import type { Thread } from '@/lib/schemas/thread';
import type { MarginAnchor } from './sheet-geometry';

export type EntryKind = 'stop' | 'caution' | 'advice' | 'undetermined' | 'note';

export interface FindingEntry {
  readonly kind: Exclude<EntryKind, 'note'>;
  /** Also the id in the page and in a deep link. */
  readonly key: string;
  readonly number: number;
  readonly finding: Finding;
  readonly threads: readonly Thread[];
  readonly anchor: MarginAnchor | null;
}

export interface NoteEntry {
  readonly kind: 'note';
  readonly key: string;
  readonly thread: Thread;
  /** Null when its finding is gone: the note stays listed. */
  readonly anchor: MarginAnchor | null;
}

export type MarginEntry = FindingEntry | NoteEntry;

export const findingKey = (fingerprint: string) => `finding-${fingerprint}`;
export const noteKey = (thread: string) => `note-${thread}`;

const rank: Readonly<Record<FindingEntry['kind'], number>> = { stop: 0, caution: 1, advice: 2, undetermined: 3 };

function kindOf(finding: Finding): FindingEntry['kind'] | null {
  if (finding.outcome === 'undetermined' || finding.outcome === 'error') return 'undetermined';
  return finding.outcome === 'fail' ? finding.severity : null;
}

/** A finding is tied to the part to change, one about a single net of a transistor to that net; one that names no part, to its net. */
function anchorOfFinding(finding: Finding): MarginAnchor | null {
  const [ref] = finding.refs;
  const [net] = finding.nets;
  if (ref !== undefined) return net !== undefined && finding.nets.length === 1 ? { kind: 'ref', ref, on: { net, refs: finding.refs } } : { kind: 'ref', ref };
  return net === undefined ? null : { kind: 'net', name: net };
}

function anchorOfThread(thread: Thread): MarginAnchor | null {
  const { anchor } = thread;
  switch (anchor.kind) {
    case 'part': return { kind: 'part', id: anchor.id };
    case 'net': return { kind: 'net', name: anchor.id };
    case 'spot': return { kind: 'spot', x: anchor.x, y: anchor.y };
    case 'finding': return anchor.x === undefined || anchor.y === undefined ? null : { kind: 'spot', x: anchor.x, y: anchor.y };
  }
}

/**
 * Findings and notes as the margin lists them. Findings are numbered by severity, then by the voltage from which they hold;
 * threads about a finding stand inside its entry, and on their own once the finding is gone.
 */
export function marginEntries(findings: readonly Finding[], threads: readonly Thread[]): readonly MarginEntry[] {
  const listed = findings
    .flatMap((finding) => {
      const kind = kindOf(finding);
      return kind === null ? [] : [{ kind, finding }];
    })
    .sort((a, b) => rank[a.kind] - rank[b.kind] || (a.finding.fromVolts ?? 0) - (b.finding.fromVolts ?? 0) || (a.finding.fingerprint < b.finding.fingerprint ? -1 : 1));
  const known = new Set(listed.map(({ finding }) => finding.fingerprint));
  const about = (fingerprint: string) => threads.filter((thread) => thread.anchor.kind === 'finding' && thread.anchor.id === fingerprint);
  const own = threads.filter((thread) => thread.anchor.kind !== 'finding' || !known.has(thread.anchor.id));
  return [
    ...listed.map(({ kind, finding }, index): FindingEntry => ({
      kind,
      key: findingKey(finding.fingerprint),
      number: index + 1,
      finding,
      threads: about(finding.fingerprint),
      anchor: anchorOfFinding(finding),
    })),
    ...own.map((thread): NoteEntry => ({ kind: 'note', key: noteKey(thread.id), thread, anchor: anchorOfThread(thread) })),
  ];
}

/** How many entries of each kind there are. */
export function entryCounts(entries: readonly MarginEntry[]): Readonly<Record<EntryKind, number>> {
  const counts = { stop: 0, caution: 0, advice: 0, undetermined: 0, note: 0 };
  for (const entry of entries) counts[entry.kind] += 1;
  return counts;
}
