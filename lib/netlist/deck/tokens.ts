import { DeckRefusal } from './deck-refusal';

export interface Token {
  readonly text: string;
  /** `brace` is the name between { and }. */
  readonly kind: 'word' | 'open' | 'close' | 'equals' | 'brace';
}

/**
 * Words of a statement. Parentheses and = stand alone, commas separate inside parentheses only (elsewhere `1,5k` must be
 * refused, not read as two numbers), `{name}` is one token.
 */
export function tokensOf(text: string, line: number): Token[] {
  const tokens: Token[] = [];
  let word = '';
  let depth = 0;
  const endWord = () => {
    if (word !== '') tokens.push({ text: word, kind: 'word' });
    word = '';
  };
  for (let index = 0; index < text.length; index++) {
    const character = text[index] as string;
    if (character === '{') {
      endWord();
      const end = text.indexOf('}', index);
      if (end < 0) throw new DeckRefusal(line, 'A { has no }.');
      tokens.push({ text: text.slice(index + 1, end).trim(), kind: 'brace' });
      index = end;
    } else if (character === '(' || character === ')') {
      endWord();
      depth += character === '(' ? 1 : -1;
      if (depth < 0 || depth > 1) throw new DeckRefusal(line, 'The parentheses do not pair.');
      tokens.push({ text: character, kind: character === '(' ? 'open' : 'close' });
    } else if (character === '=') {
      endWord();
      tokens.push({ text: character, kind: 'equals' });
    } else if (/\s/.test(character) || (character === ',' && depth > 0)) endWord();
    else word += character;
  }
  endWord();
  if (depth !== 0) throw new DeckRefusal(line, 'The parentheses do not pair.');
  return tokens;
}
