import type { Box } from '@/lib/document/geometry/point';

const [width, height] = [860, 610];
const step = 50;

/** The sheet's frame in sheet units: the plain size, grown by whole squares until everything drawn is inside. Zones divide it. */
export function frameBoxOf(drawn: Box | null): Box {
  if (!drawn) return { left: 0, top: 0, right: width, bottom: height };
  const down = (value: number) => Math.floor((value - 20) / step) * step;
  const up = (value: number) => Math.ceil((value + 20) / step) * step;
  const [left, top] = [Math.min(0, down(drawn.left)), Math.min(0, down(drawn.top))];
  return { left, top, right: Math.max(left + width, up(drawn.right)), bottom: Math.max(top + height, up(drawn.bottom)) };
}
