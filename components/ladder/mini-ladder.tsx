import { touchSafeVolts } from './ladder-point';
import type { LadderScale } from './ladder-scale';

interface MiniLadderProps {
  readonly scale: LadderScale;
  readonly width: number;
  readonly points: readonly number[];
  readonly signedTo: number | null;
  readonly pastTo: number | null;
  readonly blockedAt: number | null;
  readonly words: string;
}

/** A ladder in a table row: the same scale for all rows, so that rows compare. */
export function MiniLadder({ scale, width, points, signedTo, pastTo, blockedAt, words }: MiniLadderProps) {
  const { x, left } = scale;
  const top = points.at(-1);
  const limit = x(touchSafeVolts);
  const end = top === undefined ? left : x(top);
  return (
    <svg width={width} height="36" viewBox={`0 0 ${width} 36`} role="img" aria-label={words} className="block overflow-visible">
      <path d={`M${limit} 0V36`} className="stroke-silk-2" strokeDasharray="1 2" />
      {top === undefined ? null : (
        <>
          <rect x={left} y="3.5" width={end - left} height="9" className="fill-film-2 stroke-edge" />
          <rect x={left} y="25.5" width={end - left} height="5" className="fill-film-2 stroke-edge" />
          <path d={`M${left} 19H${Math.min(limit, end + 5)}`} className="stroke-silk" strokeWidth="1.5" />
          {end > limit ? (
            <>
              <path d={`M${limit} 19H${end + 5}`} className="stroke-silk" strokeWidth="4.6" />
              <path d={`M${limit} 19H${end + 5}`} stroke="var(--film)" strokeWidth="2" />
            </>
          ) : null}
          {pastTo === null ? null : <rect x={left + 1} y="4.2" width={x(pastTo) - left} height="7.6" className="fill-none stroke-signed-ink" strokeWidth="1.3" strokeDasharray="4 3" />}
          {signedTo === null ? null : <path d={`M${left} 3h${x(signedTo) - left}v10h${left - x(signedTo)}ZM${x(signedTo) - 2} 2h4v29h-4Z`} className="fill-signed" />}
          {points.map((volts) => (
            <circle key={volts} cx={x(volts)} cy="19" r="3.8" className={signedTo !== null && volts <= signedTo ? 'fill-signed stroke-signed' : 'fill-film stroke-silk'} strokeWidth="1.4" />
          ))}
          {blockedAt === null ? null : <path d="M-4.6 -11H4.6L11 -4.6V4.6L4.6 11H-4.6L-11 4.6V-4.6Z" transform={`translate(${x(blockedAt)} 19) scale(.82)`} className="fill-stop" />}
        </>
      )}
    </svg>
  );
}
