import type { RoomSaving } from '../protocol';

/** What a page says about this person's edits. */
export type SaveMark =
  /** Every edit made here is committed; `at` is when the last one was (ms since 1970), null when none was made. */
  | { readonly state: 'saved'; readonly at: number | null }
  | { readonly state: 'saving'; readonly edits: number }
  /** Kept in this browser and sent later. */
  | { readonly state: 'not saved'; readonly edits: number; readonly why: string };

export interface SaveFacts {
  /** Edits without an acknowledgement. */
  readonly waiting: number;
  readonly savedAt: number | null;
  /** Since when the server owes an answer. */
  readonly owedSince: number;
  /** Why nothing can be sent now; undefined while the socket is open. */
  readonly offline: string | undefined;
  readonly room: RoomSaving;
  readonly roomWhy: string;
}

/** A commit that takes longer than this is no longer called 'saving', milliseconds. */
export const patience = 8_000;

/** The save mark. It never says 'saved' from silence: only acknowledgements make an edit count as saved. */
export function saveMark({ waiting, savedAt, owedSince, offline, room, roomWhy }: SaveFacts, now: number): SaveMark {
  if (waiting === 0) return { state: 'saved', at: savedAt };
  if (offline !== undefined) return { state: 'not saved', edits: waiting, why: offline };
  if (room !== 'saving') return { state: 'not saved', edits: waiting, why: roomWhy };
  if (now - owedSince > patience) {
    return { state: 'not saved', edits: waiting, why: 'The server has not answered yet.' };
  }
  return { state: 'saving', edits: waiting };
}
