/** Letters and number of a designator of the usual form: `Q12` is Q and 12. */
export function splitDesignator(ref: string): { readonly letters: string; readonly number: number } | undefined {
  const match = /^([A-Za-z]{1,4})([0-9]{1,9})$/.exec(ref);
  return match ? { letters: match[1] as string, number: Number(match[2]) } : undefined;
}

/** Runs of digits and of anything else, in order. */
function runs(text: string): string[] {
  return text.match(/[0-9]+|[^0-9]+/g) ?? [];
}

/**
 * Natural order: R2 before R10, letters by code point, case only as the last difference. A total order on texts, the
 * same on every machine.
 */
export function compareDesignators(a: string, b: string): number {
  const [left, right] = [runs(a), runs(b)];
  for (let index = 0; index < Math.min(left.length, right.length); index++) {
    const order = compareRuns(left[index] as string, right[index] as string);
    if (order !== 0) return order;
  }
  return left.length - right.length || byCodeUnit(a, b);
}

function compareRuns(a: string, b: string): number {
  const digits = /^[0-9]/;
  if (digits.test(a) && digits.test(b)) return Number(a) - Number(b) || a.length - b.length;
  return byCodeUnit(a.toUpperCase(), b.toUpperCase());
}

export function byCodeUnit(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}

/** The lowest free designator of a class letter: Q1, Q2 … `taken` is compared without regard to case. */
export function nextDesignator(letters: string, taken: Iterable<string>): string {
  const used = new Set([...taken].map((ref) => ref.toUpperCase()));
  for (let number = 1; ; number++) {
    const ref = `${letters}${number}`;
    if (!used.has(ref.toUpperCase())) return ref;
  }
}
