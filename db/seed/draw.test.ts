import { describe, expect, it } from 'vitest';
import { decodeSheet, encodeSheet } from '@/lib/document/encode-sheet';
import { partBoxOf, pinPlaceOf } from '@/lib/document/geometry/pin-place';
import { boxesOverlap } from '@/lib/document/geometry/point';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Sheet, WireEnd } from '@/lib/document/records';
import { draw, type Drawing } from './draw';
import { fanDriver } from './fan-driver';
import { inductionHeaterDriver } from './induction-heater-driver';
import { relayDriver } from './relay-driver';
import { spotWelderTrigger } from './spot-welder-trigger';

const drawings: readonly Drawing[] = [inductionHeaterDriver, fanDriver, relayDriver, spotWelderTrigger];
let count = 0;
const newId = () => `id-${count += 1}`;

function placeOf(sheet: Sheet, end: WireEnd): readonly [number, number] {
  const place = end.at === 'junction' ? sheet.junctions.find(({ id }) => id === end.junction)
    : pinPlaceOf(sheet.parts.find(({ id }) => id === end.part) as Sheet['parts'][number], end.pin);
  return [place?.x ?? NaN, place?.y ?? NaN];
}

describe.each(drawings.map((drawing) => [drawing.title, drawing] as const))('%s', (_, drawing) => {
  const sheet = draw(drawing, newId);

  it('is a sound document', () => {
    const read = decodeSheet(encodeSheet(sheet));
    expect(read.repairs).toEqual([]);
    expect(read.sheet.parts).toHaveLength(drawing.parts.length);
  });

  it('has its wires at right angles throughout, as drawn', () => {
    const slanted = sheet.wires.filter((wire) => {
      const path = [placeOf(sheet, wire.a), ...wire.bends, placeOf(sheet, wire.b)];
      return path.slice(1).some(([x, y], index) => x !== path[index]?.[0] && y !== path[index]?.[1]);
    });
    expect(slanted.map(({ a, b }) => [placeOf(sheet, a), placeOf(sheet, b)])).toEqual([]);
  });

  it('has no two parts on one another and no pin alone on its net', () => {
    const bodies = sheet.parts.filter(({ kind }) => kind !== 'test-point' && kind !== 'net-name' && kind !== 'zero-volt');
    const clashes = bodies.flatMap((part, index) => bodies.slice(index + 1).filter((other) => boxesOverlap(partBoxOf(part), partBoxOf(other))).map((other) => `${part.ref} ${other.ref}`));
    expect(clashes).toEqual([]);
    expect(sheetToNetlist(sheet).nets.filter(({ pins }) => pins.length < 2)).toEqual([]);
  });
});
