import type { SymbolArt } from '../symbol-art';

export const earthSymbol: SymbolArt = {
  id: 'gnd',
  shapes: [
    { shape: 'path', style: 's', d: 'M0 0V10' },
    { shape: 'path', style: 'h', d: 'M-12 10H12M-8 14.5H8M-4 19H4' },
  ],
  box: [-12, 0, 12, 20],
};
