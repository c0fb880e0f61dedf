import { createServer } from 'node:net';
import { describe, expect, it } from 'vitest';
import { choosePorts } from './ports.mjs';
import { readSettings } from './settings.mjs';

describe('readSettings', () => {
  it('stays on this machine and keeps its data beside the sources unless told otherwise', () => {
    expect(readSettings({})).toMatchObject({ host: '127.0.0.1', port: undefined, databaseUrl: undefined, mailGiven: false, storageGiven: false });
    expect(readSettings({}).dataFolder).toMatch(/\/\.data$/);
  });

  it('counts an empty variable as unset', () => {
    expect(readSettings({ PORT: '', DATABASE_URL: ' ' })).toMatchObject({ port: undefined, databaseUrl: undefined });
  });

  it.each(['0', '65536', 'web', '80.5'])('refuses the port %s by name', (port) => {
    expect(() => readSettings({ PORT: port })).toThrow(/PORT is .*no port/);
  });

  it('takes the origin of PUBLIC_URL and refuses what is no web address', () => {
    expect(readSettings({ PUBLIC_URL: 'https://bench.example.org/x?y' }).publicUrl).toBe('https://bench.example.org');
    expect(() => readSettings({ PUBLIC_URL: 'bench.example.org' })).toThrow(/PUBLIC_URL/);
  });
});

describe('choosePorts', () => {
  it('gives free ports to everything that was not set, and local stand-ins', async () => {
    const ports = await choosePorts(readSettings({}));
    expect(ports.local).toBe(true);
    expect(new Set([ports.web, ports.realtime, ports.database, ports.mail, ports.files]).size).toBe(5);
  });

  it('says which port is taken', async () => {
    const server = createServer();
    const port = await new Promise<number>((resolve) => {
      server.listen(0, '127.0.0.1', () => resolve((server.address() as { port: number }).port));
    });
    try {
      await expect(choosePorts(readSettings({ REALTIME_PORT: String(port) }))).rejects.toThrow(`Port ${port} (REALTIME_PORT) is taken`);
    } finally {
      server.close();
    }
  });

  it('has no demo and no stand-ins on a public address', async () => {
    const ports = await choosePorts(readSettings({ PUBLIC_URL: 'https://bench.example.org' }));
    expect(ports).toMatchObject({ local: false, mail: undefined, files: undefined });
  });

  it('starts no database of its own when one is given', async () => {
    expect((await choosePorts(readSettings({ DATABASE_URL: 'mysql://a:b@127.0.0.1:3306/c' }))).database).toBeUndefined();
  });

  it('refuses one port for two parts', async () => {
    await expect(choosePorts(readSettings({ PORT: '4001', REALTIME_PORT: '4001' }))).rejects.toThrow(/different ports/);
  });
});
