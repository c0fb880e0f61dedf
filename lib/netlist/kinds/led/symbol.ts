import type { SymbolArt } from '../symbol-art';

export const ledSymbol: SymbolArt = {
  id: 'led',
  shapes: [
    { shape: 'path', style: 'b', d: 'M-9 -9V9L9 0Z' },
    { shape: 'path', style: 's', d: 'M-30 0H30' },
    { shape: 'path', style: 'h', d: 'M9 -9V9' },
    { shape: 'path', style: 's', d: 'M-3 -12L2.6 -19.0' },
    { shape: 'path', style: 'k', d: 'M5.0 -22.0L3.4 -16.3L-0.2 -19.1Z' },
    { shape: 'path', style: 's', d: 'M5 -11L10.6 -18.0' },
    { shape: 'path', style: 'k', d: 'M13.0 -21.0L11.4 -15.3L7.8 -18.1Z' },
  ],
  box: [-30, -23, 30, 9],
};
