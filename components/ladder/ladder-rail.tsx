import { touchSafeVolts } from './ladder-point';
import type { LadderScale } from './ladder-scale';
import type { LadderSigned } from './ladder-state';

interface LadderRailProps {
  readonly scale: LadderScale;
  readonly signed: LadderSigned;
  /** Ground the rail is drawn on. */
  readonly ground: string;
}

/** Slots above and below, bars, ticks, and the rail that doubles above the touch-safe limit. */
export function LadderRail({ scale, signed, ground }: LadderRailProps) {
  const { x, left, right } = scale;
  const limit = x(touchSafeVolts);
  const width = right - left;
  return (
    <g>
      <rect x={left} y="24.5" width={width} height="10" className="fill-sunk stroke-edge" />
      <rect x={left} y="47.5" width={width} height="6" className="fill-sunk stroke-edge" />
      <path d={`M${left} 41H${Math.min(limit, right + 10)}`} className="stroke-silk" strokeWidth="1.5" />
      {right > limit ? (
        <>
          <path d={`M${limit} 41H${right + 10}`} className="stroke-silk" strokeWidth="5.6" />
          <path d={`M${limit} 41H${right + 10}`} stroke={ground} strokeWidth="2.6" />
        </>
      ) : null}
      {scale.ticks.filter(({ volts }) => x(volts) <= right).map(({ volts, major }) => (
        <path key={volts} d={`M${x(volts)} 36v2M${x(volts)} 44v2.5`} className={major ? 'stroke-silk' : 'stroke-edge'} />
      ))}
      {signed.past ? <rect x={left + 1} y="25.2" width={x(signed.past.to) - left} height="8.6" className="fill-none stroke-signed-ink" strokeWidth="1.4" strokeDasharray="4 3" /> : null}
      {signed.struck !== null && signed.to === null ? (
        <g className="stroke-silk-2">
          <rect x={left + 1} y="25.2" width={x(signed.struck) - left} height="8.6" fill="none" strokeWidth="1.2" />
          <path d={`M${left + 1} 33.8L${x(signed.struck) + 1} 25.2`} />
        </g>
      ) : null}
      {signed.to === null ? null : (
        <g className="fill-signed">
          <rect x={left} y="24" width={x(signed.to) - left} height="11" />
          <rect x={x(signed.to) - 2.5} y="22" width="5" height="32" />
        </g>
      )}
    </g>
  );
}
