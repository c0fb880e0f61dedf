import { classNames } from '@/components/ui/class-names';
import type { Leader } from './leader-route';
import type { EntryKind } from './margin-entry';

export interface DrawnLeader extends Leader {
  readonly key: string;
  readonly kind: EntryKind;
  readonly on: boolean;
}

const strokes: Readonly<Record<EntryKind, string>> = {
  stop: 'stroke-stop', caution: 'stroke-caution-ink', advice: 'stroke-ink-2', undetermined: 'stroke-act', note: 'stroke-act',
};
const fills: Readonly<Record<EntryKind, string>> = {
  stop: 'fill-stop', caution: 'fill-film stroke-caution-ink', advice: 'fill-film stroke-ink-2', undetermined: 'fill-film stroke-act', note: 'fill-act',
};

/** Stop: filled arrow; caution: open arrow; advice and undetermined: ring; note: dot. */
function LeaderEnd({ leader }: { readonly leader: DrawnLeader }) {
  const { bend, end, kind } = leader;
  if (kind === 'note') return <circle cx={end.x} cy={end.y} r="3" className={fills.note} />;
  if (kind === 'advice' || kind === 'undetermined') return <circle cx={end.x} cy={end.y} r="3.2" strokeWidth="1.2" className={fills[kind]} />;
  const angle = (Math.atan2(bend.y - end.y, bend.x - end.x) * 180) / Math.PI;
  return <path d="M0 0L8.4 -3.3V3.3Z" transform={`translate(${end.x} ${end.y}) rotate(${angle})`} strokeWidth={kind === 'caution' ? 1.2 : 0} strokeLinejoin="round" className={fills[kind]} />;
}

/** Lines from entries to what they concern. Decoration: the relation is also in each entry's words. */
export function LeaderLines({ leaders, width, height }: { readonly leaders: readonly DrawnLeader[]; readonly width: number; readonly height: number }) {
  return (
    <svg aria-hidden="true" width={width} height={height} className="pointer-events-none absolute top-0 left-0 z-[4] overflow-hidden max-wide:hidden print:hidden">
      {leaders.map((leader) => (
        <g key={leader.key} className="fill-none">
          <path d={`M${leader.from.x} ${leader.from.y}H${leader.bend.x}L${leader.end.x} ${leader.end.y}`} className={classNames(strokes[leader.kind], 'fill-none')} strokeWidth={leader.on ? 1.6 : 0.9} />
          <LeaderEnd leader={leader} />
        </g>
      ))}
    </svg>
  );
}
