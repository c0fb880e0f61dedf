import type { Standing } from '@/lib/access/may';
import type { Naming } from './review-view';

/** First letters of the first and the last word: `Ines Okafor` is IO. */
export function initialsOf(name: string): string {
  const words = name.split(/\s+/).filter((word) => word !== '');
  const ends = words.length > 1 ? [words[0], words.at(-1)] : words;
  return ends.map((word) => [...(word ?? '')][0]?.toUpperCase() ?? '').join('');
}

/** How people are named to a reader: a guest sees initials, everybody else names; who has left is a former member. */
export function namingFor(standing: Standing): (names: ReadonlyMap<string, string>) => Naming {
  return (names) => (id) => {
    const name = names.get(id) ?? 'former member';
    return { id, name: standing.role === 'guest' ? initialsOf(name) : name };
  };
}
