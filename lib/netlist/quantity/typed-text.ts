/** Longest quantity text that is looked at. */
export const maxQuantityLength = 60;

/**
 * A typed text in one spelling: compatibility forms folded (full-width digits, the ohm sign, the micro sign), every kind of space a plain one,
 * a minus sign a hyphen, outer space gone.
 */
export function foldTyped(text: string): string {
  return text.normalize('NFKC').replaceAll('−', '-').replaceAll('–', '-').replace(/\s/gu, ' ').trim();
}

/** The number at the head of a typed quantity. */
export type TypedNumber =
  /** `digits` reads as a JavaScript number, `rest` is what follows it without leading space. */
  | { readonly kind: 'number'; readonly digits: string; readonly rest: string }
  | { readonly kind: 'none' }
  | { readonly kind: 'unclear'; readonly why: string };

/** Reads sign, digits, one decimal mark (point or comma) and an exponent. `text` is folded. */
export function headNumber(text: string): TypedNumber {
  const sign = /^[+-] ?/.exec(text)?.[0] ?? '';
  const body = text.slice(sign.length);
  const run = /^[0-9.,]*(?: [0-9][0-9.,]*)*/.exec(body)?.[0] ?? '';
  if (!/[0-9]/.test(run)) return { kind: 'none' };
  const plain = withoutGroups(run);
  if (typeof plain !== 'string') return plain;
  const after = body.slice(run.length);
  const exponent = /^[eE][+-]?[0-9]{1,3}(?![0-9])/.exec(after)?.[0] ?? '';
  return {
    kind: 'number',
    digits: `${sign.trim() === '-' ? '-' : ''}${plain}${exponent}`,
    rest: after.slice(exponent.length).trimStart(),
  };
}

/** Digits with a point as decimal mark, or why they are unclear. A mark at either end is filled up with 0 by `Number`. */
function withoutGroups(run: string): string | Extract<TypedNumber, { kind: 'unclear' }> {
  const marks = [...run].filter((character) => character === '.' || character === ',');
  if (marks.length > 1) return unclear(`${run} has more than one decimal mark; write it without marks between thousands`);
  if (run.includes(' ')) {
    if (!/^[0-9]{1,3}(?: [0-9]{3})+(?:[.,][0-9]*)?$/.test(run)) return unclear(`${run} reads as two numbers; write it without a space between digits`);
    return run.replaceAll(' ', '').replace(',', '.');
  }
  if (/^[1-9][0-9]{0,2},[0-9]{3}$/.test(run)) {
    const [whole, part] = run.split(',');
    return unclear(`${run} is unclear: it is ${whole}${part} to some and ${whole}.${part} to others. Write ${whole}${part} or ${whole}.${part}`);
  }
  return run.replace(',', '.');
}

function unclear(why: string): Extract<TypedNumber, { kind: 'unclear' }> {
  return { kind: 'unclear', why };
}
