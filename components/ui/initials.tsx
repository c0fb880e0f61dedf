import { classNames } from './class-names';

/** First letters of the first and last word of a name: 'Ines Okafor' gives 'IO'. */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/u);
  const letters = words.length > 1 ? [words[0], words[words.length - 1]] : [words[0]];
  return letters.map((word) => word?.at(0) ?? '').join('').toUpperCase() || '?';
}

/** A name as the margin prints it: 'T. Hale'. */
export function shortName(name: string): string {
  const words = name.trim().split(/\s+/u);
  const last = words.at(-1);
  return words.length > 1 && last ? `${words[0]?.at(0)}. ${last}` : name;
}

const hues = ['bg-ra text-on-person', 'bg-ink-2 text-film', 'bg-io text-on-person', 'bg-th text-on-person'] as const;

/** Which of the hues a person has: the same everywhere, worked out from the initials, so that a guest sees the same. */
export function hueOf(initials: string): number {
  let sum = 0;
  for (const letter of initials) sum = (sum * 16 + (letter.codePointAt(0) ?? 0)) % 997;
  return sum % hues.length;
}

interface InitialsProps {
  readonly name: string;
  readonly away?: boolean;
  readonly size?: 'small' | 'regular' | 'large';
}

/** A person as a tag: hue and always initials; the name is spoken and in the title. */
export function Initials({ name, away = false, size = 'regular' }: InitialsProps) {
  const initials = name.length <= 3 ? name.toUpperCase() : initialsOf(name);
  return (
    <span
      role="img"
      aria-label={away ? `${name}, away` : name}
      title={name}
      className={classNames(
        'inline-flex flex-none items-center justify-center rounded-box px-1 font-cond text-xs leading-none font-semibold tracking-[.04em]',
        size === 'large' ? 'h-[26px] min-w-[30px]' : size === 'small' ? 'h-[18px] min-w-[26px]' : 'h-5 min-w-[26px]',
        away ? 'text-silk-2 ring-1 ring-edge ring-inset' : hues[hueOf(initials)],
      )}
    >
      {initials}
    </span>
  );
}
