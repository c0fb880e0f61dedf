/** Every kind of part, in drawer order. A kind's folder, `kind` in the netlist and `kind=` in a deck are this one name. */
export const kindIds = [
  'nmos', 'pmos', 'npn', 'pnp',
  'signal-generator',
  'air-core-coil', 'inductor',
  'dc-source', 'dc-supply', 'ac-mains', 'fuse',
  'diode', 'schottky', 'zener', 'led',
  'resistor', 'capacitor', 'polarised-capacitor',
  'switch',
  'plug-contact', 'removable-lead', 'test-point', 'zero-volt', 'earth', 'net-name', 'note',
  'box',
] as const;

export type KindId = (typeof kindIds)[number];
