import type { SymbolArt } from '../symbol-art';

export const npnSymbol: SymbolArt = {
  id: 'npn',
  shapes: [
    { shape: 'path', style: 'h', d: 'M-4 -15V15' },
    { shape: 'path', style: 's', d: 'M-40 0H-4M-4 -6L20 -20V-40M-4 6L20 20V40' },
    { shape: 'path', style: 'k', d: 'M16.0 17.7L7.4 16.6L10.8 10.7Z' },
  ],
  box: [-40, -40, 20, 40],
};
