import type { SymbolArt } from '../symbol-art';

export const netNameSymbol: SymbolArt = {
  id: 'net-name',
  shapes: [
    { shape: 'path', style: 's', d: 'M0 0H10M10 -3V3' },
    { shape: 'text', x: 14, y: 4.3, anchor: 'start', text: 'NAME' },
  ],
  box: [0, -6, 42, 6],
};
