import { HatchMark } from './hatch-mark';
import { placeFeet, placeLegend } from './ladder-legend';
import { touchSafeVolts, type LadderPoint } from './ladder-point';
import { LadderRail } from './ladder-rail';
import type { LadderScale } from './ladder-scale';
import type { LadderFlag, LadderSigned } from './ladder-state';
import { ampsWords, voltsWords } from './plan-words';

interface LadderDrawingProps {
  readonly points: readonly LadderPoint[];
  readonly shown: string | null;
  readonly signed: LadderSigned;
  readonly flags: readonly LadderFlag[];
  readonly scale: LadderScale;
  readonly width: number;
  readonly narrow: boolean;
}

const octagon = 'M-4.6 -11H4.6L11 -4.6V4.6L4.6 11H-4.6L-11 4.6V-4.6Z';
const legend = 'font-cond text-legend font-semibold tracking-[.06em]';

/** The ladder's picture: everything it says also stands in its text alternative. */
export function LadderDrawing({ points, shown, signed, flags, scale, width, narrow }: LadderDrawingProps) {
  const { x } = scale;
  const byName = new Map(points.map((point) => [point.name, point]));
  const shownPoint = shown === null ? undefined : byName.get(shown);
  const statusLeft = narrow ? 14 : 8;
  const { stands, state } = placeLegend([
    ...(shownPoint ? [{ id: 'shown', x: x(shownPoint.peak), half: 10, words: `SHOWN AT ${voltsWords(shownPoint.volts)}`, short: voltsWords(shownPoint.volts), prefer: x(shownPoint.peak) > width * 0.6 ? 'left' as const : 'right' as const }] : []),
    ...flags.flatMap((flag) => {
      const point = byName.get(flag.holdPoint);
      const numbers = flag.numbers.join(', ');
      return point ? [{ id: flag.holdPoint, x: x(point.peak), half: 9, words: `${flag.numbers.length > 1 ? 'STOPS' : 'STOP'} ${numbers}`, short: numbers, prefer: 'right' as const }] : [];
    }),
    { id: 'limit', x: x(touchSafeVolts) - (narrow ? 0 : 30), half: 13, words: '60 V LIMIT', prefer: 'right' as const },
  ], { from: 0, to: width }, narrow ? [signed.short] : [signed.words.toUpperCase(), signed.short], statusLeft);
  const stand = (id: string) => stands.find((placed) => placed.id === id);
  const words = (id: string, half: number, className: string) => {
    const placed = stand(id);
    if (!placed?.words) return null;
    const right = placed.side === 'right';
    return <text x={placed.x + (right ? half + 4 : -half - 4)} y="15" textAnchor={right ? 'start' : 'end'} className={`${legend} ${className}`}>{placed.words}</text>;
  };
  const feet = placeFeet(points.map((point) => ({ x: x(point.peak), full: narrow ? voltsWords(point.volts) : `${voltsWords(point.volts)}  ${ampsWords(point.amps)}`, short: voltsWords(point.volts) })), points.findIndex((point) => point.name === shown));

  return (
    <g aria-hidden="true">
      <LadderRail scale={scale} signed={signed} ground="var(--panel)" />
      <path d={`M${x(touchSafeVolts)} 19V58`} className="stroke-silk-2" strokeDasharray="2 2" />
      <HatchMark x={stand('limit')?.x ?? 0} y={11} scale={0.9} />
      {words('limit', 13, 'fill-silk-2')}
      {flags.map((flag) => {
        const point = byName.get(flag.holdPoint);
        const placed = stand(flag.holdPoint);
        return point && placed ? (
          <g key={flag.holdPoint}>
            <path d={`M${x(point.peak)} 20V58`} className="stroke-stop" strokeWidth="1.2" strokeDasharray="3 3" />
            <path d={octagon} transform={`translate(${placed.x} 11) scale(.74)`} className="fill-panel stroke-stop-ink" strokeWidth="2.4" />
            {words(flag.holdPoint, 9, 'fill-stop-ink')}
          </g>
        ) : null;
      })}
      {points.map((point, index) => {
        const passed = signed.to !== null && point.peak <= signed.to * 1.000001;
        return (
          <g key={point.name}>
            <rect x={x(point.peak) - 22} y="18" width="44" height="60" fill="transparent" className="cursor-pointer" />
            <circle cx={x(point.peak)} cy="41" r="5.6" className={passed ? 'fill-signed stroke-signed' : 'fill-panel stroke-silk'} strokeWidth="1.5" />
            {feet[index] === 'none' ? null : (
              <text x={x(point.peak)} y="71" textAnchor="middle">
                <tspan className="fill-silk font-mono text-sm font-bold tracking-[-.02em]">{voltsWords(point.volts)}</tspan>
                {feet[index] === 'full' && !narrow ? <tspan dx="3" className="fill-silk-2 font-mono text-legend tracking-[-.02em]">/ {ampsWords(point.amps)}</tspan> : null}
              </text>
            )}
          </g>
        );
      })}
      <text x={statusLeft} y="15" className={`${legend} ${signed.to === null ? 'fill-silk-2' : 'fill-signed-ink'}`}>{state}</text>
      {narrow ? null : (
        <>
          <text x="82" y="33" textAnchor="end" className={`${legend} fill-silk`}>SIGNED OFF</text>
          <text x="82" y="54.5" textAnchor="end" className={`${legend} fill-silk`}>BROUGHT UP</text>
        </>
      )}
      {shownPoint ? (
        <g className="ladder-handle cursor-grab">
          <path d={`M${x(shownPoint.peak) - 9} 3h18v12l-9 10l-9 -10Z`} className="fill-act" />
          <path d={`M${x(shownPoint.peak)} 22V35`} className="stroke-act" strokeWidth="1.5" />
          {words('shown', 9, 'fill-act')}
        </g>
      ) : null}
    </g>
  );
}
