/** ngspice reads long lines badly: a `.save` line holds this many vectors. */
const savedPerLine = 20;

/** `.save` lines for vectors in their raw-file names: what comes back as `i(@r1[i])` is asked for as `@r1[i]`. */
export function saveLines(vectors: readonly string[]): readonly string[] {
  const saved = vectors.map((vector) => vector.replace(/^i\((@.*)\)$/, '$1'));
  return Array.from({ length: Math.ceil(saved.length / savedPerLine) }, (_, line) =>
    `.save ${saved.slice(line * savedPerLine, (line + 1) * savedPerLine).join(' ')}`);
}
