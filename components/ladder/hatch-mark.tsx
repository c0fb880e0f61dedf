/** The hatch tag as part of a drawing, centred at (x, y). Hatch means hazardous voltage and nothing else. */
export function HatchMark({ x, y, scale = 1, className = 'fill-panel stroke-silk', hatchClassName = 'fill-silk' }: {
  readonly x: number;
  readonly y: number;
  readonly scale?: number;
  readonly className?: string;
  readonly hatchClassName?: string;
}) {
  return (
    <g transform={`translate(${x} ${y}) scale(${scale})`}>
      <rect x="-13" y="-5" width="26" height="10" className={className} />
      {[-13, -6.5, 0, 6.5].map((from) => <path key={from} d={`M${from} 5l5 -10h3.2l-5 10Z`} className={hatchClassName} />)}
    </g>
  );
}
