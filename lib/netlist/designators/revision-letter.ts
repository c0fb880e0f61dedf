/** Drawing revision letters of ASME Y14.35: the alphabet without I, O, Q, S, X and Z. */
const letters = 'ABCDEFGHJKLMNPRTUVWY';

/** The letter after `letter`; the first one for null. After Y comes AA, after AY comes BA. Throws on what is no revision letter. */
export function nextRevisionLetter(letter: string | null): string {
  return letter === null ? 'A' : revisionLetter(revisionNumber(letter) + 1);
}

/** Revision letter by number, from 1: 1 is A, 20 is Y, 21 is AA. */
export function revisionLetter(number: number): string {
  if (!Number.isInteger(number) || number < 1) throw new RangeError(`No revision ${number}`);
  const rest = number - 1;
  const last = letters.charAt(rest % letters.length);
  return rest < letters.length ? last : revisionLetter(Math.floor(rest / letters.length)) + last;
}

/** Number of a revision letter, from 1. Throws on what is no revision letter. */
export function revisionNumber(letter: string): number {
  const digits = [...letter].map((character) => letters.indexOf(character) + 1);
  if (digits.length === 0 || digits.includes(0)) throw new RangeError(`${letter} is no revision letter`);
  return digits.reduce((number, digit) => number * letters.length + digit, 0);
}
