/** Items by rising key; among equal keys the one pushed first comes first, so that every run gives the same order. */
export class Heap<T> {
  private readonly items: { readonly key: number; readonly turn: number; readonly value: T }[] = [];
  private turn = 0;

  push(key: number, value: T): void {
    this.items.push({ key, turn: this.turn, value });
    this.turn += 1;
    for (let child = this.items.length - 1; child > 0;) {
      const parent = (child - 1) >> 1;
      if (!this.before(child, parent)) break;
      this.swap(child, parent);
      child = parent;
    }
  }

  pop(): T | undefined {
    const top = this.items[0];
    const last = this.items.pop();
    if (!top || !last) return undefined;
    if (this.items.length > 0) {
      this.items[0] = last;
      this.sink();
    }
    return top.value;
  }

  private sink(): void {
    for (let parent = 0; ;) {
      let least = parent;
      for (const child of [2 * parent + 1, 2 * parent + 2]) {
        if (child < this.items.length && this.before(child, least)) least = child;
      }
      if (least === parent) return;
      this.swap(parent, least);
      parent = least;
    }
  }

  private before(a: number, b: number): boolean {
    const first = this.items[a]!;
    const second = this.items[b]!;
    return first.key < second.key || (first.key === second.key && first.turn < second.turn);
  }

  private swap(a: number, b: number): void {
    const kept = this.items[a]!;
    this.items[a] = this.items[b]!;
    this.items[b] = kept;
  }
}
