import type { SymbolArt } from '../symbol-art';

export const schottkySymbol: SymbolArt = {
  id: 'ds',
  shapes: [
    { shape: 'path', style: 'b', d: 'M-9 -9V9L9 0Z' },
    { shape: 'path', style: 's', d: 'M-30 0H30' },
    { shape: 'path', style: 'h', d: 'M4 -5V-9H9V9H14V5' },
  ],
  box: [-30, -9, 30, 9],
};
