'use client';
import { useId } from 'react';
import { useViewport } from 'reactflow';
import type { Box } from '@/lib/document/geometry/point';

/** Non-photo-blue grid of 10 and 50 units, and the border of the sheet. The fine lines go when they would run together. */
export function CanvasGrid({ frame }: { readonly frame: Box }) {
  const { x, y, zoom } = useViewport();
  const pattern = useId();
  const step = 50 * zoom;
  return (
    <svg aria-hidden="true" width="100%" height="100%" className="pointer-events-none absolute inset-0">
      <defs>
        <pattern id={pattern} width={step} height={step} patternUnits="userSpaceOnUse" x={x} y={y}>
          {zoom > 0.45 ? [1, 2, 3, 4].map((line) => <path key={line} d={`M${(line * step) / 5 + 0.5} 0V${step}M0 ${(line * step) / 5 + 0.5}H${step}`} className="stroke-grid" />) : null}
          <path d={`M.5 0V${step}M0 .5H${step}`} className="stroke-grid-5" />
        </pattern>
      </defs>
      <rect width="100%" height="100%" fill={`url(#${pattern})`} />
      <rect x={x + frame.left * zoom} y={y + frame.top * zoom} width={(frame.right - frame.left) * zoom} height={(frame.bottom - frame.top) * zoom} className="fill-none stroke-rule" strokeWidth="1" />
    </svg>
  );
}
