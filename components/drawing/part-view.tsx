import { boxHalfHeight, boxPinPlaces } from '@/lib/document/geometry/kind-shape';
import { placed } from '@/lib/document/geometry/turn';
import type { PartRecord } from '@/lib/document/records';
import { kindRegistry } from '@/lib/netlist/kinds/kind-registry';
import type { SymbolArt } from '@/lib/netlist/kinds/symbol-art';
import { ownWords } from './part-words';
import { SymbolView } from './symbol-view';

/** A box stands for an element that has no kind of its own: its pins by name. */
function BoxView({ part }: { readonly part: PartRecord }) {
  const names = part.boxPins ?? [];
  const half = boxHalfHeight(names.length);
  return (
    <>
      <path d={`M-30 ${-half}H30V${half}H-30Z`} className="fill-film stroke-ink" strokeWidth="1.5" />
      {boxPinPlaces(names).map((pin) => <path key={pin.name} d={`M${pin.x} ${pin.y}H${pin.x < 0 ? -30 : 30}`} className="stroke-ink" strokeWidth="1.5" />)}
    </>
  );
}

function NoteView({ part }: { readonly part: PartRecord }) {
  const lines = ownWords(part).split('\n').slice(0, 12);
  return <text x={part.x - 30} y={part.y - 4} className="fill-ink-2 font-sans text-xs">{lines.map((line, index) => <tspan key={index} x={part.x - 30} dy={index === 0 ? 0 : 16}>{line}</tspan>)}</text>;
}

/** Words of a net name, upright whatever the turn of its mark. */
function NetNameWords({ part }: { readonly part: PartRecord }) {
  const upright = part.turn === 90 || part.turn === 270;
  const at = placed({ x: 14, y: 0 }, part);
  const leftwards = at.x < part.x;
  return (
    <text x={at.x} y={upright ? at.y + (at.y < part.y ? -2 : 12) : at.y + 4.3} textAnchor={upright ? 'middle' : leftwards ? 'end' : 'start'} className="paint-film fill-ink-2 font-cond text-xs font-semibold tracking-[.06em]">{ownWords(part)}</text>
  );
}

/** Words of a net name on a line: above a level one, to the right of an upright one. */
function ThroughWords({ part }: { readonly part: PartRecord }) {
  const upright = part.turn === 90 || part.turn === 270;
  return <text x={upright ? part.x + 7 : part.x} y={upright ? part.y + 4 : part.y - 6} textAnchor={upright ? 'start' : 'middle'} className="paint-film fill-ink-2 font-cond text-xs font-semibold tracking-[.06em]">{ownWords(part)}</text>;
}

/** The drawing of a kind; a sheet shows all of its resistors as rectangles or all as zigzags. */
export function artOf(kind: PartRecord['kind'], zigzag: boolean): SymbolArt {
  const { symbol, alternatives } = kindRegistry[kind];
  return zigzag && kind === 'resistor' ? alternatives?.[0] ?? symbol : symbol;
}

interface PartViewProps {
  readonly part: PartRecord;
  readonly zigzag?: boolean;
  /** A net name with a wire running through it: words beside the line and no stub. */
  readonly through?: boolean;
}

/** One part where it stands on the sheet, without its words at the side. */
export function PartView({ part, zigzag = false, through = false }: PartViewProps) {
  if (through) return <ThroughWords part={part} />;
  if (part.kind === 'note') return <NoteView part={part} />;
  const pose = `translate(${part.x} ${part.y})${part.turn === 0 ? '' : ` rotate(${part.turn})`}${part.mirror ? ' scale(-1 1)' : ''}`;
  return (
    <>
      <g transform={pose}>{part.kind === 'box' ? <BoxView part={part} /> : <SymbolView art={artOf(part.kind, zigzag)} />}</g>
      {part.kind === 'net-name' ? <NetNameWords part={part} /> : null}
    </>
  );
}
