import { describe, expect, it } from 'vitest';
import { ladderScale } from './ladder-scale';

const plan = (...volts: number[]) => volts.map((peak) => ({ peak }));

describe('ladderScale', () => {
  it('is logarithmic: equal ratios are equal distances', () => {
    const { x } = ladderScale(plan(12, 325), 92, 804);
    expect(x(20) - x(10)).toBeCloseTo(x(200) - x(100), 9);
  });

  it('ends at the highest hold point and starts just below the lowest', () => {
    const scale = ladderScale(plan(12, 30, 325), 92, 804);
    expect(scale.x(325)).toBeCloseTo(804, 9);
    expect(scale.x(10)).toBeCloseTo(92, 9);
  });

  it('shows the touch-safe limit even when the plan stays far below it', () => {
    const scale = ladderScale(plan(5), 0, 300);
    expect(scale.x(60)).toBeLessThan(300);
    expect(scale.right).toBeCloseTo(scale.x(5), 9);
    expect(scale.x(5)).toBeGreaterThan(0);
  });

  it('marks each decade as major', () => {
    const { ticks } = ladderScale(plan(12, 325), 0, 100);
    expect(ticks.filter((tick) => tick.major).map((tick) => tick.volts)).toEqual([10, 100]);
  });
});
