'use client';
import { Button } from '@/components/ui/button';
import type { Editor } from '@/lib/editor/editor';

/** What to do on a sheet with nothing on it. */
export function EmptySheet({ editor, onTaken }: { readonly editor: Editor; readonly onTaken: () => void }) {
  return (
    <div data-not-canvas className="absolute top-1/2 left-1/2 z-[4] w-[430px] max-w-[calc(100%-32px)] -translate-x-1/2 -translate-y-1/2 border border-ink bg-film px-5 pt-5 pb-2 max-tablet:hidden">
      <h2 className="font-cond text-2xl leading-tight font-semibold text-ink">Put the supply down first</h2>
      <p className="mt-1 mb-4 text-body text-ink-2">Then the load, then the switch between them. Checks start with the first wire.</p>
      <div className="flex items-center justify-between gap-6 border-t border-rule py-3.5">
        <p className="text-body"><b className="block font-medium text-ink">Add a DC supply</b><span className="text-ink-2">With its current limit.</span></p>
        <Button tone="primary" onClick={() => { editor.run('hold-part', { kind: 'dc-supply', at: { x: 80, y: 310 } }); onTaken(); }}>Add a part</Button>
      </div>
    </div>
  );
}
