'use client';
import type { ReactNode } from 'react';
import type { MarginAnchor } from '@/components/margin/sheet-geometry';
import type { Editor } from '@/lib/editor/editor';
import type { EditorState } from '@/lib/editor/editor-state';
import { PlanForm } from './plan-form';
import { PropertyForm } from './property-form';
import { ScenarioForm } from './scenario-form';

interface FormWanted {
  readonly editor: Editor;
  readonly state: EditorState;
  readonly planning: boolean;
  readonly onPlanning: (planning: boolean) => void;
  /** Called when a form closes: the focus goes back to the canvas. */
  readonly onClosed: () => void;
}

/** The form that stands in the margin: the plan while it is changed, else that of the one chosen part, tied to it. */
export function formOf({ editor, state, planning, onPlanning, onClosed }: FormWanted): { readonly anchor: MarginAnchor; readonly content: ReactNode } | null {
  const { sheet, selection, gesture } = state;
  if (planning && !state.readOnly) {
    const close = () => { onPlanning(false); onClosed(); };
    return {
      anchor: { kind: 'spot', x: 0, y: 0 },
      content: <div className="flex max-h-[70vh] flex-col gap-2 overflow-y-auto"><PlanForm editor={editor} sheet={sheet} onDone={close} /><ScenarioForm editor={editor} sheet={sheet} /></div>,
    };
  }
  const [id, ...more] = selection;
  const part = more.length === 0 && gesture.doing === 'nothing' ? sheet.parts.find((one) => one.id === id) : undefined;
  if (!part || part.kind === 'box' || part.kind === 'zero-volt' || part.kind === 'earth') return null;
  return {
    anchor: { kind: 'part', id: part.id },
    content: <PropertyForm editor={editor} sheet={sheet} part={part} onClose={() => { editor.run('select-items', { ids: [] }); onClosed(); }} />,
  };
}
