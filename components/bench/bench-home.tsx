'use client';
import { useState } from 'react';
import { wordsOf } from '@/components/query/api';
import { Button } from '@/components/ui/button';
import { Icon } from '@/components/ui/icon';
import { KeyGroup } from '@/components/ui/key-group';
import { Select } from '@/components/ui/select';
import { StateBox } from '@/components/ui/state-box';
import { circuitStates, type Circuit } from '@/lib/schemas/circuit';
import { ActivityList } from './activity-list';
import { BenchEmpty } from './bench-empty';
import { BenchHead } from './bench-head';
import { CircuitCards } from './circuit-cards';
import { inView, matchesSearch, sortCircuits, stateName, type CircuitSort, type CircuitView } from './circuit-facts';
import { CircuitTable } from './circuit-table';
import { LadderKey } from './ladder-key';
import { TableSkeleton } from './table-skeleton';
import { useCircuits } from './use-circuits';
import { WaitingList } from './waiting-list';

const views: readonly { readonly value: CircuitView; readonly words: string }[] = [
  { value: 'all', words: 'All' }, { value: 'mine', words: 'Waiting for me' }, { value: 'blocked', words: 'Blocked by a stop' }, { value: 'hazardous', words: 'Above 60 V' },
];
const sorts: readonly { readonly value: CircuitSort; readonly words: string }[] = [
  { value: 'changed', words: 'Last change' }, { value: 'title', words: 'Title' }, { value: 'volts', words: 'Voltage' },
];

interface BenchHomeProps {
  /** Slug of the bench. */
  readonly bench: string;
  readonly name: string;
  readonly person: string;
  readonly mayPost: boolean;
}

/** Circuits of a bench: state, hold point reached, open stops, who is waited for. */
export function BenchHome({ bench, name, person, mayPost }: BenchHomeProps) {
  const { data, error, refetch, isFetching, hasNextPage, fetchNextPage } = useCircuits(bench);
  const [view, setView] = useState<CircuitView>('all');
  const [state, setState] = useState<'any' | Circuit['state']>('any');
  const [sort, setSort] = useState<CircuitSort>('changed');
  const [search, setSearch] = useState('');

  const head = <BenchHead bench={bench} name={name} mayPost={mayPost} circuits={data ?? null} />;
  if (!data) {
    return (
      <>
        {head}
        <div className="flex-1 bg-film p-5 max-tablet:p-0">
        {error ? <div className="max-w-[520px] max-tablet:p-4"><StateBox failed title={wordsOf(error).title} action={<Button icon="retry" busy={isFetching} onClick={() => void refetch()}>Try again</Button>}>The circuits did not load. {wordsOf(error).detail}</StateBox></div> : <TableSkeleton />}
        </div>
      </>
    );
  }
  if (data.length === 0) return <>{head}<div className="flex min-h-0 flex-1 flex-col overflow-y-auto bg-film"><BenchEmpty bench={bench} /></div></>;

  const shown = sortCircuits(data.filter((circuit) => inView[view](circuit, person) && (state === 'any' || circuit.state === state) && matchesSearch(circuit, search)), sort);
  const clear = () => { setView('all'); setState('any'); setSearch(''); };
  return (
    <>
      {head}
      <div className="groove-t flex flex-none flex-wrap items-center gap-x-3 gap-y-2 border-b border-edge bg-panel px-5 py-2 max-tablet:px-3.5">
        <KeyGroup label="Show" value={view} onChange={setView} options={views.map((option) => ({ ...option, count: data.filter((circuit) => inView[option.value](circuit, person)).length }))} />
        <span className="flex-1 max-tablet:hidden" />
        <label className="flex h-[30px] items-center gap-2 rounded-key border border-edge bg-film px-2.5 text-ink has-[:focus-visible]:outline-2 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-act max-tablet:h-target max-tablet:w-full">
          <Icon name="find" />
          <span className="sr-only">Find a circuit or person</span>
          <input type="search" value={search} onChange={(event) => setSearch(event.target.value)} placeholder="Find a circuit or person" className="w-44 min-w-0 flex-1 bg-transparent outline-none max-tablet:text-lg" />
        </label>
        <Select label="State" value={state} onChange={setState} options={[{ value: 'any' as const, words: 'any' }, ...circuitStates.map((value) => ({ value, words: stateName(value) }))]} className="max-w-[220px]" />
        <Select label="Sort" value={sort} onChange={setSort} options={sorts} className="max-tablet:hidden" />
      </div>
      <div className="min-h-0 flex-1 overflow-y-auto bg-film text-ink">
        <div className="grid grid-cols-[minmax(0,1fr)_254px] gap-9 p-5 max-wide:grid-cols-1 max-tablet:gap-0 max-tablet:p-0">
          <div className="max-wide:order-2">
            {shown.length === 0 ? (
              <div className="max-w-[520px] max-tablet:p-4"><StateBox title="No circuit matches" action={<Button onClick={clear}>Show all {data.length}</Button>}>None of the {data.length} circuits of this bench is in this view.</StateBox></div>
            ) : (
              <>
                <div className="max-tablet:hidden"><CircuitTable circuits={shown} person={person} /></div>
                <div className="tablet:hidden"><CircuitCards circuits={shown} person={person} /></div>
              </>
            )}
            {hasNextPage ? <div className="mt-4 max-tablet:p-4"><Button busy={isFetching} onClick={() => void fetchNextPage()}>Older circuits</Button></div> : null}
            <div className="mt-6 max-wide:hidden"><LadderKey /></div>
          </div>
          <aside className="max-wide:order-1 max-tablet:border-b max-tablet:border-ink"><WaitingList circuits={data} person={person} /><ActivityList bench={bench} circuits={data} /></aside>
        </div>
      </div>
    </>
  );
}
