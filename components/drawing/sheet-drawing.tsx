import type { Sheet } from '@/lib/document/records';
import { monoWords } from '@/components/ui/mono-words';
import type { Box } from '@/lib/document/geometry/point';
import { placeLabels } from './label-places';
import { LineView } from './line-view';
import { PartView } from './part-view';
import { throughMarks } from './through-marks';

interface SheetDrawingProps {
  readonly sheet: Sheet;
  readonly volts?: Readonly<Record<string, number>>;
  /** Parts that are lit, by id. */
  readonly lit?: ReadonlySet<string>;
  /** Words that do not stand wholly in here are left out. */
  readonly within?: Box;
}

/** The whole drawing in sheet units, to stand inside an svg: for reading, not for editing. */
export function SheetDrawing({ sheet, volts = {}, lit, within }: SheetDrawingProps) {
  return (
    <g>
      <LineView sheet={sheet} volts={volts} />
      {sheet.parts.map((part) => (
        <g key={part.id} data-part={part.ref}>
          {lit?.has(part.id) ? <circle cx={part.x} cy={part.y} r="34" className="fill-act-wash" /> : null}
          <PartView part={part} through={throughMarks(sheet).has(part.id)} />
        </g>
      ))}
      {placeLabels(sheet).filter(({ box }) => !within || (box.left >= within.left && box.right <= within.right && box.top >= within.top && box.bottom <= within.bottom)).map((label) => (
        <text key={label.part} x={label.x} y={label.y} textAnchor={label.anchor} className="paint-film">
          {label.ref === null ? null : <tspan x={label.x} className="fill-ink font-mono text-sm font-bold tracking-[-.02em]">{label.ref}</tspan>}
          {label.values.map((value, index) => <tspan key={index} x={label.x} dy={label.ref === null && index === 0 ? 0 : 14} className="fill-ink-2 font-mono text-xs tracking-[-.03em]">{monoWords(value)}</tspan>)}
        </text>
      ))}
    </g>
  );
}
