import type { SymbolArt } from '../symbol-art';

export const capacitorSymbol: SymbolArt = {
  id: 'c',
  shapes: [
    { shape: 'path', style: 's', d: 'M-30 0H-3.5M3.5 0H30' },
    { shape: 'path', style: 'h', d: 'M-3.5 -13V13M3.5 -13V13' },
  ],
  box: [-30, -13, 30, 13],
};
