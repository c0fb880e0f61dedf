import { mkdtempSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { dataFolder } from './data-folder.mjs';
import { takeLock } from './lock.mjs';
import { readPrivate, writePrivate } from './private-file.mjs';
import { randomWord, secrets } from './secrets.mjs';

const fresh = () => path.join(mkdtempSync(path.join(tmpdir(), 'holdoff-data-')), 'data');

describe('the data folder', () => {
  it('is for its owner alone', () => expect(statSync(dataFolder(fresh()).root).mode & 0o777).toBe(0o700));

  it('keeps the socket inside, or where its path is short enough for the system', () => {
    const near = dataFolder(fresh());
    expect(near.socket.startsWith(near.root)).toBe(true);
    const far = dataFolder(path.join(fresh(), 'a-folder-with-a-long-name'.repeat(5)));
    expect(Buffer.byteLength(far.socket)).toBeLessThanOrEqual(100);
    expect(statSync(path.dirname(far.socket)).mode & 0o777).toBe(0o700);
  });
});

describe('its secrets', () => {
  it('are letters and digits, made once and kept private', () => {
    const file = dataFolder(fresh()).secrets;
    const first = secrets(file);
    expect(secrets(file)).toEqual(first);
    expect(statSync(file).mode & 0o777).toBe(0o600);
    expect(Object.values(first).every((word) => /^[A-Za-z0-9]{24,}$/.test(word))).toBe(true);
    expect(randomWord(12)).not.toBe(randomWord(12));
  });
});

describe('its lock', () => {
  it('is refused to a second taker while the first lives, with its address', async () => {
    const data = dataFolder(fresh());
    const lock = await takeLock(data);
    lock.note({ address: 'http://127.0.0.1:4000' });
    await expect(takeLock(data)).rejects.toThrow(/Already running at http:\/\/127\.0\.0\.1:4000/);
    lock.release();
    (await takeLock(data)).release();
  });

  it('is taken over when its owner is gone, also when the number now is another process', async () => {
    const data = dataFolder(fresh());
    writePrivate(data.lock, { pid: process.pid, identity: 'of an earlier process', parts: [] });
    const lock = await takeLock(data);
    expect(readPrivate(data.lock)).toMatchObject({ pid: process.pid });
    lock.release();
  });
});
