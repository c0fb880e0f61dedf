'use client';
import { memo } from 'react';
import type { EdgeProps } from 'reactflow';
import type { Point } from '@/lib/document/geometry/point';
import { useCanvas, useEditorValue } from './canvas-context';
import type { WireEdge } from './flow-records';

const lineOf = (path: readonly Point[]): string => path.map((point, index) => `${index === 0 ? 'M' : 'L'}${point.x} ${point.y}`).join('');

/** A wire. Above the touch-safe limit it is a double rail; chosen, it shows its corners. */
export const WireEdgeView = memo(function WireEdgeView({ id, data }: EdgeProps<WireEdge>) {
  const { editor } = useCanvas();
  const chosen = useEditorValue(editor, (state) => state.selection.has(id));
  if (!data || data.path.length < 2) return null;
  const line = lineOf(data.path);
  return (
    <g data-wire={id} data-net={data.net}>
      {chosen ? <path d={line} className="fill-none stroke-act-wash" strokeWidth="9" strokeLinejoin="round" /> : null}
      {data.hot ? (
        <>
          <path d={line} className={chosen ? 'fill-none stroke-act' : 'fill-none stroke-ink'} strokeWidth="5.6" />
          <path d={line} className="fill-none stroke-film" strokeWidth="2.6" strokeLinecap="square" />
        </>
      ) : <path d={line} className={chosen ? 'fill-none stroke-act' : 'fill-none stroke-ink'} strokeWidth="1.5" strokeLinecap="square" />}
      {chosen ? data.path.slice(1, -1).map((corner) => <rect key={`${corner.x} ${corner.y}`} x={corner.x - 3} y={corner.y - 3} width="6" height="6" className="fill-film stroke-act" strokeWidth="1.2" />) : null}
    </g>
  );
});
