'use client';
import { useViewport } from 'reactflow';
import { zoneColumns, zoneRows } from '@/components/drawing/zones';
import type { Box } from '@/lib/document/geometry/point';

/** Zone numbers above and letters at the left, where the frame's zones stand on the screen now. */
export function ZoneRulers({ frame, width, height }: { readonly frame: Box; readonly width: number; readonly height: number }) {
  const { x, y, zoom } = useViewport();
  const across = (frame.right - frame.left) / zoneColumns;
  const down = (frame.bottom - frame.top) / zoneRows;
  const columns = Array.from({ length: zoneColumns }, (_, at) => ({ name: String(at + 1), place: x + (frame.left + across * (at + 0.5)) * zoom }));
  const rows = Array.from({ length: zoneRows }, (_, at) => ({ name: String.fromCharCode(65 + at), place: y + (frame.top + down * (at + 0.5)) * zoom }));
  const legend = 'absolute font-cond text-legend font-medium text-ink-2';
  return (
    <div aria-hidden="true" className="pointer-events-none max-tablet:hidden">
      {columns.filter(({ place }) => place > 0 && place < width).map(({ name, place }) => <span key={name} className={`${legend} -top-[18px] -translate-x-1/2`} style={{ left: place }}>{name}</span>)}
      {rows.filter(({ place }) => place > 0 && place < height).map(({ name, place }) => <span key={name} className={`${legend} -left-4 -translate-y-1/2`} style={{ top: place }}>{name}</span>)}
    </div>
  );
}
