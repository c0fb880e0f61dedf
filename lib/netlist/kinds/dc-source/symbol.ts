import type { SymbolArt } from '../symbol-art';

export const dcSourceSymbol: SymbolArt = {
  id: 'vdc',
  shapes: [
    { shape: 'circle', style: 'b', cx: 0, cy: 0, r: 16 },
    { shape: 'path', style: 's', d: 'M0 -30V30' },
    { shape: 'path', style: 's', d: 'M7 -22h6M10 -25v6' },
    { shape: 'path', style: 's', d: 'M7 22h6' },
  ],
  box: [-16, -30, 16, 30],
};
