import type { SymbolArt } from '../symbol-art';

export const fuseSymbol: SymbolArt = {
  id: 'f',
  shapes: [
    { shape: 'path', style: 'b', d: 'M-18 -6.5H18V6.5H-18Z' },
    { shape: 'path', style: 's', d: 'M-30 0H30' },
  ],
  box: [-30, -7, 30, 7],
};
