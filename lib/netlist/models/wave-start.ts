import type { Wave } from '../netlist';

/** Where a time-dependent source stands at t = 0, as ngspice takes it for an operating point without a DC value. */
export function waveStart(wave: Wave): number {
  const [first = 0, second = 0] = wave.args;
  switch (wave.shape) {
    case 'sin':
      return first + second * Math.sin(((wave.args[5] ?? 0) * Math.PI) / 180);
    case 'pulse':
    case 'exp':
      return first;
    case 'pwl':
      return second;
  }
}
