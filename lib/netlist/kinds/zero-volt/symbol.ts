import type { SymbolArt } from '../symbol-art';

export const zeroVoltSymbol: SymbolArt = {
  id: 'com',
  shapes: [
    { shape: 'path', style: 's', d: 'M0 0V10' },
    { shape: 'path', style: 'b', d: 'M-8.5 10H8.5L0 21Z' },
  ],
  box: [-9, 0, 9, 21],
};
