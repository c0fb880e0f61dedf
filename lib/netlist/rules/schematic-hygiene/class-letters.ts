import type { KindId } from '../../kinds/kind-id';

/**
 * Class letters accepted for each kind: IEEE 315 clause 22.4 with ASME Y14.44, and what is in everyday use beside them
 * (D for an LED, G for a generator, J and P for either side of a plug). Kinds without an entry are not judged.
 */
export const classLetters: Readonly<Partial<Record<KindId, readonly string[]>>> = {
  resistor: ['R'],
  capacitor: ['C'],
  'polarised-capacitor': ['C'],
  inductor: ['L', 'K', 'T', 'B', 'M'],
  'air-core-coil': ['L'],
  diode: ['D', 'CR'],
  schottky: ['D', 'CR'],
  zener: ['D', 'VR'],
  led: ['D', 'DS'],
  nmos: ['Q'],
  pmos: ['Q'],
  npn: ['Q'],
  pnp: ['Q'],
  'dc-source': ['V', 'G', 'BT', 'PS', 'U'],
  'dc-supply': ['V', 'G', 'PS'],
  'signal-generator': ['G', 'V', 'U'],
  'ac-mains': ['V', 'G'],
  switch: ['S', 'K'],
  'removable-lead': ['W', 'J', 'P', 'R'],
  'plug-contact': ['J', 'P', 'X'],
  fuse: ['F', 'R'],
  'test-point': ['TP'],
};
