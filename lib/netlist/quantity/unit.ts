/** What a unit measures and how people write it. */
export interface UnitDefinition {
  readonly symbol: string;
  /** 'a voltage': what a quantity with this unit is. */
  readonly noun: string;
  /** 'volts': what a field of this unit wants. */
  readonly plural: string;
  /** Ways of typing the unit, beside its symbol; compared exactly, then without regard to case. */
  readonly spellings: readonly string[];
  /** Whether SI prefixes go with it. */
  readonly prefixed: boolean;
  /** Letters that may stand in place of the decimal mark (IEC 60062 for ohms and farads; 3V3 in everyday use). */
  readonly mark: readonly string[];
  /** Two ways to type a value, for refusals. */
  readonly examples: string;
}

function unit(
  symbol: string, noun: string, plural: string, spellings: readonly string[], examples: string,
  options: { prefixed?: boolean; mark?: readonly string[] } = {},
): UnitDefinition {
  return { symbol, noun, plural, spellings, prefixed: options.prefixed ?? true, mark: options.mark ?? [], examples };
}

/** Every unit of the fact registry, by its printed symbol. */
export const units: Readonly<Record<string, UnitDefinition>> = {
  'Ω': unit('Ω', 'a resistance', 'ohms', ['R', 'ohm', 'ohms'], '4k7, 4.7 kΩ or 4700', { mark: ['R'] }),
  F: unit('F', 'a capacitance', 'farads', ['farad', 'farads'], '100n, 100 nF or 0.1 µF', { mark: ['F'] }),
  H: unit('H', 'an inductance', 'henries', ['henry', 'henries'], '10u or 10 µH', { mark: ['H'] }),
  V: unit('V', 'a voltage', 'volts', ['volt', 'volts'], '12, 12 V or 3V3', { mark: ['V'] }),
  A: unit('A', 'a current', 'amps', ['amp', 'amps', 'ampere', 'amperes'], '20m, 20 mA or 0.02', { mark: ['A'] }),
  W: unit('W', 'a power', 'watts', ['watt', 'watts'], '0.25, 0.25 W or 250 mW', { mark: ['W'] }),
  Hz: unit('Hz', 'a frequency', 'hertz', ['hertz'], '25k or 25 kHz'),
  s: unit('s', 'a time', 'seconds', ['sec', 'second', 'seconds'], '200n or 200 ns'),
  C: unit('C', 'a charge', 'coulombs', ['coulomb', 'coulombs'], '71n or 71 nC'),
  J: unit('J', 'an energy', 'joules', ['joule', 'joules'], '81m or 81 mJ'),
  S: unit('S', 'a conductance', 'siemens', ['siemens'], '21 or 21 S'),
  'K/W': unit('K/W', 'a thermal resistance', 'kelvins per watt', ['°C/W', 'C/W', 'degC/W'], '62 or 62 K/W', { prefixed: false }),
  '°C': unit('°C', 'a temperature', 'degrees Celsius', ['C', 'degC', 'deg'], '150 or 150 °C', { prefixed: false }),
  '%': unit('%', 'a percentage', 'per cent', ['percent'], '5 or 5 %', { prefixed: false }),
  '': unit('', 'a plain number', 'a plain number', [], '100', { prefixed: true }),
};

export function unitOf(symbol: string): UnitDefinition {
  const found = units[symbol];
  if (!found) throw new RangeError(`No unit ${symbol}`);
  return found;
}

/** Letters that mean something else in the other case (seconds and siemens, femto and farads, kelvin and kilo). */
const caseMatters = new Set(['s', 'S', 'f', 'F', 'c', 'C', 'j', 'J']);

/** Whether `text` spells this unit. After a prefix the case of a letter is free: `10nf` can only be farads. */
export function spells(definition: UnitDefinition, text: string, afterPrefix = false): boolean {
  const spellings = [definition.symbol, ...definition.spellings];
  if (spellings.includes(text)) return true;
  if (!afterPrefix && caseMatters.has(text)) return false;
  const lower = text.toLowerCase();
  return spellings.some((spelling) => spelling.toLowerCase() === lower);
}
