/** Scale suffixes of SPICE, longest first. `m` is milli also in upper case; mega is `meg`. `mil` is a thousandth of an inch in metres. */
const scales: readonly (readonly [suffix: string, factor: string])[] = [
  ['meg', 'e6'], ['mil', 'e-6'], ['t', 'e12'], ['g', 'e9'], ['k', 'e3'], ['m', 'e-3'], ['u', 'e-6'], ['n', 'e-9'], ['p', 'e-12'], ['f', 'e-15'],
];
const milFactor = 25.4;
const unitWords: ReadonlySet<string> = new Set(['', 'ohm', 'f', 'h', 'v', 'a', 'hz', 's', 'w']);

/**
 * Reads a number of a deck: digits with a point and an exponent, then one of t g meg k mil m u n p f, then at most a unit
 * (ohm, f, h, v, a, hz, s, w). `1M` is a thousandth and `1F` is 1e-15, as every SPICE has it. Undefined for anything
 * else, `4k7` among them.
 */
export function spiceNumber(text: string): number | undefined {
  const head = /^[+-]?(?:[0-9]+\.?[0-9]*|\.[0-9]+)(?:e[+-]?[0-9]{1,4})?/i.exec(text)?.[0];
  if (head === undefined) return undefined;
  const tail = text.slice(head.length).toLowerCase();
  const scaled = scales.find(([suffix]) => tail.startsWith(suffix) && unitWords.has(tail.slice(suffix.length)));
  if (!scaled && !unitWords.has(tail)) return undefined;
  const value = scaled ? scaleBy(head, scaled) : Number(head);
  return Number.isFinite(value) ? value : undefined;
}

function scaleBy(head: string, [suffix, factor]: readonly [string, string]): number {
  const [mantissa, exponent = '0'] = head.toLowerCase().split('e');
  const value = Number(`${mantissa}e${Number(exponent) + Number(factor.slice(1))}`);
  return suffix === 'mil' ? value * milFactor : value;
}

/** Why a text is no number of a deck, with the way to write it where the slip is a known one. */
export function numberRefusal(text: string): string {
  const letterCode = /^([0-9]+)(meg|[kmunprg])([0-9]+)$/i.exec(text);
  if (letterCode) {
    const scale = /^r$/i.test(letterCode[2] as string) ? '' : letterCode[2];
    return `${text} is not a number in a deck; write ${letterCode[1]}.${letterCode[3]}${scale}.`;
  }
  if (/^[0-9]+,[0-9]+/.test(text)) return `${text} has a comma; a deck takes a point: ${text.replace(',', '.')}.`;
  if (/[µμ]/.test(text)) return `${text} is not a number in a deck; write u for micro: ${text.replace(/[µμ]/, 'u')}.`;
  return `${text} is not a number.`;
}

/** Whether a number is written with `M` where a person may have meant mega: it is a thousandth. */
export function readsAsMilli(text: string): boolean {
  return /[0-9.]M(?:ohm)?$/i.test(text) && /[0-9.]M/.test(text);
}
