import type { SymbolArt } from '../symbol-art';

export const testPointSymbol: SymbolArt = {
  id: 'tp',
  shapes: [
    { shape: 'path', style: 's', d: 'M0 0V-14' },
    { shape: 'circle', style: 'b', cx: 0, cy: -18, r: 4 },
  ],
  box: [-4, -22, 4, 2],
};
