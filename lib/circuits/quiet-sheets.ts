/** A sheet is checked once nobody has changed it for this long, and at least this often while somebody does. */
export const quietFor = 2_000;
export const checkAtLeastEvery = 30_000;

interface Watched {
  headSeq: number;
  /** When this head was first seen. */
  since: number;
  /** When the sheet was first seen ahead of its last check. */
  waitingSince: number;
}

/** Decides which sheets are due for the server's own check, from what the log's heads are. Keeps no more than what is waiting. */
export class QuietSheets {
  private readonly watched = new Map<string, Watched>();

  /** Takes the sheets whose head is ahead of their last check and answers those to be checked now. */
  due(unchecked: readonly { readonly id: string; readonly headSeq: number }[], now: number): string[] {
    const known = new Set(unchecked.map(({ id }) => id));
    for (const id of this.watched.keys()) if (!known.has(id)) this.watched.delete(id);
    return unchecked.filter(({ id, headSeq }) => {
      const before = this.watched.get(id);
      const moved = before === undefined || before.headSeq !== headSeq;
      const sheet = { headSeq, since: moved ? now : before.since, waitingSince: before?.waitingSince ?? now };
      this.watched.set(id, sheet);
      return now - sheet.since >= quietFor || now - sheet.waitingSince >= checkAtLeastEvery;
    }).map(({ id }) => id);
  }

  /** A check of this sheet has ended: its waiting begins anew. */
  checked(id: string): void {
    this.watched.delete(id);
  }
}
