'use client';
import { useMemo, useRef, type PointerEvent } from 'react';
import { useReactFlow } from 'reactflow';
import type { Editor } from '@/lib/editor/editor';
import type { PointerPress } from '@/lib/editor/tools/tool';

/** Reach of a mouse and of a finger, screen pixels. */
const reach = { mouse: 6, touch: 16 };

/** Two presses within this time and distance are a double one. */
const doublePause = 350;

/** How far a finger may wander in a tap, screen pixels; farther, it moves the view. */
const tapSlack = 10;

/**
 * Hands the pointer to the editor in sheet units. The left button and a tap are the tool's; the middle and right
 * buttons and dragging fingers move the view, which is the flow's own business.
 */
export function useCanvasPointer(editor: Editor, onCursor: (at: { readonly x: number; readonly y: number } | null) => void) {
  const flow = useReactFlow();
  const held = useRef<number | null>(null);
  const tap = useRef<{ readonly id: number; readonly x: number; readonly y: number } | null>(null);
  const last = useRef({ time: 0, x: 0, y: 0 });
  return useMemo(() => {
    const pressOf = (event: PointerEvent): PointerPress => ({
      at: flow.screenToFlowPosition({ x: event.clientX, y: event.clientY }, { snapToGrid: false }),
      shift: event.shiftKey, mod: event.ctrlKey || event.metaKey,
      reach: (event.pointerType === 'touch' ? reach.touch : reach.mouse) / flow.getZoom(),
    });
    return {
      onPointerDown(event: PointerEvent<HTMLElement>) {
        if (event.button !== 0 || held.current !== null || (event.target as Element).closest('[data-not-canvas]')) return;
        if (event.pointerType === 'touch') {
          tap.current = { id: event.pointerId, x: event.clientX, y: event.clientY };
          return;
        }
        const press = pressOf(event);
        const twice = event.timeStamp - last.current.time < doublePause && Math.hypot(event.clientX - last.current.x, event.clientY - last.current.y) < 6;
        last.current = { time: event.timeStamp, x: event.clientX, y: event.clientY };
        held.current = event.pointerId;
        event.currentTarget.setPointerCapture(event.pointerId);
        editor.pointerDown(press);
        if (twice) editor.doublePress(press);
      },
      onPointerMove(event: PointerEvent<HTMLElement>) {
        if (event.pointerType === 'touch') return;
        const press = pressOf(event);
        onCursor({ x: Math.round(press.at.x), y: Math.round(press.at.y) });
        editor.pointerMove(press);
      },
      onPointerUp(event: PointerEvent<HTMLElement>) {
        const tapped = tap.current;
        if (event.pointerType === 'touch') {
          tap.current = null;
          if (tapped?.id !== event.pointerId || Math.hypot(event.clientX - tapped.x, event.clientY - tapped.y) > tapSlack) return;
          editor.pointerDown(pressOf(event));
          editor.pointerUp(pressOf(event));
          return;
        }
        if (held.current === null && editor.state.ghost !== null) {
          event.currentTarget.focus();
          editor.pointerDown(pressOf(event));
          editor.pointerUp(pressOf(event));
          return;
        }
        if (held.current !== event.pointerId) return;
        held.current = null;
        editor.pointerUp(pressOf(event));
      },
      onPointerCancel(event: PointerEvent<HTMLElement>) {
        if (held.current !== event.pointerId) return;
        held.current = null;
        editor.pointerLost();
      },
      onPointerLeave() {
        onCursor(null);
      },
    };
  }, [editor, flow, onCursor]);
}
