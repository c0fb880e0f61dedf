'use client';
import { PartView } from '@/components/drawing/part-view';
import type { Editor } from '@/lib/editor/editor';
import { newPart } from '@/lib/editor/edits/add-part';
import type { Point } from '@/lib/document/geometry/point';
import { useEditorValue } from './canvas-context';

const lineOf = (path: readonly Point[]): string => path.map((point, index) => `${index === 0 ? 'M' : 'L'}${point.x} ${point.y}`).join('');

/** What is in hand: the box being drawn, the wire being laid with what it would join, the part being placed, the cursor of the keys. */
export function GestureOverlay({ editor, zigzag }: { readonly editor: Editor; readonly zigzag: boolean }) {
  const gesture = useEditorValue(editor, (state) => state.gesture);
  const ghost = useEditorValue(editor, (state) => state.ghost);
  const tool = useEditorValue(editor, (state) => state.tool);
  const cursor = useEditorValue(editor, (state) => state.cursor);
  return (
    <svg aria-hidden="true" className="pointer-events-none absolute top-0 left-0 z-[6] size-px overflow-visible">
      {gesture.doing === 'box' ? <rect x={gesture.box.left} y={gesture.box.top} width={gesture.box.right - gesture.box.left} height={gesture.box.bottom - gesture.box.top} className="fill-act/10 stroke-act" strokeWidth="1" strokeDasharray="4 3" /> : null}
      {gesture.doing === 'wiring' ? (
        <g>
          <path d={lineOf(gesture.path)} className="fill-none stroke-act" strokeWidth="2" />
          {gesture.path[0] ? <circle cx={gesture.path[0].x} cy={gesture.path[0].y} r="4" className="fill-film stroke-act" strokeWidth="1.5" /> : null}
          {gesture.path.slice(1, -1).map((corner) => <rect key={`${corner.x} ${corner.y}`} x={corner.x - 3} y={corner.y - 3} width="6" height="6" className="fill-film stroke-act" strokeWidth="1.2" />)}
          {gesture.joins === null ? null : (
            <g transform={`translate(${gesture.at.x} ${gesture.at.y})`}>
              <circle r="7" className="fill-none stroke-act" strokeWidth="1.5" />
              <rect x="12" y="-12" width={gesture.joins.length * 7 + 50} height="24" rx="2" className="fill-ink" />
              <text x="20" y="4.5" className="fill-film font-sans text-sm font-medium">joins {gesture.joins}</text>
            </g>
          )}
        </g>
      ) : null}
      {ghost ? <g opacity="0.6"><PartView part={newPart(editor.state.sheet, ghost.kind, { ...ghost.at, turn: ghost.turn, mirror: ghost.mirror }, 'in hand')} zigzag={zigzag} /></g> : null}
      {tool === 'select' ? null : <path d={`M${cursor.x - 6} ${cursor.y}H${cursor.x + 6}M${cursor.x} ${cursor.y - 6}V${cursor.y + 6}`} className="stroke-act" strokeWidth="1" />}
    </svg>
  );
}
