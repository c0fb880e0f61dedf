import { describe, expect, it } from 'vitest';
import { contentHash } from '@/lib/netlist/hash';
import type { Netlist } from '@/lib/netlist/netlist';
import { decodeSheet, encodeSheet } from '../encode-sheet';
import { partBoxOf, pinPlacesOf } from '../geometry/pin-place';
import { boxesOverlap, onSegment, type Point } from '../geometry/point';
import { indexOf } from '../geometry/sheet-index';
import { wirePath } from '../geometry/wire-path';
import { contentHashOf, sheetToNetlist } from '../nets/sheet-to-netlist';
import { gridUnit, type Sheet } from '../records';
import { gateStage } from '../testing/gate-stage';
import { netlistOf } from '../testing/netlist-builder';
import { placeNetlist } from './place-netlist';
import { replaceByDeck } from './replace-by-deck';

const heaterStage = () => netlistOf(`
  V1 dc-source + RAW - 0 role=supply
  F1 fuse 1 RAW 2 DC_LINK
  C1 capacitor 1 DC_LINK 2 0
  R4 resistor 1 DC_LINK 2 0
  D2 diode A SW K DC_LINK
  L1 air-core-coil 1 DC_LINK 2 SW
  R1 resistor 1 DC_LINK 2 LED
  D1 led A LED K 0
  Q1 nmos G GATE D SW S 0
  G1 signal-generator + DRV - RET
  R2 resistor 1 DRV 2 RET
  J1 plug-contact 1 DRV 2 LEAD
  J2 plug-contact 1 RET 2 0
  R3 resistor 1 LEAD 2 GATE`);

/** A ladder of many stages on one rail: far pins must be joined by name. */
const manyStages = (count: number) => netlistOf(['V1 dc-source + RAIL - 0 role=supply', ...Array.from({ length: count }, (_, i) => `
  R${i} resistor 1 RAIL 2 M${i}
  Q${i} npn B B${i} C M${i} E 0
  R${i + 500} resistor 1 M${(i + count - 1) % count} 2 B${i}`)].join('\n'));

const segmentsOf = (path: readonly Point[]) => path.slice(1).map((to, index) => [path[index] as Point, to] as const);

/** What makes a drawing unreadable or wrong: overlapping bodies, slanted lines, lines through foreign pins, lines of two nets on each other. */
function faultsOf(sheet: Sheet): string[] {
  const faults: string[] = [];
  const index = indexOf(sheet);
  const bodies = sheet.parts.filter((part) => part.kind !== 'net-name' && part.kind !== 'note');
  bodies.forEach((a, i) => bodies.slice(i + 1).forEach((b) => {
    const touching = pinPlacesOf(a).some((p) => pinPlacesOf(b).some((q) => p.x === q.x && p.y === q.y));
    if (!touching && boxesOverlap(partBoxOf(a), partBoxOf(b))) faults.push(`${a.ref || a.id} on ${b.ref || b.id}`);
  }));
  const netlist = sheetToNetlist(sheet);
  const netOf = (partId: string, pin: string) => netlist.parts.find((part) => part.id === partId)?.pins[pin];
  for (const wire of sheet.wires) {
    const path = wirePath(index, wire);
    const ends = [wire.a, wire.b].map((end) => (end.at === 'pin' ? netOf(end.part, end.pin) : undefined)).filter(Boolean);
    for (const [from, to] of segmentsOf(path)) {
      if (from.x !== to.x && from.y !== to.y) faults.push(`${wire.id} is slanted`);
      if ([from.x, from.y, to.x, to.y].some((value) => value % gridUnit !== 0)) faults.push(`${wire.id} is off the grid`);
      for (const part of bodies) {
        for (const pin of pinPlacesOf(part)) {
          const net = netOf(part.id, pin.pin);
          if (net !== undefined && ends.length > 0 && !ends.includes(net) && onSegment(pin, from, to)) faults.push(`${wire.id} runs through ${part.ref}:${pin.pin}`);
        }
      }
    }
  }
  return faults;
}

