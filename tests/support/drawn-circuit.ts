import { emptySheet } from '@/lib/document/write-sheet';
import type { Sheet } from '@/lib/document/records';
import { planSchema } from '@/lib/schemas/hold-point';

const part = (id: string, ref: string, kind: Sheet['parts'][number]['kind'], x: number, facts: Record<string, number | string>): Sheet['parts'][number] => (
  { id, ref, kind, x, y: 0, turn: 0, mirror: false, facts, origins: {}, leftOpen: [] }
);

/** The smallest sheet that can be reviewed: a supply, a resistor, a plan of three hold points. */
export const reviewedSheet: Sheet = {
  ...emptySheet,
  title: 'Bench circuit',
  parts: [part('01PARTV1000000000000000000', 'V1', 'dc-supply', 0, { value: 15, role: 'supply' }), part('01PARTR1000000000000000000', 'R1', 'resistor', 200, { value: 1_000, pmax: 0.25 })],
  wires: [{ id: 'w1', a: { at: 'pin', part: '01PARTV1000000000000000000', pin: '+' }, b: { at: 'pin', part: '01PARTR1000000000000000000', pin: '1' }, bends: [] }],
  holdPoints: [15, 36, 85].map((volts) => ({ id: `hp${volts}`, name: `${volts} V`, volts, amps: 0.2 })),
};

/** The sheet after another electrical change: R1's value is the number given. */
export const withValue = (sheet: Sheet, ohms: number): Sheet => (
  { ...sheet, parts: sheet.parts.map((each) => (each.ref === 'R1' ? { ...each, facts: { ...each.facts, value: ohms } } : each)) }
);

export const plan = planSchema.parse([15, 36, 85].map((volts) => ({ name: `${volts} V`, volts, amps: 0.2 })));
