import type { SymbolArt } from '../symbol-art';

export const resistorSymbol: SymbolArt = {
  id: 'r',
  shapes: [
    { shape: 'path', style: 's', d: 'M-30 0H-18M18 0H30' },
    { shape: 'path', style: 'b', d: 'M-18 -6.5H18V6.5H-18Z' },
  ],
  box: [-30, -7, 30, 7],
};

/** The other drawing in use for a resistor; a sheet shows all of its resistors in one of the two. */
export const zigzagResistorSymbol: SymbolArt = {
  id: 'rz',
  shapes: [
    { shape: 'path', style: 's', d: 'M-30 0H-18l3 -7l6 14l6 -14l6 14l6 -14l6 14l3 -7H30' },
  ],
  box: [-30, -7, 30, 7],
};
