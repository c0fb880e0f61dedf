import * as Y from 'yjs';
import { describe, expect, it } from 'vitest';
import { encodeSheet } from '@/lib/document/encode-sheet';
import { readSheet } from '@/lib/document/read-sheet';
import type { Sheet } from '@/lib/document/records';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { writeSheet } from '@/lib/document/write-sheet';
import { documentHash } from './content-hash';
import { ElectricalWatch } from './electrical-watch';

function drawn(): { doc: Y.Doc; edit: (change: (sheet: Sheet) => Sheet) => void } {
  const doc = new Y.Doc();
  Y.applyUpdate(doc, encodeSheet(gateStage()));
  return { doc, edit: (change) => writeSheet(doc, readSheet(doc).sheet, change(readSheet(doc).sheet)) };
}

const part = (ref: string, change: object) => (sheet: Sheet): Sheet =>
  ({ ...sheet, parts: sheet.parts.map((one) => (one.ref === ref ? { ...one, ...change } : one)) });

const edits: Record<string, (sheet: Sheet) => Sheet> = {
  'a part moved away from everything': part('D2', { x: 900, y: 900 }),
  'a part moved onto another pin': part('R1', { x: 180, y: 260 }),
  'a part turned': part('L1', { turn: 270 }),
  'a value changed': part('R1', { facts: { value: 47_000 } }),
  'a note on a part': part('R1', { facts: { value: 22_000, pmax: 0.25, note: 'hold-down' } }),
  'a part renamed': part('R1', { ref: 'R7' }),
  'a wire removed': (sheet) => ({ ...sheet, wires: sheet.wires.slice(1) }),
  'a wire bent': (sheet) => ({ ...sheet, wires: sheet.wires.map((wire, index) => (index === 0 ? { ...wire, bends: [[10, 40]] } : wire)) }),
  'a hold point set': (sheet) => ({ ...sheet, holdPoints: sheet.holdPoints.map((point) => ({ ...point, amps: 9 })) }),
  'a scenario warmed': (sheet) => ({ ...sheet, scenarios: sheet.scenarios.map((scenario) => ({ ...scenario, ambient: 60 })) }),
  'the title': (sheet) => ({ ...sheet, title: 'Another name' }),
  'nothing': (sheet) => sheet,
};

describe('whether an edit is electrical', () => {
  it.each(Object.keys(edits))('%s: as the content hash has it', (name) => {
    const { doc, edit } = drawn();
    const watch = new ElectricalWatch(doc, documentHash);
    const before = documentHash(doc);
    edit(edits[name] ?? ((sheet) => sheet));
    expect(watch.changed()).toBe(documentHash(doc) !== before);
    expect(watch.changed()).toBe(false);
  });

  it('there are edits of both sorts above', () => {
    const verdicts = Object.values(edits).map((change) => {
      const { doc, edit } = drawn();
      const before = documentHash(doc);
      edit(change);
      return documentHash(doc) !== before;
    });
    expect(new Set(verdicts)).toEqual(new Set([true, false]));
  });
});
