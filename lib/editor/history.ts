import * as Y from 'yjs';
import { sharedTypesOf } from '@/lib/document/stored-sheet';

/**
 * Undo and redo of one person's own edits. Only transactions of `origin` count: what others do, what is loaded and what
 * an earlier visit did is never undone here. Each edit is a step of its own, with the selection to go back to.
 */
export class History {
  private readonly manager: Y.UndoManager;

  constructor(doc: Y.Doc, origin: object, private readonly selectionNow: () => ReadonlySet<string>, restore: (ids: ReadonlySet<string>) => void) {
    this.manager = new Y.UndoManager(sharedTypesOf(doc), { trackedOrigins: new Set([origin]), captureTimeout: 0 });
    this.manager.on('stack-item-added', ({ stackItem }) => stackItem.meta.set('selection', this.before ?? this.selectionNow()));
    this.manager.on('stack-item-popped', ({ stackItem }) => {
      const selection = stackItem.meta.get('selection') as ReadonlySet<string> | undefined;
      if (selection) restore(selection);
    });
  }

  private before: ReadonlySet<string> | null = null;

  /** Runs an edit and remembers what was chosen before it. */
  record(edit: () => void): void {
    this.before = this.selectionNow();
    edit();
    this.before = null;
    this.manager.stopCapturing();
  }

  undo(): void {
    this.manager.undo();
  }

  redo(): void {
    this.manager.redo();
  }

  /** Forgets all steps: after a refused edit the document is another one. */
  clear(): void {
    this.manager.clear();
  }

  get canUndo(): boolean {
    return this.manager.undoStack.length > 0;
  }

  get canRedo(): boolean {
    return this.manager.redoStack.length > 0;
  }
}
