import { describe, expect, it } from 'vitest';
import { ruleOffset } from './column-layout';
import { routeLeaders, settleTops } from './leaders';
import type { Targets } from './use-targets';

const text = { left: 300, top: 90, right: 380, bottom: 110 };
const targets: Targets = {
  of: new Map([['a', { ends: [{ x: 200, y: 100 }], zone: 'A1', words: 'R1' }], ['b', { ends: [{ x: 200, y: 300 }], zone: 'C1', words: 'R2' }]]),
  texts: [text], obstacles: { symbols: [], levelWires: [] }, width: 600, height: 500,
};

describe('settleTops', () => {
  it('moves an entry off the level of a text in its way', () => {
    const tops = settleTops([{ key: 'a', top: 100 - ruleOffset, height: 40 }], { ...targets, texts: [{ left: 214, top: 92, right: 590, bottom: 108 }] }, 0, 500);
    expect(tops.get('a')).not.toBe(100 - ruleOffset);
  });

  it('keeps order and distance', () => {
    const tops = settleTops([{ key: 'a', top: 60, height: 40 }, { key: 'b', top: 106, height: 40 }], targets, 0, 500);
    expect((tops.get('b') ?? 0) - (tops.get('a') ?? 0)).toBeGreaterThanOrEqual(46);
  });
});

describe('routeLeaders', () => {
  it('leaves out an entry whose target is out of view', () => {
    const away: Targets = { ...targets, of: new Map([['a', { ends: [{ x: -40, y: 100 }], zone: 'A1', words: 'R1' }]]) };
    expect(routeLeaders([{ key: 'a', kind: 'stop', on: false, top: 100 }], away, 0)).toEqual([]);
  });

  it('draws one leader for each entry in view', () => {
    const wanted = [{ key: 'a', kind: 'stop' as const, on: false, top: 60 }, { key: 'b', kind: 'note' as const, on: true, top: 260 }];
    expect(routeLeaders(wanted, targets, 0).map(({ key }) => key)).toEqual(['a', 'b']);
  });
});
