import { expect, it } from 'vitest';
import { inSight } from './in-sight';

const size = { width: 800, height: 600 };
const box = (left: number, top: number, width: number, height: number) => ({ left, top, right: left + width, bottom: top + height });

it('keeps what is on the canvas and can be read', () => {
  const [seen, off, tiny] = [box(10, 10, 40, 14), box(900, 10, 40, 14), box(10, 10, 8, 3)];
  expect(inSight([seen, off, tiny], size, 'words')).toEqual([seen]);
  expect(inSight([box(-20, 10, 40, 14), tiny], size, 'symbol')).toEqual([box(-20, 10, 40, 14)]);
});

it('keeps level wires however thin', () => {
  expect(inSight([box(0, 10, 300, 0), box(0, 700, 300, 0)], size, 'wire')).toEqual([box(0, 10, 300, 0)]);
});
