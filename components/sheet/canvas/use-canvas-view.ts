'use client';
import { useCallback, useEffect, useRef, useState, type RefObject } from 'react';
import { useReactFlow, useViewport } from 'reactflow';
import type { Box } from '@/lib/document/geometry/point';
import type { Editor } from '@/lib/editor/editor';

/** Fits no closer than this: a small circuit keeps its size. */
const closest = 1.4;

export interface CanvasView {
  readonly zoom: number;
  readonly width: number;
  readonly height: number;
  readonly zoomBy: (factor: number) => void;
  readonly fit: () => void;
}

/** Size of the canvas, zoom keys and fitting. The whole frame is shown at first, and again after a resize until someone moves the view. */
export function useCanvasView(editor: Editor, frame: Box, root: RefObject<HTMLDivElement | null>): CanvasView {
  const flow = useReactFlow();
  const { zoom } = useViewport();
  const [size, setSize] = useState({ width: 0, height: 0 });
  const frameNow = useRef(frame);
  const fitted = useRef<{ readonly x: number; readonly y: number; readonly zoom: number } | null>(null);
  useEffect(() => { frameNow.current = frame; }, [frame]);

  const fit = useCallback(() => {
    const { width = 0, height = 0 } = root.current?.getBoundingClientRect() ?? {};
    if (width === 0 || height === 0) return;
    const { left, top, right, bottom } = frameNow.current;
    const scale = Math.min(width / (right - left), height / (bottom - top), closest);
    const next = { zoom: scale, x: width / 2 - ((left + right) / 2) * scale, y: height / 2 - ((top + bottom) / 2) * scale };
    fitted.current = next;
    void flow.setViewport(next);
  }, [flow, root]);

  useEffect(() => {
    const element = root.current;
    if (!element) return;
    const observer = new ResizeObserver(() => {
      setSize({ width: element.clientWidth, height: element.clientHeight });
      const now = flow.getViewport();
      const untouched = fitted.current === null || (now.x === fitted.current.x && now.y === fitted.current.y && now.zoom === fitted.current.zoom);
      if (untouched) fit();
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, [fit, flow, root]);

  const zoomBy = useCallback((factor: number) => { void flow.zoomTo(flow.getZoom() * factor); }, [flow]);
  useEffect(() => editor.onCamera((move) => {
    if (move === 'fit') fit();
    else zoomBy(move === 'in' ? 1.25 : 0.8);
  }), [editor, fit, zoomBy]);
  return { zoom, ...size, zoomBy, fit };
}
