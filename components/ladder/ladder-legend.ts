/** Something that stands in the ladder's upper row, centred at `x`. */
interface Stand {
  readonly id: string;
  readonly x: number;
  /** Half the width of its mark in pixels. */
  readonly half: number;
  readonly words: string;
  /** Shorter words for when the long ones collide. */
  readonly short?: string;
  /** Side tried first. */
  readonly prefer: 'left' | 'right';
}

export interface PlacedStand {
  readonly id: string;
  /** Centre of the mark: moved aside when another already stands there. */
  readonly x: number;
  readonly words: string | null;
  readonly side: 'left' | 'right';
}

interface Span {
  readonly from: number;
  readonly to: number;
}

/** Width of legend words in px: 11 px condensed capitals with .06 em tracking, measured at 6.1 px a letter. */
export function legendWidth(words: string): number {
  return words.length * 6.1;
}

const gap = 5;

interface Legend {
  readonly stands: readonly PlacedStand[];
  /** The state's words that found room at the row's left, or null. */
  readonly state: string | null;
}

/**
 * Places marks, the state at the left, and the words of marks in one row so that nothing overlaps. A mark that meets an earlier
 * one steps to its left. The state takes the first of its forms that is clear of all marks; words go to the other side, then to
 * their short form, then away.
 */
export function placeLegend(stands: readonly Stand[], row: Span, states: readonly string[] = [], stateLeft = row.from): Legend {
  const spans: Span[] = [];
  const free = (span: Span) => span.from >= row.from && span.to <= row.to && spans.every((other) => span.to <= other.from || span.from >= other.to);

  const marks = stands.map((stand) => {
    const at = (x: number): Span => ({ from: x - stand.half, to: x + stand.half });
    let x = stand.x;
    for (let tries = 0; tries < 4 && spans.some((other) => at(x).to > other.from && at(x).from < other.to); tries += 1) x -= stand.half * 2 + 3;
    spans.push(at(x));
    return { ...stand, x };
  });

  const state = states.find((words) => free({ from: stateLeft, to: stateLeft + legendWidth(words) + gap })) ?? null;
  if (state !== null) spans.push({ from: stateLeft, to: stateLeft + legendWidth(state) + gap });

  const placed = marks.map(({ id, x, half, words, short, prefer }): PlacedStand => {
    const sides = prefer === 'left' ? (['left', 'right'] as const) : (['right', 'left'] as const);
    for (const text of [words, short]) {
      if (text === undefined) continue;
      for (const side of sides) {
        const width = legendWidth(text) + gap;
        const span = side === 'right' ? { from: x + half, to: x + half + width } : { from: x - half - width, to: x - half };
        if (!free(span)) continue;
        spans.push(span);
        return { id, x, words: text, side };
      }
    }
    return { id, x, words: null, side: prefer };
  });
  return { stands: placed, state };
}

interface Foot {
  readonly x: number;
  readonly full: string;
  readonly short: string;
}

/** Width of a foot label in px: 13 px mono, about 7.6 px a character, closed up. */
const footWidth = (words: string) => words.length * 7.3;

/** Labels under the rail: volts and amps where there is room for all, volts alone where not, none where even those would meet. The chosen one always stands. */
export function placeFeet(feet: readonly Foot[], chosen: number): readonly ('full' | 'short' | 'none')[] {
  const fits = (which: 'full' | 'short') => feet.every((foot, index) => {
    const next = feet[index + 1];
    return !next || next.x - foot.x >= (footWidth(foot[which]) + footWidth(next[which])) / 2 + 4;
  });
  if (fits('full')) return feet.map(() => 'full');
  if (fits('short')) return feet.map(() => 'short');
  const kept: number[] = chosen >= 0 ? [chosen] : [];
  feet.forEach((foot, index) => {
    const clear = kept.every((other) => {
      const neighbour = feet[other];
      return neighbour !== undefined && Math.abs(neighbour.x - foot.x) >= (footWidth(foot.short) + footWidth(neighbour.short)) / 2 + 4;
    });
    if (clear) kept.push(index);
  });
  return feet.map((_, index) => (kept.includes(index) ? 'short' : 'none'));
}
