import * as Y from 'yjs';
import { readSheet } from '@/lib/document/read-sheet';
import { partAt } from '@/lib/document/testing/sheet-builder';
import { writeSheet } from '@/lib/document/write-sheet';
import { openSheetSession } from '@/realtime/client/open-sheet-session';
import type { SheetSession } from '@/realtime/client/sheet-session';
import type { TicketAnswer } from '@/realtime/client/sheet-socket';

declare global {
  interface Window {
    ticketFor(circuitId: string): Promise<TicketAnswer | null>;
    sheet: typeof sheet;
  }
}

let session: SheetSession | undefined;
const now = () => {
  if (!session) throw new Error('No sheet is open.');
  return session.getSnapshot();
};

/** What a test does in a real browser: the product's own client on the browser's own storage. */
const sheet = {
  async open(circuitId: string, personId: string): Promise<void> {
    session = await openSheetSession({
      circuitId, personId,
      async fetchTicket() {
        const answer = await window.ticketFor(circuitId);
        if (!answer) throw new Error('No network.');
        return answer;
      },
    });
  },
  state() {
    const { doc: _doc, refused, ...rest } = now();
    return { ...rest, refused: refused.map(({ reason }) => reason), refs: readSheet(now().doc).sheet.parts.map((part) => part.ref).sort() };
  },
  add(ref: string): void {
    const before = readSheet(now().doc).sheet;
    const place = 20 * before.parts.length;
    writeSheet(now().doc, before, { ...before, parts: [...before.parts, partAt('resistor', ref, place, place)] });
  },
  spoil(): void {
    now().doc.getMap<Y.Map<unknown>>('parts').set('bad', new Y.Map(Object.entries({ kind: 'no such kind' })));
  },
};
window.sheet = sheet;
