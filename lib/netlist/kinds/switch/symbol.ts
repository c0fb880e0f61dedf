import type { SymbolArt } from '../symbol-art';

export const switchSymbol: SymbolArt = {
  id: 'sw',
  shapes: [
    { shape: 'path', style: 's', d: 'M-30 0H-13L13 -11M12 0H30' },
  ],
  box: [-30, -12, 30, 2],
};
