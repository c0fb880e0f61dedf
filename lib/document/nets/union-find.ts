/** Disjoint sets of keys; the smallest key stands for its set, so that the answer does not depend on the order of joins. */
export class UnionFind {
  private readonly parent = new Map<string, string>();

  add(key: string): void {
    if (!this.parent.has(key)) this.parent.set(key, key);
  }

  find(key: string): string {
    let root = key;
    for (let next = this.parent.get(root); next !== undefined && next !== root; next = this.parent.get(root)) root = next;
    let step = key;
    while (step !== root) {
      const next = this.parent.get(step) ?? root;
      this.parent.set(step, root);
      step = next;
    }
    return root;
  }

  join(a: string, b: string): void {
    this.add(a);
    this.add(b);
    const first = this.find(a);
    const second = this.find(b);
    if (first === second) return;
    if (first < second) this.parent.set(second, first);
    else this.parent.set(first, second);
  }

  /** Keys of each set, by the key that stands for it. */
  sets(): ReadonlyMap<string, readonly string[]> {
    const sets = new Map<string, string[]>();
    for (const key of this.parent.keys()) {
      const root = this.find(key);
      const set = sets.get(root);
      if (set) set.push(key); else sets.set(root, [key]);
    }
    return sets;
  }
}
