'use client';
import { partWords } from '@/components/drawing/part-words';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { monoWords } from '@/components/ui/mono-words';
import type { PartRecord } from '@/lib/document/records';
import { useCanvas, useEditorValue } from './canvas-context';

/** Designator and printed values beside a symbol. While it is dragged they keep their place beside it. */
export function LabelView({ part }: { readonly part: PartRecord }) {
  const { editor, labels } = useCanvas();
  const home = useEditorValue(editor, (state) => indexOf(state.sheet).part.get(part.id));
  const label = labels.get(part.id);
  if (!label) return null;
  const [dx, dy] = [part.x - (home?.x ?? part.x), part.y - (home?.y ?? part.y)];
  const { ref, values } = partWords(part);
  return (
    <text x={label.x} y={label.y} textAnchor={label.anchor} transform={dx === 0 && dy === 0 ? undefined : `translate(${dx} ${dy})`} className="paint-film">
      {ref === null ? null : <tspan x={label.x} className="fill-ink font-mono text-sm font-bold tracking-[-.02em]">{ref}</tspan>}
      {values.map((value, index) => <tspan key={index} x={label.x} dy={ref === null && index === 0 ? 0 : 14} className="fill-ink-2 font-mono text-xs tracking-[-.03em]">{monoWords(value)}</tspan>)}
    </text>
  );
}
