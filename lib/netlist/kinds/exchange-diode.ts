import { modelLine } from '../deck/deck-number';
import type { NetlistPart } from '../netlist';
import { instanceParameters, nodesOf, numberOf } from './element-line';
import type { KindDeck } from './kind';

/** kT/q at 25 °C, volts (`docs/engine.md` 3). */
const thermalVolts = 0.025693;

interface DiodeDefaults {
  readonly volts: number;
  /** Amps at which `volts` holds. */
  readonly amps: number;
  /** Emission coefficient. */
  readonly n: number;
  /** Ohms. */
  readonly rs: number;
}

/** One-point diode fit of `docs/engine.md` 3.2: IS from a forward point, N and RS by type. */
function saturationAmps({ volts, amps, n, rs }: DiodeDefaults): number {
  return amps / (Math.exp((volts - amps * rs) / (n * thermalVolts)) - 1);
}

/** Deck half of a junction part: `D1 a k D1_KIND` with a card made from its ratings, or the part's own card. */
export function diodeDeck(suffix: string, defaultsOf: (part: NetlistPart) => DiodeDefaults, isDefault = false): KindDeck {
  return {
    letterOf: () => 'D',
    pinOrder: ['A', 'K'],
    ...(isDefault ? { read: (element) => element.letter === 'D' } : {}),
    write(part, name, node) {
      const card = part.model ?? `${name}_${suffix}`;
      const element = `${name} ${nodesOf(part, ['A', 'K'], node)} ${card}${instanceParameters(part)}`;
      if (part.model !== undefined) return [element];
      const defaults = defaultsOf(part);
      const point = { ...defaults, volts: numberOf(part, 'vf') ?? defaults.volts, amps: numberOf(part, 'i_test') ?? defaults.amps };
      const breakdown = numberOf(part, 'vz') ?? numberOf(part, 'vr_max');
      const ibv = breakdown === undefined ? undefined : numberOf(part, 'vz') === undefined ? 1e-6 : 5e-3;
      return [element, modelLine(card, 'd', {
        is: Number(saturationAmps(point).toPrecision(6)), n: point.n, rs: point.rs, bv: breakdown, ibv,
      })];
    },
  };
}
