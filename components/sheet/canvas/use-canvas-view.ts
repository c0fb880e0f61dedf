'use client';
import { useEffect, useRef, useState, type RefObject } from 'react';
import { useReactFlow, useViewport, type Viewport } from 'reactflow';
import type { Box } from '@/lib/document/geometry/point';
import type { Editor } from '@/lib/editor/editor';

/** Fits no closer than this: a small circuit keeps its size. */
const closest = 1.4;
const zoomStep = 1.25;

export interface CanvasView {
  readonly zoom: number;
  readonly width: number;
  readonly height: number;
  readonly zoomBy: (factor: number) => void;
  readonly fit: () => void;
}

/** View in which a frame is shown whole in an element; null while the element has no size. */
function viewOf(frame: Box, element: HTMLElement | null): Viewport | null {
  const { width = 0, height = 0 } = element?.getBoundingClientRect() ?? {};
  if (width === 0 || height === 0) return null;
  const { left, top, right, bottom } = frame;
  const zoom = Math.min(width / (right - left), height / (bottom - top), closest);
  return { zoom, x: width / 2 - ((left + right) / 2) * zoom, y: height / 2 - ((top + bottom) / 2) * zoom };
}

/** Size of the canvas, zoom keys and fitting. The whole frame is shown at first, and again after a resize until someone moves the view. */
export function useCanvasView(editor: Editor, frame: Box, root: RefObject<HTMLDivElement | null>): CanvasView {
  const flow = useReactFlow();
  const { zoom } = useViewport();
  const [size, setSize] = useState({ width: 0, height: 0 });
  const frameNow = useRef(frame);
  const fitted = useRef<Viewport | null>(null);
  useEffect(() => { frameNow.current = frame; }, [frame]);

  useEffect(() => {
    const element = root.current;
    if (!element) return;
    const fit = () => {
      const next = viewOf(frameNow.current, element);
      if (!next) return;
      fitted.current = next;
      void flow.setViewport(next);
    };
    const observer = new ResizeObserver(() => {
      setSize({ width: element.clientWidth, height: element.clientHeight });
      const now = flow.getViewport();
      const untouched = fitted.current === null || (now.x === fitted.current.x && now.y === fitted.current.y && now.zoom === fitted.current.zoom);
      if (untouched) fit();
    });
    observer.observe(element);
    const stop = editor.onCamera((move) => {
      if (move === 'fit') fit();
      else void flow.zoomTo(flow.getZoom() * (move === 'in' ? zoomStep : 1 / zoomStep));
    });
    return () => { observer.disconnect(); stop(); };
  }, [editor, flow, root]);

  return {
    zoom, ...size,
    zoomBy: (factor) => { void flow.zoomTo(flow.getZoom() * factor); },
    fit: () => { editor.run('zoom-fit'); },
  };
}
