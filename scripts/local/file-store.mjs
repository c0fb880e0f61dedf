import { mkdirSync } from 'node:fs';
import S3rver from 's3rver';
import { localStore } from './local-store.mjs';

/**
 * An S3 store on a folder.
 * @param {number} port
 * @param {string} folder
 * @returns {Promise<() => Promise<void>>} stops it
 */
export async function startFileStore(port, folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const server = new S3rver({ port, address: '127.0.0.1', silent: true, directory: folder, configureBuckets: [{ name: localStore.bucket, configs: [] }] });
  await server.run();
  return () => server.close();
}
