/** Disjoint sets over text keys, with path halving. Keys come into being when first named. */
export class UnionFind {
  private readonly parents = new Map<string, string>();

  find(key: string): string {
    let current = key;
    let parent = this.parents.get(current) ?? this.added(current);
    while (parent !== current) {
      const grandparent = this.parents.get(parent) as string;
      this.parents.set(current, grandparent);
      current = grandparent;
      parent = this.parents.get(current) as string;
    }
    return current;
  }

  join(a: string, b: string): void {
    const [left, right] = [this.find(a), this.find(b)];
    if (left !== right) this.parents.set(right, left);
  }

  private added(key: string): string {
    this.parents.set(key, key);
    return key;
  }
}
