import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { FailureStatus, SimulationRequest } from './engine';
import { createNodeEngine, engineFilesPresent } from './node-engine';

const engine = createNodeEngine();
const good: SimulationRequest = {
  lines: ['V1 a 0 12', 'R1 a b 1k', 'R2 b 0 2k', '.op'], analysis: 'op', vectors: ['v(b)', 'i(v1)'],
};

/** Deck faults of `docs/engine.md` 1.2, the status each must get, and a shorter watchdog where it must bite. */
const faultRows: readonly (readonly [string, FailureStatus, readonly string[], number?])[] = [
  ['a bad value', 'parse', ['V1 a 0 12', 'R1 a 0 abc', '.op']],
  ['an unknown model', 'parse', ['V1 a 0 12', 'D1 a 0 NONE', '.op']],
  ['an unknown subcircuit', 'parse', ['V1 a 0 12', 'X1 a 0 NONE', '.op']],
  ['two elements of one name', 'parse', ['V1 a 0 12', 'R1 a 0 1k', 'R1 a 0 2k', '.op']],
  ['an unknown model parameter', 'fatal', ['V1 a 0 12', 'R1 a b 1k', 'D1 b 0 DX', '.model DX D(FOO=3)', '.op']],
  ['too few nodes', 'parse-warn', ['V1 a 0 12', 'R2 a 0 1k', 'R1 a', '.op']],
  ['a resistor of 0 ohm', 'parse-warn', ['V1 a 0 12', 'R1 a b 0', 'R2 b 0 1k', '.op']],
  ['a node held by capacitors alone', 'singular', ['V1 a 0 12', 'C1 a b 1u', 'C2 b 0 1u', '.op']],
  ['an open gate', 'singular', [
    'V1 a 0 12', 'R1 a d 1k', 'M1 d g 0 NM', 'C1 g 0 1n', '.model NM VDMOS(VTO=3 KP=16)', '.op',
  ]],
  ['an island', 'singular', ['V1 a 0 12', 'R1 a 0 1k', 'V2 x y 5', 'R2 x y 1k', '.op']],
  ['a current source into a capacitor', 'singular', ['V1 a 0 12', 'R1 a 0 1k', 'I1 0 q 1m', 'C1 q 0 1u', '.op']],
  ['a voltage source across a coil', 'singular', ['V1 a 0 12', 'L1 a 0 1m', 'R1 a 0 100', '.op']],
  ['two voltage sources in parallel', 'singular', ['V1 a 0 12', 'V2 a 0 5', 'R1 a 0 1k', '.op']],
  ['a voltage source on itself', 'aborted', ['V1 a a 12', 'R1 a 0 1k', '.op']],
  ['an operating point found by integrating in time', 'no-convergence', [
    '.options temp=25 tnom=25',
    'B1 0 v I = min(3, max(-0.02, (12-V(v))/0.01))', 'R0 v 0 1meg', 'R1 v d 6', 'V1 d e 0', 'M1 e g 0 NM', 'R2 g 0 10k',
    '.model NM VDMOS(VTO=2.9 KP=16 RS=3.74m RD=26m RG=1.5 CGS=1.9n IS=6p N=1.1 RB=10m BV=100 IBV=250u RDS=4meg)', '.op',
  ]],
  ['no analysis', 'no-job', ['V1 a 0 12', 'R1 a 0 1k']],
  ['no parts', 'stale', ['.op']],
  ['a vector that does not exist', 'aborted', ['V1 a 0 12', 'R1 a 0 1k', '.save v(zz)', '.op']],
  ['another analysis than asked for', 'wrong-plot', ['V1 a 0 12', 'R1 a b 1k', 'R2 b 0 1k', '.tran 1u 10u']],
  ['a run that does not end', 'timeout', ['V1 a 0 SIN(0 1 1k)', 'R1 a b 1k', 'R2 b 0 1k', '.tran 1n 10 0 1n'], 700],
  ['a command among the lines', 'error', ['V1 a 0 12', 'R1 a 0 1k', '.control', '.op']],
  ['a file to include', 'error', ['.include /etc/passwd', '.op']],
  ['an expression', 'error', ['V1 a 0 {12+x}', 'R1 a 0 1k', '.op']],
  ['a second line smuggled into one', 'error', ['V1 a 0 12\n.control', 'R1 a 0 1k', '.op']],
];

