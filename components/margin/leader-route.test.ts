import { describe, expect, it } from 'vitest';
import { crossesBox, routeLeader } from './leader-route';

const from = { x: 800, y: 300 };

describe('routeLeader', () => {
  it('leaves level, bends once and ends on the target', () => {
    const leader = routeLeader(from, [{ x: 500, y: 100 }], [], [])?.leader;
    expect(leader?.bend.y).toBe(from.y);
    expect(leader?.end).toEqual({ x: 500, y: 100 });
  });

  it('goes round a text that stands in the straight way', () => {
    const text = { left: 560, top: 120, right: 700, bottom: 240 };
    const leader = routeLeader(from, [{ x: 500, y: 100 }], [text], [])?.leader;
    expect(leader).toBeDefined();
    if (leader) {
      expect(crossesBox(leader.from, leader.bend, text)).toBe(false);
      expect(crossesBox(leader.bend, leader.end, text)).toBe(false);
    }
  });

  it('takes another end when the first is walled in by text', () => {
    const wall = { left: 505, top: 0, right: 560, bottom: 600 };
    const leader = routeLeader(from, [{ x: 500, y: 100 }, { x: 580, y: 100 }], [wall], [])?.leader;
    expect(leader?.end).toEqual({ x: 580, y: 100 });
  });

  it('prefers not to cross a leader that is already there', () => {
    const first = { from: { x: 800, y: 200 }, bend: { x: 700, y: 200 }, end: { x: 600, y: 400 } };
    const leader = routeLeader({ x: 800, y: 420 }, [{ x: 650, y: 450 }], [], [first])?.leader;
    expect(leader?.end).toEqual({ x: 650, y: 450 });
  });
});
