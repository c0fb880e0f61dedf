'use client';
import { useCallback, useEffect, useRef, useState, type PointerEvent, type RefObject } from 'react';
import type { Box, Point } from '@/lib/document/geometry/point';
import type { View } from './reading-geometry';

const least = 0.15;
const most = 4;

/** The view that shows all of `bounds` in a room of the given size. */
export function fitView(bounds: Box, width: number, height: number): View {
  const scale = Math.min(most, Math.max(least, Math.min(width / (bounds.right - bounds.left), height / (bounds.bottom - bounds.top), 1.25)));
  return { scale, x: (bounds.left + bounds.right) / 2 - width / scale / 2, y: (bounds.top + bounds.bottom) / 2 - height / scale / 2 };
}

/** Below this scale words cannot be read on a phone. */
const readable = 0.62;

/** What a viewer starts with: all of the drawing, or on a phone its right half at a size that can be read. */
function startView(bounds: Box, width: number, height: number): View {
  const all = fitView(bounds, width, height);
  if (width >= 720 || all.scale >= readable) return all;
  const scale = Math.min(1, Math.max(readable, height / (bounds.bottom - bounds.top)));
  return { scale, x: bounds.right - width / scale, y: (bounds.top + bounds.bottom) / 2 - height / scale / 2 };
}

function zoomed(view: View, factor: number, at: Point): View {
  const scale = Math.min(most, Math.max(least, view.scale * factor));
  return { scale, x: view.x + at.x / view.scale - at.x / scale, y: view.y + at.y / view.scale - at.y / scale };
}

interface ViewControl {
  readonly ref: RefObject<HTMLDivElement | null>;
  readonly view: View;
  readonly width: number;
  readonly height: number;
  readonly zoom: (factor: number) => void;
  readonly fit: () => void;
  readonly centre: (point: Point) => void;
  readonly drag: {
    readonly onPointerDown: (event: PointerEvent) => void;
    readonly onPointerMove: (event: PointerEvent) => void;
    readonly onPointerUp: (event: PointerEvent) => void;
    readonly onPointerCancel: (event: PointerEvent) => void;
  };
}

/** Pan by drag, zoom by wheel or two fingers, fit; the fit follows the size until somebody moves the view. */
export function useView(bounds: Box): ViewControl {
  const ref = useRef<HTMLDivElement>(null);
  const [size, setSize] = useState({ width: 0, height: 0 });
  const [own, setOwn] = useState<View | null>(null);
  const pointers = useRef(new Map<number, Point>());
  const view = own ?? startView(bounds, size.width || 860, size.height || 610);
  const current = useRef(view);
  useEffect(() => { current.current = view; });

  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const observer = new ResizeObserver(([entry]) => {
      if (entry) setSize({ width: entry.contentRect.width, height: entry.contentRect.height });
    });
    observer.observe(element);
    const wheel = (event: WheelEvent) => {
      event.preventDefault();
      const box = element.getBoundingClientRect();
      const at = { x: event.clientX - box.left, y: event.clientY - box.top };
      setOwn(event.ctrlKey || event.metaKey || !event.shiftKey
        ? zoomed(current.current, Math.exp(-event.deltaY * 0.0016), at)
        : { ...current.current, x: current.current.x + (event.deltaX + event.deltaY) / current.current.scale });
    };
    element.addEventListener('wheel', wheel, { passive: false });
    return () => { observer.disconnect(); element.removeEventListener('wheel', wheel); };
  }, []);

  const centre = useCallback((point: Point) => {
    const room = ref.current?.getBoundingClientRect();
    if (!room) return;
    setOwn((before) => {
      const now = before ?? current.current;
      return { ...now, x: point.x - room.width / now.scale / 2, y: point.y - room.height / now.scale / 2 };
    });
  }, []);
  const middle = useCallback(() => ({ x: size.width / 2, y: size.height / 2 }), [size]);
  const end = (event: PointerEvent) => pointers.current.delete(event.pointerId);
  return {
    ref, view, ...size,
    zoom: (factor) => setOwn(zoomed(current.current, factor, middle())),
    fit: () => setOwn(fitView(bounds, size.width, size.height)),
    centre,
    drag: {
      onPointerDown: (event) => { pointers.current.set(event.pointerId, { x: event.clientX, y: event.clientY }); event.currentTarget.setPointerCapture(event.pointerId); },
      onPointerMove: (event) => {
        const before = pointers.current.get(event.pointerId);
        if (!before) return;
        const now = { x: event.clientX, y: event.clientY };
        const [other] = [...pointers.current].filter(([id]) => id !== event.pointerId).map(([, point]) => point);
        pointers.current.set(event.pointerId, now);
        const { scale, x, y } = current.current;
        if (!other) { setOwn({ scale, x: x - (now.x - before.x) / scale, y: y - (now.y - before.y) / scale }); return; }
        const box = event.currentTarget.getBoundingClientRect();
        const factor = Math.hypot(now.x - other.x, now.y - other.y) / Math.max(1, Math.hypot(before.x - other.x, before.y - other.y));
        setOwn(zoomed(current.current, factor, { x: (now.x + other.x) / 2 - box.left, y: (now.y + other.y) / 2 - box.top }));
      },
      onPointerUp: end,
      onPointerCancel: end,
    },
  };
}
