import * as Y from 'yjs';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { RoomActor } from '@/db/queries/room-grant';
import { readRoom } from '@/db/queries/room-state';
import { Browser, Page, pageWorld } from './support/page';
import { SheetWorld } from './support/sheet-world';

let world: SheetWorld;
const pages: Page[] = [];
beforeAll(async () => { world = await SheetWorld.start(); });
afterAll(() => world.stop());
afterEach(() => pages.splice(0).forEach((page) => page.close()));

function open(circuitId: string, actor: RoomActor, browser?: Browser): Page {
  const page = new Page(pageWorld(world), circuitId, actor, browser);
  pages.push(page);
  return page;
}

describe('a sheet open in several pages', () => {
  it('shows an edit to the others and says saved after its commit', async () => {
    const { circuitId, maker, member, guest } = await world.freshPeople();
    const [author, reader, visitor] = [open(circuitId, maker), open(circuitId, member), open(circuitId, guest)];
    for (const page of [author, reader, visitor]) await page.loaded();
    expect([author.now.role, reader.now.role, visitor.now.role]).toEqual(['maker', 'reader', 'guest']);
    expect([author.now.editable, reader.now.editable, visitor.now.editable]).toEqual([true, false, false]);
    expect(author.now.save).toEqual({ state: 'saved', at: null });

    author.addResistor('R1');
    expect(author.now.save).toEqual({ state: 'saving', edits: 1 });
    const { save, seq } = await author.saved();
    expect(save.state === 'saved' && save.at).toBeTypeOf('number');
    expect(seq).toBe(1);
    expect((await readRoom(world.db, circuitId))?.headSeq).toBe(1);
    await reader.shows('R1');
    await visitor.shows('R1');
  });

  it('merges what two makers do at once', async () => {
    const { circuitId, maker, coMaker } = await world.freshPeople();
    const [one, two] = [open(circuitId, maker), open(circuitId, coMaker)];
    await one.loaded();
    await two.loaded();
    for (let count = 1; count <= 20; count += 1) {
      one.addResistor(`R${count}`);
      two.addResistor(`C${count}`);
    }
    await one.saved();
    await two.saved();
    await one.until('all to be shown', () => one.refs().length === 40);
    await two.until('all to be shown', () => two.refs().length === 40);
    expect(Y.encodeStateVector(one.now.doc)).toEqual(Y.encodeStateVector(two.now.doc));
    expect(one.now.seq).toBe(40);
    expect(two.now.seq).toBe(40);
  });

  it('keeps edits made offline and merges them when the line is back', async () => {
    const { circuitId, maker, coMaker } = await world.freshPeople();
    const [one, two] = [open(circuitId, maker), open(circuitId, coMaker)];
    await one.loaded();
    await two.loaded();
    one.offline = true;
    for (const connection of world.realtime.connections.all()) if (connection.member?.actor.personId === maker.personId) connection.close('ourFault');
    await one.until('the line to be gone', ({ line }) => line.state === 'connecting');
    one.addResistor('R1');
    one.addResistor('R2');
    expect(one.now.save).toMatchObject({ state: 'not saved', edits: 2 });
    two.addResistor('R3');
    await two.saved();
    one.offline = false;
    await one.saved();
    await one.shows('R3');
    await two.shows('R2');
    expect(one.events.at(-1)).toEqual({ topic: '*', data: {} });
  });

  it('sends after a reload what was not saved before it', async () => {
    const { circuitId, maker, member } = await world.freshPeople();
    const browser = new Browser();
    const first = open(circuitId, maker, browser);
    await first.loaded();
    first.offline = true;
    for (const connection of world.realtime.connections.all()) connection.close('ourFault');
    await first.until('the line to be gone', ({ line }) => line.state === 'connecting');
    first.addResistor('R1');
    first.addResistor('R2');
    first.close();
    const reader = open(circuitId, member);
    await reader.loaded();
    expect(reader.refs()).toEqual([]);
    const second = open(circuitId, maker, browser);
    await second.loaded();
    await second.saved();
    expect(second.refs()).toEqual(['R1', 'R2']);
    await reader.shows('R2');
    second.addResistor('R4');
    await second.saved();
    await reader.shows('R4');
  });

  it('shows people to each other as the server knows them', async () => {
    const { circuitId, maker, member, guest } = await world.freshPeople();
    const [author, visitor, reader] = [open(circuitId, maker), open(circuitId, guest), open(circuitId, member)];
    for (const page of [author, visitor, reader]) await page.loaded();
    author.session.setPresence({ cursor: { x: 10, y: 20 }, selection: ['part'] });
    const { others } = await visitor.until('the cursor', (now) => now.others.some(({ fields }) => fields?.cursor?.x === 10) && now.others.length === 2);
    // A guest sees people as initials.
    expect(others).toContainEqual(expect.objectContaining({ person: maker.personId, name: 'I', fields: { cursor: { x: 10, y: 20 }, selection: ['part'] } }));
    const seen = await reader.until('both', (now) => now.others.length === 2);
    expect(seen.others.map(({ name }) => name).sort()).toEqual(['Guest 1', 'Ines']);
    visitor.close();
    await author.until('the guest to be gone', (now) => now.others.length === 1);
  });

  it('hears what changed beside the sheet', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const page = open(circuitId, maker);
    await page.loaded();
    expect((await world.internal('/internal/announce', { circuitId, topic: 'threads', data: { id: 'x' } })).status).toBe(204);
    await page.until('the event', () => page.events.length > 0);
    expect(page.events).toEqual([{ topic: 'threads', data: { id: 'x' } }]);
  });
});

