import type { SymbolArt } from '../symbol-art';

export const removableLeadSymbol: SymbolArt = {
  id: 'lnk',
  shapes: [
    { shape: 'path', style: 's', d: 'M-30 0H-15M15 0H30' },
    { shape: 'path', style: 's', d: 'M-12 -3.2V-9H12V-3.2' },
    { shape: 'circle', style: 'b', cx: -12, cy: 0, r: 3.2 },
    { shape: 'circle', style: 'b', cx: 12, cy: 0, r: 3.2 },
  ],
  box: [-30, -10, 30, 4],
};
