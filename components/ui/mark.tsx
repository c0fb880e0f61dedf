export type MarkKind = 'stop' | 'caution' | 'advice' | 'note' | 'undetermined' | 'cleared';

const octagon = 'M-4.6 -11H4.6L11 -4.6V4.6L4.6 11H-4.6L-11 4.6V-4.6Z';

const shapes: Readonly<Record<MarkKind, { readonly d: string; readonly shape: string; readonly text: string; readonly y: number }>> = {
  stop: { d: octagon, shape: 'fill-stop', text: 'fill-on-stop', y: 4.6 },
  caution: { d: 'M0 -12.2L12.6 10.2H-12.6Z', shape: 'fill-caution stroke-caution-ink', text: 'fill-on-caution', y: 7.8 },
  advice: { d: 'M-10.6 0a10.6 10.6 0 1 0 21.2 0a10.6 10.6 0 1 0 -21.2 0', shape: 'fill-film stroke-ink', text: 'fill-ink', y: 4.6 },
  note: { d: 'M-11 -10H11V7H-3L-8 12V7H-11Z', shape: 'fill-act-wash stroke-act', text: 'fill-act', y: 2.8 },
  undetermined: { d: 'M0 -12L12 0L0 12L-12 0Z', shape: 'fill-act-wash stroke-act', text: 'fill-act', y: 4.6 },
  cleared: { d: octagon, shape: 'fill-film stroke-signed', text: 'fill-signed-ink', y: 4.6 },
};

const names: Readonly<Record<MarkKind, string>> = {
  stop: 'Stop', caution: 'Caution', advice: 'Advice', note: 'Note', undetermined: 'Undetermined', cleared: 'Cleared',
};

interface MarkProps {
  readonly kind: MarkKind;
  /** The entry's number, or the writer's initials. */
  readonly label?: string | number;
  readonly size?: number;
  /** Beside a word that says the same: then the mark is not spoken. */
  readonly silent?: boolean;
}

/** Severity by shape first: octagon, triangle, circle. Colour never stands alone. */
export function Mark({ kind, label, size = 24, silent = false }: MarkProps) {
  const { d, shape, text, y } = shapes[kind];
  const spoken = silent ? { 'aria-hidden': true } as const : { role: 'img', 'aria-label': label === undefined ? names[kind] : `${names[kind]} ${label}` } as const;
  return (
    <svg width={size} height={size} viewBox="-13 -13 26 26" className="flex-none overflow-visible" {...spoken}>
      <path d={d} className={shape} strokeWidth="1.5" strokeLinejoin="round" />
      {label === undefined ? null : (
        <text y={y} textAnchor="middle" className={`${text} font-cond font-bold ${kind === 'note' ? 'text-xs' : 'text-sm'}`}>{label}</text>
      )}
    </svg>
  );
}
