/** Words for the mono, whose own plain space is the narrow one: a thin space of another font would all but vanish there. */
export function monoWords(words: string): string {
  return words.replaceAll('\u2009', ' ');
}
