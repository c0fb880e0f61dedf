'use client';
import { useEffect, useId, useMemo } from 'react';
import type { SheetGeometry } from '@/components/margin/sheet-geometry';
import type { Sheet } from '@/lib/document/records';
import { drawingBounds } from './drawing-bounds';
import { ReadingGeometry } from './reading-geometry';
import { SheetDrawing } from './sheet-drawing';
import { TitleBlock, type TitleCell } from './title-block';
import { useView } from './use-view';
import { zoneColumns, zoneRows } from './zones';
import { ZoomKeys } from './zoom-keys';

interface SheetViewerProps {
  readonly sheet: Sheet;
  readonly label: string;
  readonly volts?: Readonly<Record<string, number>>;
  readonly lit?: ReadonlySet<string>;
  /** Said in the corner of the sheet: 'SHOWN AT 36 V'. */
  readonly shown?: string;
  readonly titleBlock: readonly TitleCell[];
  /** Gets the geometry that the margin asks; null when the drawing goes. */
  readonly onGeometry: (geometry: SheetGeometry | null) => void;
}

/** A drawing to read: pan, zoom and fit, in a frame with zones and a title block. */
export function SheetViewer({ sheet, label, volts, lit, shown, titleBlock, onGeometry }: SheetViewerProps) {
  const bounds = useMemo(() => drawingBounds(sheet), [sheet]);
  const { ref, view, width, height, zoom, fit, centre, drag } = useView(bounds);
  const pattern = useId();
  const inset = 24;
  const geometry = useMemo(() => new ReadingGeometry(sheet, bounds, { x: 0, y: 0, scale: 1 }, { width: 0, height: 0 }, centre), [sheet, bounds, centre]);
  useEffect(() => {
    onGeometry(geometry);
    return () => onGeometry(null);
  }, [geometry, onGeometry]);
  useEffect(() => {
    geometry.moved({ scale: view.scale, x: view.x - inset / view.scale, y: view.y - inset / view.scale }, { width: width + inset + 10, height: height + inset + 46 });
  }, [geometry, view.x, view.y, view.scale, width, height]);
  const step = 50 * view.scale;
  const zone = 'absolute font-cond text-legend font-medium text-ink-2';
  return (
    <div className="relative flex min-w-0 flex-1 flex-col bg-film pt-6 pr-2.5 pb-2.5 pl-6 max-tablet:p-0">
      {Array.from({ length: zoneColumns }, (_, index) => <span key={index} aria-hidden="true" className={`${zone} top-1 max-tablet:hidden`} style={{ left: `calc(24px + (100% - 34px) * ${(index + 0.5) / zoneColumns})` }}>{index + 1}</span>)}
      {Array.from({ length: zoneRows }, (_, index) => <span key={index} aria-hidden="true" className={`${zone} left-2 max-tablet:hidden`} style={{ top: `calc(24px + (100% - 70px) * ${(index + 0.5) / zoneRows} - 6px)` }}>{String.fromCharCode(65 + index)}</span>)}
      <div ref={ref} {...drag} className="relative min-h-0 flex-1 cursor-grab touch-none overflow-hidden border-[1.5px] border-ink active:cursor-grabbing max-tablet:border-0 print:min-h-[520px]">
        <svg role="img" aria-label={label} width="100%" height="100%" className="block">
          <defs>
            <pattern id={pattern} width={step} height={step} patternUnits="userSpaceOnUse" x={-view.x * view.scale} y={-view.y * view.scale}>
              {view.scale > 0.45 ? [1, 2, 3, 4].map((line) => <path key={line} d={`M${(line * step) / 5 + 0.5} 0V${step}M0 ${(line * step) / 5 + 0.5}H${step}`} className="stroke-grid" />) : null}
              <path d={`M.5 0V${step}M0 .5H${step}`} className="stroke-grid-5" />
            </pattern>
          </defs>
          <rect width="100%" height="100%" fill={`url(#${pattern})`} />
          <g transform={`scale(${view.scale}) translate(${-view.x} ${-view.y})`}><SheetDrawing sheet={sheet} volts={volts} lit={lit} /></g>
        </svg>
        {shown ? <p className="silk absolute top-3.5 left-4 bg-film text-act max-tablet:hidden">{shown}</p> : null}
      </div>
      <ZoomKeys scale={view.scale} onZoom={zoom} onFit={fit} />
      <TitleBlock cells={titleBlock} />
    </div>
  );
}
