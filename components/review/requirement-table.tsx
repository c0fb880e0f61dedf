import { ampsWords, voltsWords } from '@/components/ladder/plan-words';
import { classNames } from '@/components/ui/class-names';
import { RequirementMark } from '@/components/ui/requirement-mark';
import type { Revision } from '@/lib/schemas/revision';
import { reasonsAgainst, type RequirementRow } from './requirement-words';

interface RequirementTableProps {
  readonly revision: Revision;
  readonly rows: readonly RequirementRow[];
  /** Number of hold points, from the lowest, with nothing against them. */
  readonly free: number;
  readonly chosen: string | null;
  readonly signed: ReadonlySet<string>;
  readonly onChoose: ((holdPoint: string) => void) | null;
}

/** Requirements by hold points. The green bar stands after the last column with nothing against it. */
export function RequirementTable({ revision, rows, free, chosen, signed, onChoose }: RequirementTableProps) {
  const points = revision.holdPoints;
  const ground = (index: number) => classNames(index < free ? 'bg-signed-wash' : 'bg-film-2', index === free - 1 && 'border-r-[5px] border-r-signed');
  const cell = 'h-[27px] border-b border-rule px-2.5 text-center';
  return (
    <div className="overflow-x-auto">
      <table className="w-full min-w-[760px] border-separate border-spacing-0 border-[1.5px] border-ink bg-film text-sm text-ink">
        <thead>
          <tr>
            <th scope="col" className="silk h-9 border-b-[1.5px] border-ink px-2.5 text-left text-ink-2">Requirement</th>
            {points.map((point, index) => (
              <th key={point.name} scope="col" className={classNames('border-b-[1.5px] border-ink px-2.5 text-center font-normal', ground(index))}>
                <b className="font-mono text-md font-bold">{voltsWords(point.volts)}</b> <span className="figure text-ink-2">/ {ampsWords(point.amps)}</span>
              </th>
            ))}
            <th scope="col" className="silk border-b-[1.5px] border-ink px-2.5 text-left text-ink-2">What it rests on</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id}>
              <th scope="row" className="h-[27px] border-b border-rule px-2.5 text-left font-normal whitespace-nowrap">{row.words}</th>
              {row.results.map((result, index) => (
                <td key={result.holdPoint} className={classNames(cell, ground(index))}><span className="inline-grid place-items-center align-middle"><RequirementMark result={result.result} size={18} /></span></td>
              ))}
              <td className={classNames('border-b border-rule px-2.5', row.worst === 'not satisfied' || row.worst === 'error' ? 'text-stop-ink' : row.worst === 'overridden' ? 'text-caution-ink' : 'text-ink-2')}>{row.restsOn}</td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row" className="h-9 px-2.5 text-left text-body font-semibold">Can be signed</th>
            {points.map((point, index) => {
              const against = reasonsAgainst(rows, point.name).length;
              const open = index < free;
              const done = signed.has(point.name);
              const words = done ? 'signed' : open ? point.name === chosen ? 'yes, chosen' : 'yes' : against === 0 ? 'no: one below' : `no: ${against} ${against === 1 ? 'reason' : 'reasons'}`;
              return (
                <td key={point.name} className={classNames('p-0 text-center text-body font-semibold', ground(index), point.name === chosen && open ? 'bg-signed! text-on-signed' : open ? 'text-signed-ink' : 'text-stop-ink')}>
                  {open && !done && onChoose ? <button type="button" aria-pressed={point.name === chosen} onClick={() => onChoose(point.name)} className="h-9 w-full font-semibold">{words}</button> : words}
                </td>
              );
            })}
            <td />
          </tr>
        </tfoot>
      </table>
    </div>
  );
}
