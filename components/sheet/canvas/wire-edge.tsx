'use client';
import { memo } from 'react';
import type { EdgeProps } from 'reactflow';
import type { Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet } from '@/lib/document/records';
import { useCanvas, useEditorValue } from './canvas-context';
import type { WireEdge } from './flow-records';

const lineOf = (path: readonly Point[]): string => path.map((point, index) => `${index === 0 ? 'M' : 'L'}${point.x} ${point.y}`).join('');

const noPath: readonly Point[] = [];

function pathOf(sheet: Sheet, id: string): readonly Point[] {
  const index = indexOf(sheet);
  const wire = index.wire.get(id);
  return wire ? wirePath(index, wire) : noPath;
}

/** A wire. Above the touch-safe limit it is a double rail; chosen, it shows its corners. */
export const WireEdgeView = memo(function WireEdgeView({ id, data }: EdgeProps<WireEdge>) {
  const { editor } = useCanvas();
  const chosen = useEditorValue(editor, (state) => state.selection.has(id));
  const path = useEditorValue(editor, (state) => pathOf(state.shown, id));
  if (!data || path.length < 2) return null;
  const line = lineOf(path);
  return (
    <g data-wire={id} data-net={data.net}>
      {chosen ? <path d={line} className="fill-none stroke-act-wash" strokeWidth="9" strokeLinejoin="round" /> : null}
      {data.hot ? (
        <>
          <path d={line} className={chosen ? 'fill-none stroke-act' : 'fill-none stroke-ink'} strokeWidth="5.6" />
          <path d={line} className="fill-none stroke-film" strokeWidth="2.6" strokeLinecap="square" />
        </>
      ) : <path d={line} className={chosen ? 'fill-none stroke-act' : 'fill-none stroke-ink'} strokeWidth="1.5" strokeLinecap="square" />}
      {chosen ? path.slice(1, -1).map((corner) => <rect key={`${corner.x} ${corner.y}`} x={corner.x - 3} y={corner.y - 3} width="6" height="6" className="fill-film stroke-act" strokeWidth="1.2" />) : null}
    </g>
  );
});
