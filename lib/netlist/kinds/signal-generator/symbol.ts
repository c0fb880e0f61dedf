import type { SymbolArt } from '../symbol-art';

export const signalGeneratorSymbol: SymbolArt = {
  id: 'gen',
  shapes: [
    { shape: 'path', style: 's', d: 'M0 -30V-16M0 16V30' },
    { shape: 'circle', style: 'b', cx: 0, cy: 0, r: 16 },
    { shape: 'path', style: 's', d: 'M-10 5H-5V-6H2V5H10' },
    { shape: 'path', style: 's', d: 'M7 -22h6M10 -25v6' },
  ],
  box: [-16, -30, 16, 30],
};
