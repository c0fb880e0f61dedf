'use client';
import { useRef, type KeyboardEvent, type PointerEvent } from 'react';
import { LadderDrawing } from './ladder-drawing';
import type { LadderPoint } from './ladder-point';
import { ladderScale } from './ladder-scale';
import type { LadderFlag, LadderSigned } from './ladder-state';
import { pointWords } from './plan-words';
import { useWidth } from './use-width';

interface LadderProps {
  readonly points: readonly LadderPoint[];
  /** Name of the hold point at which things are shown. */
  readonly shown: string | null;
  readonly onShow: (name: string) => void;
  readonly signed: LadderSigned;
  readonly flags: readonly LadderFlag[];
}

/**
 * The hold-point ladder. Its handle is a slider: arrows, Home and End move it, a press or a drag anywhere chooses the
 * nearest hold point.
 */
export function Ladder({ points, shown, onShow, signed, flags }: LadderProps) {
  const [ref, width] = useWidth<HTMLDivElement>(936);
  const dragging = useRef(false);
  const narrow = width < 560;
  const scale = ladderScale(points, narrow ? 14 : 92, narrow ? width - 54 : width - 132);
  const at = Math.max(0, points.findIndex((point) => point.name === shown));
  const current = points[at];

  const choose = (index: number) => {
    const point = points[Math.min(points.length - 1, Math.max(0, index))];
    if (point && point.name !== shown) onShow(point.name);
  };
  const chooseNearest = (event: PointerEvent<SVGSVGElement>) => {
    const x = event.clientX - event.currentTarget.getBoundingClientRect().left;
    let nearest = 0;
    points.forEach((point, index) => {
      const best = points[nearest];
      if (best && Math.abs(scale.x(point.peak) - x) < Math.abs(scale.x(best.peak) - x)) nearest = index;
    });
    choose(nearest);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const to = { ArrowRight: at + 1, ArrowUp: at + 1, ArrowLeft: at - 1, ArrowDown: at - 1, Home: 0, End: points.length - 1, PageUp: points.length - 1, PageDown: 0 }[event.key];
    if (to === undefined) return;
    event.preventDefault();
    choose(to);
  };

  return (
    <div ref={ref} className="min-w-0 flex-1">
      <svg
        width={width}
        height="80"
        viewBox={`0 0 ${width} 80`}
        className="ladder-slider block touch-pan-y overflow-visible outline-none"
        role={current ? 'slider' : 'img'}
        tabIndex={current ? 0 : undefined}
        aria-label={current ? 'Shown at hold point' : 'Power-up plan: no hold point yet'}
        aria-valuemin={current ? 1 : undefined}
        aria-valuemax={current ? points.length : undefined}
        aria-valuenow={current ? at + 1 : undefined}
        aria-valuetext={current ? `${pointWords(current)}, hold point ${at + 1} of ${points.length}. ${signed.words}` : undefined}
        onKeyDown={current ? onKeyDown : undefined}
        onPointerDown={current ? (event) => { dragging.current = true; event.currentTarget.setPointerCapture(event.pointerId); chooseNearest(event); } : undefined}
        onPointerMove={(event) => { if (dragging.current) chooseNearest(event); }}
        onPointerUp={() => { dragging.current = false; }}
        onPointerCancel={() => { dragging.current = false; }}
      >
        <LadderDrawing points={points} shown={current?.name ?? null} signed={signed} flags={flags} scale={scale} width={width} narrow={narrow} />
      </svg>
    </div>
  );
}
