'use client';
import { memo } from 'react';
import type { NodeProps } from 'reactflow';
import { PartView } from '@/components/drawing/part-view';
import { throughMarks } from '@/components/drawing/through-marks';
import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import type { PartRecord } from '@/lib/document/records';
import { useCanvas, useEditorValue } from './canvas-context';
import { handlesOf, nodeBoxOf, type PartNode } from './flow-records';
import { LabelView } from './label-view';
import { PinHandles } from './pin-handles';
import { pinStates } from './pin-states';

const quiet = new Set(['net-name', 'note']);

/** A loose pin has a 45° tick, one left open a short bar square to its stub, a joined one no mark, one where three lines meet a dot. */
function PinMarks({ part }: { readonly part: PartRecord }) {
  const { editor } = useCanvas();
  const states = useEditorValue(editor, (state) => pinStates(state.sheet).get(part.id) ?? '').split(' ');
  return pinPlacesOf(part).map((pin, index) => {
    if (states[index] === 'met') return <circle key={pin.pin} cx={pin.x} cy={pin.y} r="3" className="fill-ink" />;
    if (quiet.has(part.kind)) return null;
    if (states[index] === 'lone') return <path key={pin.pin} d={`M${pin.x - 4} ${pin.y + 4}L${pin.x + 4} ${pin.y - 4}`} className="fill-none stroke-ink" strokeWidth="1.2" />;
    if (states[index] !== 'open') return null;
    const end = { x: pin.x + pin.out.x * 10, y: pin.y + pin.out.y * 10 };
    return (
      <g key={pin.pin} className="fill-none stroke-ink">
        <path d={`M${pin.x} ${pin.y}L${end.x} ${end.y}`} strokeWidth="1.5" />
        <path d={`M${end.x - pin.out.y * 6} ${end.y - pin.out.x * 6}L${end.x + pin.out.y * 6} ${end.y + pin.out.x * 6}`} strokeWidth="2.2" />
      </g>
    );
  });
}

/** Corner handles and outline of a chosen part. */
function Chosen({ part, name }: { readonly part: PartRecord; readonly name: string }) {
  const box = nodeBoxOf(part);
  const [left, top, width, height] = [box.left - 4, box.top - 4, box.right - box.left + 8, box.bottom - box.top + 8];
  return (
    <g className="stroke-act" data-chosen={name}>
      <rect x={left} y={top} width={width} height={height} className="fill-none" strokeWidth="1.5" />
      {[[left, top], [left + width, top], [left, top + height], [left + width, top + height]].map(([x, y]) => (
        <rect key={`${x} ${y}`} x={(x ?? 0) - 2.5} y={(y ?? 0) - 2.5} width="5" height="5" className="fill-film" strokeWidth="1.2" />
      ))}
    </g>
  );
}

/** One part on the canvas: symbol, words, pin marks, and how it is chosen, lit or lifted. */
export const PartNodeView = memo(function PartNodeView({ data: { part } }: NodeProps<PartNode>) {
  const { editor, lit, zigzag } = useCanvas();
  const chosen = useEditorValue(editor, (state) => state.selection.has(part.id));
  const lifted = useEditorValue(editor, (state) => part.ref !== '' && state.lifted.has(part.ref));
  const through = useEditorValue(editor, (state) => throughMarks(state.sheet).has(part.id));
  const box = nodeBoxOf(part);
  return (
    <>
      <PinHandles handles={handlesOf(part)} />
      <svg width={box.right - box.left} height={box.bottom - box.top} className="pointer-events-none block overflow-visible" aria-hidden="true">
        <g transform={`translate(${-box.left} ${-box.top})`}>
          {lit.has(part.id) ? <circle cx={(box.left + box.right) / 2} cy={(box.top + box.bottom) / 2} r="34" className="fill-act-wash" /> : null}
          <g opacity={lifted ? 0.35 : undefined} strokeDasharray={lifted ? '5 4' : undefined}><PartView part={part} zigzag={zigzag} through={through} /></g>
          {lifted ? <text x={(box.left + box.right) / 2} y={box.top - 6} textAnchor="middle" className="paint-film fill-act font-cond text-xs font-semibold tracking-[.06em] uppercase">lifted</text> : null}
          <PinMarks part={part} />
          <LabelView part={part} />
          {chosen ? <Chosen part={part} name={part.ref || part.id} /> : null}
        </g>
      </svg>
    </>
  );
});
