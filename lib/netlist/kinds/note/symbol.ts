import type { SymbolArt } from '../symbol-art';

export const noteSymbol: SymbolArt = {
  id: 'note',
  shapes: [
    { shape: 'path', style: 'b', d: 'M-30 -16H22L30 -8V16H-30Z' },
    { shape: 'path', style: 's', d: 'M22 -16V-8H30' },
    { shape: 'path', style: 's', d: 'M-22 -5H14M-22 2H20M-22 9H4' },
  ],
  box: [-30, -16, 30, 16],
};
