'use client';
import { memo } from 'react';
import { HatchMark } from '@/components/ladder/hatch-mark';
import { voltsWords } from '@/components/ladder/plan-words';
import type { Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet } from '@/lib/document/records';
import type { WireEdge } from './flow-records';

interface Run {
  readonly a: Point;
  readonly b: Point;
  readonly length: number;
}

/** The longest run of each hazardous net, where its tag stands. */
export function longestRuns(sheet: Sheet, edges: readonly WireEdge[]): ReadonlyMap<string, Run> {
  const best = new Map<string, Run>();
  const index = indexOf(sheet);
  for (const { id, data } of edges) {
    const wire = index.wire.get(id);
    if (!wire || !data?.hot || data.net === undefined) continue;
    const path = wirePath(index, wire);
    for (let at = 1; at < path.length; at += 1) {
      const [a, b] = [path[at - 1] as Point, path[at] as Point];
      const length = Math.abs(a.x - b.x) + Math.abs(a.y - b.y);
      if (length > (best.get(data.net)?.length ?? 39)) best.set(data.net, { a, b, length });
    }
  }
  return best;
}

/** Hatch tags with the voltage of each net above the touch-safe limit. Hatch means hazardous voltage and nothing else. */
export const HotTags = memo(function HotTags({ sheet, edges, volts }: { readonly sheet: Sheet; readonly edges: readonly WireEdge[]; readonly volts: Readonly<Record<string, number>> }) {
  return (
    <svg aria-hidden="true" className="pointer-events-none absolute top-0 left-0 z-[2] size-px overflow-visible">
      {[...longestRuns(sheet, edges)].map(([net, { a, b }]) => {
        const level = a.y === b.y;
        const [x, y] = [(a.x + b.x) / 2, (a.y + b.y) / 2];
        const value = volts[net] ?? 0;
        return (
          <g key={net} data-hot={net}>
            <g transform={level ? undefined : `rotate(90 ${x} ${y})`}><HatchMark x={x} y={y} className="fill-film stroke-ink" hatchClassName="fill-ink" /></g>
            <text x={level ? x : x + 11} y={level ? y - 9 : y + 4} textAnchor={level ? 'middle' : 'start'} className="paint-film fill-ink font-mono text-xs font-bold tracking-[-.02em]">{voltsWords(Math.abs(value) >= 10 ? Math.round(value) : value)}</text>
          </g>
        );
      })}
    </svg>
  );
});
