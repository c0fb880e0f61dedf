import type { SymbolArt, SymbolClass, SymbolShape } from '@/lib/netlist/kinds/symbol-art';

const strokes: Readonly<Record<SymbolClass, { readonly className: string; readonly width?: number; readonly dash?: string }>> = {
  s: { className: 'fill-none stroke-ink', width: 1.5 },
  b: { className: 'fill-film stroke-ink', width: 1.5 },
  h: { className: 'fill-none stroke-ink', width: 2.2 },
  k: { className: 'fill-ink' },
  d: { className: 'fill-none stroke-ink', width: 1.1, dash: '3 3' },
};

function ShapeView({ shape }: { readonly shape: SymbolShape }) {
  if (shape.shape === 'text') return null;
  const { className, width, dash } = strokes[shape.style];
  const common = { className, strokeWidth: width, strokeDasharray: dash };
  return shape.shape === 'path' ? <path d={shape.d} {...common} /> : <circle cx={shape.cx} cy={shape.cy} r={shape.r} {...common} />;
}

/** A symbol of the plate about its origin. Its words are drawn upright by whoever places it. */
export function SymbolView({ art }: { readonly art: SymbolArt }) {
  return <>{art.shapes.map((shape, index) => <ShapeView key={index} shape={shape} />)}</>;
}
