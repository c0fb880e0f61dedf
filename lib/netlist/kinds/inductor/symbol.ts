import type { SymbolArt } from '../symbol-art';

export const inductorSymbol: SymbolArt = {
  id: 'l',
  shapes: [
    { shape: 'path', style: 's', d: 'M-30 0H-20a5 5 0 0 1 10 0a5 5 0 0 1 10 0a5 5 0 0 1 10 0a5 5 0 0 1 10 0H30' },
  ],
  box: [-30, -5, 30, 3],
};
