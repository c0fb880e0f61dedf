import type { Box } from '@/lib/document/geometry/point';

const step = 200;

/** Things by where they lie, so that asking for what is near costs the same on a large sheet as on a small one. */
export class Near<T> {
  private readonly squares = new Map<string, Set<T>>();

  add(box: Box, thing: T): void {
    for (const key of keysOf(box)) {
      const square = this.squares.get(key);
      if (square) square.add(thing); else this.squares.set(key, new Set([thing]));
    }
  }

  /** Everything whose squares the box touches: a few more than what overlaps it, none fewer. */
  within(box: Box): ReadonlySet<T> {
    const found = new Set<T>();
    for (const key of keysOf(box)) this.squares.get(key)?.forEach((thing) => found.add(thing));
    return found;
  }
}

function keysOf(box: Box): readonly string[] {
  const keys: string[] = [];
  for (let x = Math.floor(box.left / step); x <= Math.floor(box.right / step); x += 1) {
    for (let y = Math.floor(box.top / step); y <= Math.floor(box.bottom / step); y += 1) keys.push(`${x} ${y}`);
  }
  return keys;
}
