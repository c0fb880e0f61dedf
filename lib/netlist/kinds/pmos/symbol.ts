import type { SymbolArt } from '../symbol-art';

export const pmosSymbol: SymbolArt = {
  id: 'pmos',
  shapes: [
    { shape: 'path', style: 'h', d: 'M0 -26V-14M0 -6V6M0 14V26' },
    { shape: 'path', style: 'h', d: 'M-8 -20V20' },
    { shape: 'path', style: 's', d: 'M-40 -20H-8M0 -20H20V-40M0 20H20V40M20 -20V0H0' },
    { shape: 'path', style: 'k', d: 'M13 0L4.5 -4V4Z' },
    { shape: 'path', style: 's', d: 'M20 -30H40V30H20' },
    { shape: 'path', style: 'b', d: 'M31.5 7.5H48.5L40 -7.5Z' },
    { shape: 'path', style: 's', d: 'M40 -7.5V7.5' },
    { shape: 'path', style: 'h', d: 'M31.5 -7.5H48.5' },
    { shape: 'circle', style: 'k', cx: 20, cy: -30, r: 2 },
    { shape: 'circle', style: 'k', cx: 20, cy: 30, r: 2 },
  ],
  box: [-40, -40, 49, 40],
};
