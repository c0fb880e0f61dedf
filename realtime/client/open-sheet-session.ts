import { IndexedDbEdits } from './indexed-db-edits';
import { MemoryEdits } from './memory-edits';
import { lockedCopies, noLocks } from './open-copies';
import { RoomSession, type SheetSession, type SheetSessionOptions } from './sheet-session';

/**
 * Opens a circuit's sheet in this page and keeps it open: connects, loads, shares edits, keeps those not yet saved in the
 * browser, comes back after interruptions. In React: `useSyncExternalStore(session.subscribe, session.getSnapshot)`.
 *
 * Edit `snapshot.doc` (while `snapshot.editable`); every local change of it is an edit of this person. Undo belongs to the
 * document: when `snapshot.doc` is another one, an edit was refused, the sheet is fresh, and the old history is void.
 */
export async function openSheetSession(
  options: Pick<SheetSessionOptions, 'circuitId' | 'personId' | 'fetchTicket'>,
): Promise<SheetSession> {
  const copies = typeof navigator !== 'undefined' && 'locks' in navigator ? lockedCopies(navigator.locks) : noLocks();
  try {
    return new RoomSession({ ...options, copies, edits: await IndexedDbEdits.open() });
  } catch {
    return new RoomSession({ ...options, copies, edits: new MemoryEdits(), keptInMemoryOnly: true });
  }
}
