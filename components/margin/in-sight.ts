import type { Box } from './sheet-geometry';

/** Words and symbols smaller than this on the screen cannot be read: a leader need not spare them, px. */
const readable = { words: 6, symbol: 16 };

/** Boxes that lie on a canvas of this size, at least in part, and are large enough to be worth sparing. */
export function inSight(boxes: readonly Box[], { width, height }: { readonly width: number; readonly height: number }, what: 'words' | 'symbol' | 'wire'): readonly Box[] {
  const largeEnough = (box: Box) => what === 'wire' || (what === 'words' ? box.bottom - box.top : Math.max(box.right - box.left, box.bottom - box.top)) >= readable[what];
  return boxes.filter((box) => box.right >= 0 && box.left <= width && box.bottom >= 0 && box.top <= height && largeEnough(box));
}
