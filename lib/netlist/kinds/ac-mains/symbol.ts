import type { SymbolArt } from '../symbol-art';

export const acMainsSymbol: SymbolArt = {
  id: 'ac',
  shapes: [
    { shape: 'path', style: 's', d: 'M0 -30V-16M0 16V30' },
    { shape: 'circle', style: 'b', cx: 0, cy: 0, r: 16 },
    { shape: 'path', style: 's', d: 'M-10 0C-7 -9.5 -3 -9.5 0 0S7 9.5 10 0' },
  ],
  box: [-16, -30, 16, 30],
};
