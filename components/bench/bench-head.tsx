import { ButtonLink } from '@/components/ui/button-link';
import type { Circuit } from '@/lib/schemas/circuit';

interface BenchHeadProps {
  readonly bench: string;
  readonly name: string;
  readonly mayPost: boolean;
  /** Null while they load. */
  readonly circuits: readonly Circuit[] | null;
}

function Count({ count, words, stop = false }: { readonly count: number; readonly words: string; readonly stop?: boolean }) {
  return <span><b className={`mr-1.5 font-mono text-[17px] font-bold ${stop && count > 0 ? 'text-stop-ink' : 'text-silk'}`}>{count}</b>{words}</span>;
}

/** The bench in a line: its name, its circuits, what is open. */
export function BenchHead({ bench, name, mayPost, circuits }: BenchHeadProps) {
  const stops = circuits?.reduce((sum, circuit) => sum + (circuit.openStops ?? 0), 0) ?? 0;
  const signed = circuits?.filter((circuit) => circuit.reached !== null).length ?? 0;
  return (
    <div className="flex h-[78px] flex-none items-center gap-8 bg-panel px-5 max-tablet:hidden">
      <div className="min-w-0">
        <p className="silk text-silk-2 font-medium">Bench</p>
        <h1 className="truncate font-cond text-[27px] leading-[1.15] font-semibold tracking-[.015em]">{name}</h1>
      </div>
      {circuits ? (
        <p className="flex gap-6 pt-3 text-sm whitespace-nowrap text-silk-2 max-wide:hidden">
          <Count count={circuits.length} words={circuits.length === 1 ? 'circuit' : 'circuits'} />
          <Count count={stops} words="stops open" stop />
          <Count count={signed} words="signed off" />
        </p>
      ) : null}
      <span className="flex-1" />
      {mayPost ? <ButtonLink href={`/benches/${bench}/new`} tone="primary" size="large" icon="plus">New circuit</ButtonLink> : null}
    </div>
  );
}
