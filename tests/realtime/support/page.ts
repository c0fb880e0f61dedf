import { WebSocket as NodeWebSocket } from 'ws';
import { readSheet } from '@/lib/document/read-sheet';
import { writeSheet } from '@/lib/document/write-sheet';
import { partAt } from '@/lib/document/testing/sheet-builder';
import type { RoomActor } from '@/db/queries/room-grant';
import { MemoryEdits } from '@/realtime/client/memory-edits';
import { noLocks, type OpenCopies } from '@/realtime/client/open-copies';
import { RoomSession, type SheetEvent, type SheetSnapshot } from '@/realtime/client/sheet-session';
import type { EditStore } from '@/realtime/client/edit-store';
import type { TicketAnswer } from '@/realtime/client/sheet-socket';
import { waitFor } from '@/realtime/testing/wait-for';
import { issueRoomTicket } from '@/db/mutations/room-ticket';
import { pageOrigin, type SheetWorld } from './sheet-world';

/** A browser's socket for Node: it says where its page came from. */
export class PageWebSocket extends NodeWebSocket {
  constructor(url: string, protocols: string[]) {
    super(url, protocols, { origin: pageOrigin, perMessageDeflate: false });
  }
}

/** One browser of one person: what it keeps survives its pages. */
export class Browser {
  readonly edits: EditStore = new MemoryEdits();
  readonly copies: OpenCopies = noLocks();
}

export interface PageWorld {
  /** A ticket and the address to dial; refused as the route would. */
  ticketFor(circuitId: string, actor: RoomActor): Promise<TicketAnswer>;
}

export function pageWorld(world: SheetWorld): PageWorld {
  return {
    async ticketFor(circuitId, actor) {
      const issued = await issueRoomTicket(world.db, circuitId, actor);
      return issued ? { ticket: issued.ticket, url: world.url(circuitId) } : { refused: 'You can no longer open this sheet.' };
    },
  };
}

/** A page with the sheet open, driven the way a person would. */
export class Page {
  readonly session: RoomSession;
  readonly events: SheetEvent[] = [];
  /** When true the page reaches no server. */
  offline = false;

  constructor(world: PageWorld, circuitId: string, actor: RoomActor, browser = new Browser()) {
    this.session = new RoomSession({
      circuitId, personId: actor.personId ?? null, edits: browser.edits, copies: browser.copies, longestPause: 200,
      WebSocket: PageWebSocket as unknown as typeof WebSocket,
      fetchTicket: async () => {
        if (this.offline) throw new Error('No network.');
        return world.ticketFor(circuitId, actor);
      },
    });
    this.session.onEvent((event) => this.events.push(event));
  }

  get now(): SheetSnapshot {
    return this.session.getSnapshot();
  }

  until(what: string, holds: (snapshot: SheetSnapshot) => boolean, timeout?: number): Promise<SheetSnapshot> {
    return waitFor(what, () => holds(this.now) && this.now, timeout).catch((error: Error) => {
      const { doc: _doc, ...rest } = this.now;
      throw new Error(`${error.message} Page: ${JSON.stringify({ ...rest, refs: this.refs() })}`);
    });
  }

  loaded(timeout?: number): Promise<SheetSnapshot> {
    return this.until('the sheet to load', ({ loaded, line }) => loaded && line.state === 'open', timeout);
  }

  saved(timeout?: number): Promise<SheetSnapshot> {
    return this.until('everything to be saved', ({ save }) => save.state === 'saved', timeout);
  }

  shows(ref: string, timeout?: number): Promise<SheetSnapshot> {
    return this.until(`${ref} to be shown`, () => this.refs().includes(ref), timeout);
  }

  refs(): string[] {
    return readSheet(this.now.doc).sheet.parts.map((part) => part.ref).sort();
  }

  addResistor(ref: string, ohms = 22_000): void {
    const { sheet } = readSheet(this.now.doc);
    const place = 20 * sheet.parts.length;
    writeSheet(this.now.doc, sheet, { ...sheet, parts: [...sheet.parts, partAt('resistor', ref, place, place, { facts: { value: ohms } })] });
  }

  remove(ref: string): void {
    const { sheet } = readSheet(this.now.doc);
    writeSheet(this.now.doc, sheet, { ...sheet, parts: sheet.parts.filter((part) => part.ref !== ref) });
  }

  close(): void {
    this.session.close();
  }
}
