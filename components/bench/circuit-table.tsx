import { HatchMark } from '@/components/ladder/hatch-mark';
import { touchSafeVolts } from '@/components/ladder/ladder-point';
import { ladderScale } from '@/components/ladder/ladder-scale';
import type { Circuit } from '@/lib/schemas/circuit';
import { CircuitRow, miniWidth } from './circuit-row';

const head = 'h-[34px] border-b-[1.5px] border-ink px-2 text-left font-cond text-xs font-semibold tracking-[.05em] whitespace-nowrap text-ink-2 uppercase';

/** The bench's circuits. All rows share one ladder scale. */
export function CircuitTable({ circuits, person }: { readonly circuits: readonly Circuit[]; readonly person: string }) {
  const scale = ladderScale(circuits.flatMap((circuit) => circuit.holdPoints.map((point) => ({ peak: point.volts }))), 2, miniWidth - 12);
  const limit = scale.x(touchSafeVolts);
  return (
    <table className="w-full table-fixed border-separate border-spacing-0 border-[1.5px] border-ink bg-film text-sm text-ink">
      <colgroup>
        <col />
        <col className="w-14" />
        <col className="w-[212px] max-wide:hidden" />
        <col className="w-[112px]" />
        <col className="w-[134px]" />
        <col className="w-[188px]" />
        <col className="w-[76px]" />
      </colgroup>
      <thead>
        <tr>
          <th scope="col" className={head}>Circuit</th>
          <th scope="col" className={head}>Rev</th>
          <th scope="col" className={`${head} max-wide:hidden`}>
            <span className="sr-only">Signed off, of the plan</span>
            <svg width={miniWidth} height="34" aria-hidden="true" className="block overflow-visible font-cond text-legend font-semibold tracking-[.04em]">
              <path d={`M${limit} 6V34`} className="stroke-silk-2" strokeDasharray="1 2" />
              <text x="0" y="21" className="fill-ink-2">SIGNED</text>
              <HatchMark x={limit + 20} y={17} scale={0.8} className="fill-film stroke-ink" hatchClassName="fill-ink" />
              <text x={limit + 34} y="21" className="fill-ink-2">60 V</text>
            </svg>
          </th>
          <th scope="col" className={head}>Signed off to</th>
          <th scope="col" className={head}>Open</th>
          <th scope="col" className={head}>Waiting for</th>
          <th scope="col" className={`${head} text-right`}>Changed</th>
        </tr>
      </thead>
      <tbody>{circuits.map((circuit) => <CircuitRow key={circuit.id} circuit={circuit} person={person} scale={scale} />)}</tbody>
    </table>
  );
}