const faults = faultRows.map(([fault, status, lines, timeoutMs]) => ({ fault, status, lines, timeoutMs }));

beforeAll(() => engine.warm(), 60_000);
afterAll(() => engine.dispose());

describe('the guarded protocol', () => {
  it('starts and says so', () => {
    expect(engineFilesPresent()).toBe(true);
    expect(engine.state).toBe('ready');
  });

  it.each(faults)('refuses $fault as $status, and the next run is right', async ({ status, lines, timeoutMs }) => {
    const refused = await engine.simulate({ lines, analysis: 'op', vectors: ['v(a)'], timeoutMs });
    expect(refused.status, JSON.stringify(refused)).toBe(status);
    expect(await engine.simulate(good)).toEqual({ status: 'ok', values: { 'v(b)': 8, 'i(v1)': -0.004 } });
  }, 30_000);

  it('refuses a vector that the run did not bring', async () => {
    const result = await engine.simulate({ ...good, vectors: ['v(b)', 'v(none)'] });
    expect(result).toEqual({ status: 'missing-vector', messages: ['v(none)'] });
  });

  it('gives each of 300 different runs its own result, across replaced workers', async () => {
    const shortLived = createNodeEngine({ runsPerWorker: 120 });
    const wrong: number[] = [];
    await Promise.all(Array.from({ length: 300 }, async (_, run) => {
      const volts = run + 1;
      const result = await shortLived.simulate({ ...good, lines: [`V1 a 0 ${volts}`, ...good.lines.slice(1)] });
      if (result.status !== 'ok' || Math.abs((result.values['v(b)'] ?? 0) - (volts * 2) / 3) > 1e-9 * volts) wrong.push(run);
    }));
    await shortLived.dispose();
    expect(wrong).toEqual([]);
  }, 60_000);

  it('refuses queued runs when it is closed', async () => {
    const closing = createNodeEngine();
    const runs = [closing.simulate(good), closing.simulate(good)];
    await closing.dispose();
    expect((await Promise.all(runs)).map((result) => result.status)).toEqual(['crash', 'crash']);
  });

  it('says when the worker cannot be started', async () => {
    const broken = createNodeEngine({ root: '/nowhere' });
    expect((await broken.simulate(good)).status).toBe('crash');
    expect(broken.state).toBe('failed');
    await broken.dispose();
  });
});

describe('waveforms', () => {
  it('brings a transient with its own time axis', async () => {
    const result = await engine.waveforms({
      lines: ['V1 a 0 PULSE(0 10 0 1n 1n 1 2)', 'R1 a b 1k', 'C1 b 0 1u', '.tran 10u 5m 0 10u'],
      analysis: 'tran', vectors: ['v(b)'], stop: 5e-3,
    });
    if (result.status !== 'ok') throw new Error(JSON.stringify(result));
    const { axis, real } = result.waveforms;
    expect(axis[axis.length - 1]).toBeCloseTo(5e-3, 9);
    expect(real['v(b)']?.[axis.length - 1]).toBeCloseTo(10 * (1 - Math.exp(-5)), 3);
  });

  it('refuses a transient that stopped short', async () => {
    const result = await engine.waveforms({
      lines: ['V1 a 0 5', 'R1 a b 1k', 'C1 b 0 1u', '.tran 10u 1m'], analysis: 'tran', vectors: ['v(b)'], stop: 5e-3,
    });
    expect(result.status).toBe('timestep');
  });

  it('brings real and imaginary parts of an AC run', async () => {
    const result = await engine.waveforms({
      lines: ['V1 a 0 AC 1', 'R1 a b 1k', 'C1 b 0 159.154943n', '.ac lin 1 1k 1k'], analysis: 'ac', vectors: ['v(b)'],
    });
    if (result.status !== 'ok') throw new Error(JSON.stringify(result));
    expect(result.waveforms.real['v(b)']?.[0]).toBeCloseTo(0.5, 6);
    expect(result.waveforms.imaginary['v(b)']?.[0]).toBeCloseTo(-0.5, 6);
  });
});
