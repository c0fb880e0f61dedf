/** Thrown inside the reader by a line that cannot be read; `readDeck` turns it into line and reason. */
export class DeckRefusal extends Error {
  constructor(readonly line: number, readonly reason: string) {
    super(reason);
  }
}
