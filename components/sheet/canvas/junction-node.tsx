'use client';
import { memo } from 'react';
import type { NodeProps } from 'reactflow';
import { useCanvas, useEditorValue } from './canvas-context';
import { junctionHandles, type JunctionNode } from './flow-records';
import { PinHandles } from './pin-handles';

/** A dot where three wires or more meet, a 45° tick where one ends loose. */
export const JunctionNodeView = memo(function JunctionNodeView({ id, data: { wires } }: NodeProps<JunctionNode>) {
  const { editor } = useCanvas();
  const chosen = useEditorValue(editor, (state) => state.selection.has(id));
  return (
    <>
      <PinHandles handles={junctionHandles} />
      <svg width="8" height="8" className="pointer-events-none block overflow-visible" aria-hidden="true">
        {wires > 2 ? <circle cx="4" cy="4" r="3" className="fill-ink" /> : null}
        {wires === 1 ? <path d="M0 8L8 0" className="stroke-ink" strokeWidth="1.2" /> : null}
        {chosen ? <circle cx="4" cy="4" r="7" className="fill-none stroke-act" strokeWidth="1.5" /> : null}
      </svg>
    </>
  );
});