describe('a refused edit', () => {
  it('is listed to its author, is not on the sheet, survives a reload and can be let go', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const browser = new Browser();
    const page = open(circuitId, maker, browser);
    await page.loaded();
    page.addResistor('R1');
    await page.saved();
    const before = page.now.doc;
    before.getMap<Y.Map<unknown>>('parts').set('bad', new Y.Map(Object.entries({ kind: 'no such kind' })));
    await page.until('the refusal', ({ refused, editable }) => refused.length === 1 && editable);
    expect(page.now.refused[0]).toMatchObject({ reason: 'schema' });
    expect(page.now.doc).not.toBe(before);
    expect(page.now.doc.getMap('parts').has('bad')).toBe(false);
    expect(page.refs()).toEqual(['R1']);
    expect(page.now.save.state).toBe('saved');
    expect(JSON.parse(page.session.textOf(page.now.refused[0]?.id ?? ''))).toEqual({ parts: { bad: { kind: 'no such kind' } } });
    page.addResistor('R2');
    await page.saved();

    page.close();
    const again = open(circuitId, maker, browser);
    await again.loaded();
    await again.until('the refusal', ({ refused }) => refused.length === 1);
    expect(await again.session.tryAgain(again.now.refused[0]?.id ?? '')).toBe(true);
    await again.until('the second refusal', ({ refused, editable }) => refused.length === 1 && editable);
    expect(again.refs()).toEqual(['R1', 'R2']);
    await again.session.letGo(again.now.refused[0]?.id ?? '');
    expect(again.now.refused).toEqual([]);
  });

  it('takes with it what was drawn on top of it', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const page = open(circuitId, maker);
    await page.loaded();
    page.now.doc.getMap<Y.Map<unknown>>('parts').set('bad', new Y.Map(Object.entries({ kind: 'no such kind' })));
    page.addResistor('R1');
    page.addResistor('R2');
    await page.until('the refusal', ({ refused, editable }) => refused.length > 0 && editable);
    expect(page.refs()).toEqual([]);
    expect(page.now.refused.flatMap(({ updates }) => updates)).toHaveLength(3);
  });

  it('that is too large is never sent', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const page = open(circuitId, maker);
    await page.loaded();
    page.now.doc.getMap('library').set('model:BIG', 'x'.repeat(1_100_000));
    await page.until('the refusal', ({ refused, editable }) => refused.length === 1 && editable);
    expect(page.now.refused[0]).toMatchObject({ reason: 'size' });
    expect((await readRoom(world.db, circuitId))?.headSeq).toBe(0);
  });
});
