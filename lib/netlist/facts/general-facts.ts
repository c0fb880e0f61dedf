import { flag, label, type FactDefinition } from './fact-definition';

/** Facts that any part or net may have: what it is, how it is joined, what is written on it. */
export const generalFacts = {
  /** Main value in SI units. Ohms, farads, henries, DC volts of a source, amps of a fuse: the kind's form says which. */
  value: { label: 'Value', unit: '', type: 'quantity' } as FactDefinition,
  kind: label('Kind'),
  ref: label('Designator'),
  part: label('Part number'),
  package: label('Package'),
  load: label('Load', ['motor', 'relay', 'solenoid', 'lamp', 'heater', 'coil', 'led']),
  pins: label('Pins'),
  plus: label('Plus on'),
  minus: label('Minus on'),
  anode: label('Anode on'),
  cathode: label('Cathode on'),
  com: label('Common contact on'),
  internal: label('Inside of'),
  part_of: label('Part of'),
  contact: label('Contact number'),
  wire: flag('Piece of wire'),
  class: label('Class'),
  closed_switch: flag('Drawn closed'),
  closed_contact: flag('Contact drawn closed'),
  range: { label: 'Range', unit: '', type: 'range' } as FactDefinition,
  note: label('Note'),
  name: label('Net name'),
  text: label('Text'),
  /** Element letter of a box that a deck brought. */
  element: label('Element'),
} as const;
