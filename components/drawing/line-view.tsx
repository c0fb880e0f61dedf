import { HatchMark } from '@/components/ladder/hatch-mark';
import { voltsWords } from '@/components/ladder/plan-words';
import type { Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet } from '@/lib/document/records';
import { isHot, netOfLines } from './hot-wires';
import { meetingPlaces } from './meeting-places';

const pathOf = (points: readonly Point[]) => points.map((point, index) => `${index === 0 ? 'M' : 'L'}${point.x} ${point.y}`).join('');

interface Longest {
  readonly length: number;
  readonly a: Point;
  readonly b: Point;
}

/** The longest level or upright run of each hazardous net, where its tag stands. */
function tags(lines: readonly { readonly net: string | undefined; readonly path: readonly Point[] }[]): ReadonlyMap<string, Longest> {
  const best = new Map<string, Longest>();
  for (const { net, path } of lines) {
    if (net === undefined) continue;
    path.slice(1).forEach((b, index) => {
      const a = path[index];
      if (!a) return;
      const length = Math.abs(a.x - b.x) + Math.abs(a.y - b.y);
      if (length > (best.get(net)?.length ?? 0)) best.set(net, { length, a, b });
    });
  }
  return best;
}

interface LineViewProps {
  readonly sheet: Sheet;
  /** Volts of each net at the hold point shown. */
  readonly volts: Readonly<Record<string, number>>;
}

/** Wires and junctions. A net above the touch-safe limit is a double rail with a hatch tag that carries its voltage. */
export function LineView({ sheet, volts }: LineViewProps) {
  const index = indexOf(sheet);
  const nets = netOfLines(sheet);
  const lines = sheet.wires.map((wire) => ({ id: wire.id, net: nets.get(wire.id), path: wirePath(index, wire) }));
  const hot = lines.filter((line) => line.net !== undefined && isHot(volts[line.net]));
  const safe = lines.filter((line) => !hot.includes(line));
  const dots = [...meetingPlaces(sheet)].map((place) => place.split(',').map(Number) as [number, number]);
  return (
    <>
      <path d={safe.map((line) => pathOf(line.path)).join('')} className="fill-none stroke-ink" strokeWidth="1.5" strokeLinecap="square" />
      <path d={hot.map((line) => pathOf(line.path)).join('')} className="fill-none stroke-ink" strokeWidth="5.6" />
      <path d={hot.map((line) => pathOf(line.path)).join('')} className="fill-none stroke-film" strokeWidth="2.6" />
      {dots.map(([x, y]) => <circle key={`${x} ${y}`} cx={x} cy={y} r="3" className="fill-ink" />)}
      {[...tags(hot)].map(([net, { a, b, length }]) => {
        if (length < 40) return null;
        const level = a.y === b.y;
        const x = (a.x + b.x) / 2;
        const y = (a.y + b.y) / 2;
        return (
          <g key={net} transform={level ? undefined : `rotate(90 ${x} ${y})`}>
            <HatchMark x={x} y={y} className="fill-film stroke-ink" hatchClassName="fill-ink" />
            <text x={x} y={y} dy={level ? -9 : undefined} textAnchor={level ? 'middle' : 'start'} transform={level ? undefined : `rotate(-90 ${x} ${y}) translate(9 4)`} className="paint-film fill-ink font-mono text-xs font-bold tracking-[-.02em]">{voltsWords(Math.abs(volts[net] ?? 0) >= 10 ? Math.round(volts[net] ?? 0) : volts[net] ?? 0)}</text>
          </g>
        );
      })}
    </>
  );
}
