'use client';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { callApi, wordsOf } from '@/components/query/api';
import { queryKeys } from '@/components/query/keys';
import { Button } from '@/components/ui/button';
import { Moment } from '@/components/ui/moment';
import { Skeleton } from '@/components/ui/skeleton';
import { StateBox } from '@/components/ui/state-box';
import { useToast } from '@/components/ui/toasts';
import { pageOf } from '@/lib/schemas/page';
import { ownSessionSchema } from '@/lib/schemas/session';
import { browserWords } from './browser-words';

const answer = pageOf(ownSessionSchema);

/** Where one is signed in, and the way to end each. Ending one closes its open sheets within seconds. */
export function SessionList() {
  const client = useQueryClient();
  const toast = useToast();
  const { data, error, refetch } = useQuery({ queryKey: queryKeys.sessions(), queryFn: ({ signal }) => callApi('/api/sessions', { answer, signal }) });
  const end = useMutation({
    mutationFn: (id: string | undefined) => callApi('/api/sessions', { method: 'DELETE', body: id === undefined ? {} : { id }, answer: null }),
    onSuccess: async (_, id) => { await client.invalidateQueries({ queryKey: queryKeys.sessions() }); toast(id === undefined ? 'All other sessions have ended' : 'The session has ended'); },
  });
  if (error) return <StateBox failed title={wordsOf(error).title} action={<Button icon="retry" onClick={() => void refetch()}>Try again</Button>}>{wordsOf(error).detail}</StateBox>;
  if (!data) return <div className="space-y-4 border-[1.5px] border-ink p-4" aria-busy="true"><Skeleton className="w-1/2" /><br /><Skeleton className="w-1/3" /></div>;
  const others = data.items.filter((session) => !session.current).length;
  return (
    <div className="space-y-4">
      <ul className="border-[1.5px] border-ink">
        {data.items.map((session) => (
          <li key={session.id} className="flex min-h-[62px] flex-wrap items-center gap-3 border-b border-rule px-4 py-2 last:border-0">
            <div className="min-w-0 flex-1">
              <p className="text-body font-semibold">{browserWords(session.userAgent)}{session.current ? ', this one' : ''}</p>
              <p className="text-sm text-ink-2">signed in <Moment at={session.signedInAt} form="medium" />, last used <Moment at={session.lastUsedAt} form="medium" /></p>
            </div>
            {session.current ? null : <Button busy={end.isPending && end.variables === session.id} onClick={() => end.mutate(session.id)}>End it</Button>}
          </li>
        ))}
      </ul>
      {end.error ? <p role="alert" className="text-sm text-stop-ink">{wordsOf(end.error).title} {wordsOf(end.error).detail}</p> : null}
      {others > 0 ? <Button tone="warn" busy={end.isPending && end.variables === undefined} onClick={() => end.mutate(undefined)}>End all others</Button> : null}
    </div>
  );
}
