import type { SymbolArt } from '../symbol-art';

export const pnpSymbol: SymbolArt = {
  id: 'pnp',
  shapes: [
    { shape: 'path', style: 'h', d: 'M-4 -15V15' },
    { shape: 'path', style: 's', d: 'M-40 0H-4M-4 -6L20 -20V-40M-4 6L20 20V40' },
    { shape: 'path', style: 'k', d: 'M0.0 -8.3L5.2 -15.3L8.6 -9.4Z' },
  ],
  box: [-40, -40, 20, 40],
};
