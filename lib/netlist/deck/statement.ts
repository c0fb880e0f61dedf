import { DeckRefusal } from './deck-refusal';
import { numberRefusal, spiceNumber } from './spice-number';
import type { Token } from './tokens';

/** `key=value` pairs at the end of a statement, as tokens. */
export interface Pair {
  readonly key: string;
  readonly value: Token;
}

/** Words of a statement without its `key=value` pairs, and the pairs with lower-case keys. Parentheses round pairs are dropped. */
export function splitPairs(tokens: readonly Token[], line: number): { readonly words: Token[]; readonly pairs: Pair[] } {
  const words: Token[] = [];
  const pairs: Pair[] = [];
  for (let index = 0; index < tokens.length; index++) {
    const token = tokens[index] as Token;
    if (tokens[index + 1]?.kind === 'equals' && token.kind === 'word') {
      const value = tokens[index + 2];
      if (value?.kind !== 'word' && value?.kind !== 'brace') throw new DeckRefusal(line, `${token.text}= has no value.`);
      pairs.push({ key: token.text.toLowerCase(), value });
      index += 2;
    } else if (token.kind === 'equals') throw new DeckRefusal(line, 'An = has no name before it.');
    else words.push(token);
  }
  return { words, pairs };
}

/** Turns tokens into numbers, `{name}` standing for a `.param` that is a number. */
export class Numbers {
  constructor(private readonly params: ReadonlyMap<string, number>) {}

  /** Undefined when the token is a word that is no number. Throws on a `{…}` that is no known name. */
  tryRead(token: Token, line: number): number | undefined {
    if (token.kind === 'brace') return this.param(token.text, line);
    return token.kind === 'word' ? spiceNumber(token.text) : undefined;
  }

  read(token: Token, line: number): number {
    const value = this.tryRead(token, line);
    if (value === undefined) throw new DeckRefusal(line, numberRefusal(token.text));
    return value;
  }

  private param(name: string, line: number): number {
    const value = this.params.get(name.toLowerCase());
    if (value !== undefined) return value;
    if (/^[A-Za-z_][A-Za-z0-9_]*$/.test(name)) throw new DeckRefusal(line, `{${name}} names no .param of this deck.`);
    throw new DeckRefusal(line, `{${name}} is an expression; only {name} of a .param is read. Put the number in its place.`);
  }
}
