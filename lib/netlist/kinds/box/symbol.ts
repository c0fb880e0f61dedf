import type { SymbolArt } from '../symbol-art';

export const boxSymbol: SymbolArt = {
  id: 'unk',
  shapes: [
    { shape: 'path', style: 's', d: 'M-50 -10H-30M-50 10H-30M50 -10H30M50 10H30' },
    { shape: 'path', style: 'b', d: 'M-30 -20H30V20H-30Z' },
    { shape: 'path', style: 'd', d: 'M-25.5 -15.5H25.5V15.5H-25.5Z' },
    { shape: 'text', x: 0, y: 6, anchor: 'middle', text: '?' },
  ],
  box: [-50, -20, 50, 20],
};
