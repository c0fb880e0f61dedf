import type { SymbolArt } from '../symbol-art';

export const diodeSymbol: SymbolArt = {
  id: 'd',
  shapes: [
    { shape: 'path', style: 'b', d: 'M-9 -9V9L9 0Z' },
    { shape: 'path', style: 's', d: 'M-30 0H30' },
    { shape: 'path', style: 'h', d: 'M9 -9V9' },
  ],
  box: [-30, -9, 30, 9],
};
