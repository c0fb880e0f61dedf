import type { SymbolArt } from '../symbol-art';

export const airCoreCoilSymbol: SymbolArt = {
  id: 'la',
  shapes: [
    { shape: 'path', style: 's', d: 'M-30 0H-27a5.4 6.5 0 0 1 10.8 0a5.4 6.5 0 0 1 10.8 0a5.4 6.5 0 0 1 10.8 0a5.4 6.5 0 0 1 10.8 0a5.4 6.5 0 0 1 10.8 0H30' },
  ],
  box: [-30, -7, 30, 3],
};
