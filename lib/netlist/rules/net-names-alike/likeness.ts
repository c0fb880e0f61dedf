/** Names that different people give one and the same net (`docs/rules.md` 54). */
const aliasSets: readonly (readonly string[])[] = [['0', '0V', 'GND', 'GROUND'], ['5V', '+5V', 'VCC']];

const folded = (name: string): string => name.toUpperCase().replace(/[\s_-]/g, '');

/** Both names stand for the same thing in everyday use: `GND` and `GROUND`. */
export function areAliases(a: string, b: string): boolean {
  return aliasSets.some((set) => set.includes(folded(a)) && set.includes(folded(b)));
}

const isDigit = (text: string): boolean => /^[0-9]$/.test(text);

/** The characters in which two names differ when it is one: changed, left out or added; null when it is none or more. */
function onlyDifference(a: string, b: string): readonly string[] | null {
  const [short, long] = a.length <= b.length ? [a, b] : [b, a];
  if (long.length - short.length > 1) return null;
  let at = 0;
  while (at < short.length && short[at] === long[at]) at += 1;
  const rest = short.length === long.length ? [short.slice(at + 1), long.slice(at + 1)] : [short.slice(at), long.slice(at + 1)];
  if (rest[0] !== rest[1] || (at === short.length && short.length === long.length)) return null;
  return short.length === long.length ? [short[at]!, long[at]!] : [long[at]!];
}

/**
 * Whether two different names look like one name mistyped: at least `least` characters each and one character apart, not
 * only by a digit (`GATE1` and `GATE2` are two nets), or apart only by case, spaces, hyphens or underlines.
 */
export function areMistyped(a: string, b: string, least: number): boolean {
  if (a === b || a.length < least || b.length < least) return false;
  if (folded(a) === folded(b)) return true;
  const difference = onlyDifference(a.toUpperCase(), b.toUpperCase());
  return difference !== null && !difference.every(isDigit);
}