describe('a placed netlist', () => {
  it.each([['a heater stage', heaterStage()], ['many stages', manyStages(16)], ['a single part', netlistOf('R1 resistor 1 A 2 B')]])(
    'says the same circuit as its deck and is legible: %s', async (_, netlist: Netlist) => {
      const sheet = await placeNetlist(netlist);
      expect(contentHashOf(sheet)).toBe(contentHash(netlist));
      expect(faultsOf(sheet)).toEqual([]);
      expect(decodeSheet(encodeSheet(sheet)).repairs).toEqual([]);
    }, 30_000);

  it('is the same for the same deck', async () => {
    expect(await placeNetlist(heaterStage())).toEqual(await placeNetlist(heaterStage()));
  });

  it('has the supply on the left, 0 V below and the signal running to the right', async () => {
    const sheet = await placeNetlist(heaterStage());
    const at = (ref: string) => sheet.parts.find((part) => part.ref === ref)!;
    const xs = sheet.parts.filter((part) => part.ref !== '').map((part) => part.x);
    expect(at('V1').x).toBeLessThan(Math.min(...xs) + (Math.max(...xs) - Math.min(...xs)) / 2);
    expect(at('L1').y).toBeLessThan(at('Q1').y);
    expect(at('R3').x).toBeLessThan(at('Q1').x);
    expect(sheet.parts.filter((part) => part.kind === 'zero-volt')).toHaveLength(6);
  });

  it('keeps names and facts of nets', async () => {
    const netlist = netlistOf('R1 resistor 1 A 2 0\nR2 resistor 1 A 2 0', { A: { kind: 'earth' }, 0: { internal: 'winding' } });
    const placed = sheetToNetlist(await placeNetlist(netlist));
    expect(placed.nets.map(({ name, facts }) => ({ name, facts }))).toEqual([
      { name: '0', facts: { internal: 'winding' } }, { name: 'A', facts: { kind: 'earth' } },
    ]);
  });
});

describe('a deck put over a sheet', () => {
  const deck = () => netlistOf(`
    V1 dc-source + TOP - 0 role=supply
    L1 air-core-coil 1 TOP 2 SW
    D2 diode A SW K TOP
    Q1 nmos G GATE D SW S 0
    G1 signal-generator + DRV - 0
    R3 resistor 1 DRV 2 GATE
    R7 resistor 1 GATE 2 0`);

  it('keeps id and place of parts that are in both, plan and notes', async () => {
    const stage = gateStage();
    const before = { ...stage, parts: [...stage.parts, { ...stage.parts[0]!, id: 'note', ref: '', kind: 'note' as const, x: 900, facts: { text: 'Hot' } }] };
    const after = await replaceByDeck(before, deck());
    for (const ref of ['V1', 'L1', 'D2', 'Q1', 'G1', 'R3']) {
      const { id, x, y, turn } = before.parts.find((part) => part.ref === ref)!;
      expect(after.parts.find((part) => part.ref === ref)).toMatchObject({ id, x, y, turn });
    }
    expect(after.parts.some((part) => part.ref === 'R1')).toBe(false);
    expect(after.parts.find((part) => part.id === 'note')).toBeDefined();
    expect(after.holdPoints).toEqual(before.holdPoints);
    expect(contentHash({ ...sheetToNetlist(after), scenarios: [], holdPoints: [] })).toBe(contentHash(deck()));
    expect(faultsOf(after)).toEqual([]);
  });

  it('places all anew where hardly anything stays', async () => {
    const after = await replaceByDeck(gateStage(), heaterStage());
    expect(faultsOf(after)).toEqual([]);
    expect(contentHash({ ...sheetToNetlist(after), scenarios: [], holdPoints: [] })).toBe(contentHash(heaterStage()));
  });
});
