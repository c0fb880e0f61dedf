import type { SymbolArt } from '../symbol-art';

export const plugContactSymbol: SymbolArt = {
  id: 'pl',
  shapes: [
    { shape: 'path', style: 's', d: 'M-20 0H-1M12 0H20M3 -7A7.6 7.6 0 0 0 3 7' },
    { shape: 'path', style: 'k', d: 'M3 -2H13V2H3Z' },
  ],
  box: [-20, -7, 20, 7],
};
