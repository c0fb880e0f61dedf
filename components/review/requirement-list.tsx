import { voltsWords } from '@/components/ladder/plan-words';
import { Icon } from '@/components/ui/icon';
import { RequirementMark } from '@/components/ui/requirement-mark';
import { classNames } from '@/components/ui/class-names';
import type { Revision } from '@/lib/schemas/revision';
import { refuses, type RequirementRow } from './requirement-words';

interface HoldPointKeysProps {
  readonly revision: Revision;
  readonly free: number;
  readonly signed: ReadonlySet<string>;
  readonly chosen: string | null;
  readonly onChoose: (holdPoint: string) => void;
}

/** Hold points as adjoining keys: signed ones ticked, refused ones locked and dashed. */
export function HoldPointKeys({ revision, free, signed, chosen, onChoose }: HoldPointKeysProps) {
  return (
    <div role="group" aria-label="Sign off to" className="grid auto-cols-fr grid-flow-col border border-edge">
      {revision.holdPoints.map((point, index) => {
        const done = signed.has(point.name);
        const locked = index >= free && !done;
        return (
          <button
            key={point.name}
            type="button"
            aria-pressed={point.name === chosen}
            aria-disabled={locked || undefined}
            onClick={() => onChoose(point.name)}
            className={classNames(
              'flex h-9 items-center justify-center gap-1 border-l border-edge font-mono text-sm tracking-[-.03em] first:border-l-0 max-tablet:h-target',
              locked ? 'bg-film-2 text-ink-2 outline-1 -outline-offset-4 outline-edge outline-dashed' : point.name === chosen ? 'bg-signed font-bold text-on-signed' : done ? 'bg-signed-wash font-bold text-signed-ink' : 'bg-film font-bold text-ink',
              locked && point.name === chosen && 'font-bold text-stop-ink',
            )}
          >
            {done ? <Icon name="check" className="size-3" /> : locked ? <Icon name="lock" className="size-3" /> : null}
            {voltsWords(point.volts)}
          </button>
        );
      })}
    </div>
  );
}

/** Requirements at one hold point, on a phone or in a narrow column. */
export function RequirementList({ rows, holdPoint }: { readonly rows: readonly RequirementRow[]; readonly holdPoint: string }) {
  return (
    <ul>
      {rows.map((row) => {
        const at = row.results.find((result) => result.holdPoint === holdPoint);
        return (
          <li key={row.id} className="grid min-h-[42px] grid-cols-[20px_1fr] items-center gap-x-4 border-b border-rule px-3.5 py-1.5 text-md text-ink">
            <RequirementMark result={at?.result ?? 'not applicable'} size={18} />
            <span>{row.words} <span className="text-sm text-ink-2">{refuses(row.worst) && !refuses(at?.result ?? 'satisfied') ? '' : row.restsOn}</span></span>
          </li>
        );
      })}
    </ul>
  );
}
