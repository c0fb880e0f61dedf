'use client';
import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { callApi } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import { Initials } from '@/components/ui/initials';
import { Moment } from '@/components/ui/moment';
import { auditRowSchema, type AuditRow } from '@/lib/schemas/audit';
import type { Circuit } from '@/lib/schemas/circuit';
import { pageOf } from '@/lib/schemas/page';

const answer = pageOf(auditRowSchema);

/** What of a row's detail is worth a word: the revision and how far. */
function detailWords({ detail }: AuditRow): string {
  const parts = [detail['letter'], detail['holdPoint']].filter((part): part is string => typeof part === 'string' && part.length <= 40);
  return parts.length === 0 ? '' : `, ${parts.join(' to ')}`;
}

/** The newest lines of the audit record: a member sees those of their own circuits, mentors and stewards all. */
export function ActivityList({ bench, circuits }: { readonly bench: string; readonly circuits: readonly Circuit[] }) {
  const { data } = useQuery({
    queryKey: queryKeys.audit(bench),
    queryFn: async ({ signal }) => (await callApi(`/api/benches/${bench}/audit?limit=12`, { answer, signal })).items,
  });
  const titles = new Map(circuits.map((circuit) => [circuit.id, circuit.title]));
  const rows = (data ?? []).filter((row) => row.by !== null && row.circuitId !== null && titles.has(row.circuitId)).slice(0, 7);
  if (rows.length === 0) return null;
  return (
    <section aria-labelledby="activity" className="mt-8 border-t-[1.5px] border-ink pt-2 max-wide:hidden">
      <h2 id="activity" className="silk text-sm text-ink">Activity</h2>
      <ul>
        {rows.map((row) => (
          <li key={row.id} className="grid grid-cols-[28px_1fr_auto] gap-2 border-b border-rule py-[7px] text-xs leading-[1.38] text-ink-2">
            {row.by ? <Initials name={row.by.name} /> : null}
            <span className="min-w-0">{row.action}{detailWords(row)}: <Link href={`/circuits/${row.circuitId}`} className="font-medium text-ink hover:underline">{titles.get(row.circuitId ?? '')}</Link></span>
            <span className="figure"><Moment at={row.at} /></span>
          </li>
        ))}
      </ul>
    </section>
  );
}
