import { describe, expect, it } from 'vitest';
import { fitOnePoint, fitTwoPoints, junctionVolts } from './junction-fit';

/** docs/engine.md 3.2, "Fitted": points, kind's largest N, N and RS where the table gives them. */
const fitted = [
  { part: 'red LED', low: [1.8, 2e-3], high: [2, 20e-3], nMax: 4, n: 2.37, rs: 3.3 },
  { part: 'white LED', low: [2.8, 5e-3], high: [3.2, 20e-3], nMax: 4, n: 4, rs: 17.2 },
  { part: '1N4148', low: [0.62, 1e-3], high: [0.72, 10e-3], nMax: 2, n: 1.18, rs: 3.3 },
  { part: '1N4007', low: [0.75, 0.1], high: [1, 1], nMax: 2, n: 2, rs: 0.146 },
  { part: '1N5819', low: [0.45, 0.1], high: [0.6, 1], nMax: 1.2, n: 1.2, rs: 0.0878 },
] as const;

describe('two points', () => {
  it.each(fitted)('meet $part, N $n, RS $rs', ({ low, high, nMax, n, rs }) => {
    const fit = fitTwoPoints({ volts: low[0], amps: low[1] }, { volts: high[0], amps: high[1] }, nMax);
    expect(fit.n).toBeCloseTo(n, 2);
    expect(fit.rs / rs).toBeCloseTo(1, 1);
    expect(junctionVolts(fit, low[1])).toBeCloseTo(low[0], 6);
    expect(junctionVolts(fit, high[1])).toBeCloseTo(high[0], 6);
  });

  it('keeps N at 1 or above when the points lie closer than an ideal junction', () => {
    const fit = fitTwoPoints({ volts: 0.6, amps: 1e-3 }, { volts: 0.65, amps: 10e-3 }, 2);
    expect(fit.n).toBe(1);
    expect(fit.rs).toBe(0);
  });
});

describe('one point', () => {
  it('is met with the kind\'s N and RS', () => {
    const fit = fitOnePoint({ volts: 3.2, amps: 20e-3 }, 3, 10);
    expect(fit.rs).toBe(10);
    expect(junctionVolts(fit, 20e-3)).toBeCloseTo(3.2, 12);
  });

  it('leaves the junction its share at high current', () => {
    const fit = fitOnePoint({ volts: 3.2, amps: 0.7 }, 3, 10);
    expect(fit.is).toBeGreaterThan(0);
    expect(fit.rs).toBeLessThan(0.5);
    expect(junctionVolts(fit, 0.7)).toBeCloseTo(3.2, 12);
  });
});
