import { describe, expect, it } from 'vitest';
import { maxEditBytes } from '../limits';
import { SheetCopy } from '../testing/sheet-copy';
import { MemoryEdits } from './memory-edits';
import { Outbox } from './outbox';

const scope = { personId: 'person', circuitId: 'circuit' };

function outbox(store = new MemoryEdits(), instance = 'one'): { box: Outbox; sent: number[]; store: MemoryEdits; send: (seq: number) => void } {
  const sent: number[] = [];
  const box = new Outbox(store, scope, instance, () => {}, (error) => { throw error; });
  return { box, sent, store, send: (seq) => sent.push(seq) };
}

describe('the outbox', () => {
  it('sends in order and again from what is committed, under the old numbers', () => {
    const { box, sent, send } = outbox();
    const copy = new SheetCopy();
    box.add(copy.addResistor('R1'));
    box.start(0, send);
    box.add(copy.addResistor('R2'));
    box.add(copy.addResistor('R3'));
    expect(sent).toEqual([1, 2, 3]);
    box.acknowledge(1);
    box.stop();
    box.add(copy.addResistor('R4'));
    expect(sent).toEqual([1, 2, 3]);
    box.start(2, send);
    expect(sent).toEqual([1, 2, 3, 3, 4]);
    expect(box.waiting.map(({ clientSeq }) => clientSeq)).toEqual([3, 4]);
    expect(box.acknowledged).toBe(2);
  });

  it('keeps a bounded number under way', () => {
    const { box, sent, send } = outbox();
    const copy = new SheetCopy();
    box.start(0, send);
    for (let count = 1; count <= 230; count += 1) box.add(copy.addResistor(`R${count}`));
    expect(sent).toHaveLength(200);
    box.acknowledge(30);
    expect(sent).toHaveLength(230);
  });

  it('does not send what no frame can carry', () => {
    const { box, sent, send } = outbox();
    box.start(0, send);
    expect(box.add(new Uint8Array(maxEditBytes + 1)).fits).toBe(false);
    expect(sent).toEqual([]);
  });

  it('a refusal takes what leans on it along, and leaves the rest', async () => {
    const { box, store } = outbox();
    const [mine, kept] = [new SheetCopy(), new SheetCopy()];
    box.add(kept.addResistor('R1'));
    box.add(mine.addResistor('R2'));
    box.add(kept.addResistor('R3'));
    box.add(mine.addResistor('R4'));
    const refused = await box.refuse(2, 'schema', 'Why.');
    expect(refused?.updates).toHaveLength(2);
    expect(box.waiting.map(({ clientSeq }) => clientSeq)).toEqual([1, 3]);
    expect(await store.refused(scope)).toEqual([refused]);
    expect(await box.refuse(2, 'schema', 'Again.')).toBeUndefined();
  });

  it('a later copy takes over what closed ones left, in the order it was made, and nothing of open ones', async () => {
    const store = new MemoryEdits();
    const copy = new SheetCopy();
    const [first, second, open] = [outbox(store, 'first'), outbox(store, 'second'), outbox(store, 'open')];
    first.box.add(copy.addResistor('R1'), 10);
    second.box.add(copy.addResistor('R2'), 5);
    open.box.add(copy.addResistor('R3'), 1);
    first.box.add(copy.addResistor('R4'), 20);
    const adopted = await store.adopt(scope, 'new', (instance) => instance === 'open');
    expect(adopted.map(({ at, clientSeq }) => [clientSeq, at])).toEqual([[1, 5], [2, 10], [3, 20]]);
    expect(await store.adopt({ ...scope, personId: 'another' }, 'new', () => false)).toEqual([]);
  });
});
