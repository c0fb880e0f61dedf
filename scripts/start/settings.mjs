import path from 'node:path';
import { Refusal } from '../machine/say.mjs';

/**
 * What this start was asked for. Empty variables count as unset.
 * @param {Readonly<Record<string, string | undefined>>} env
 */
export function readSettings(env) {
  const given = (/** @type {string} */ name) => env[name]?.trim() || undefined;
  return {
    host: given('HOST') ?? '127.0.0.1',
    port: portNumber('PORT', given('PORT')),
    realtimePort: portNumber('REALTIME_PORT', given('REALTIME_PORT')),
    publicUrl: given('PUBLIC_URL') && webAddress(given('PUBLIC_URL')),
    dataFolder: path.resolve(given('DATA_DIR') ?? '.data'),
    databaseUrl: given('DATABASE_URL'),
    mailGiven: given('SMTP_URL') !== undefined,
    storageGiven: (given('S3_ENDPOINT') ?? given('S3_BUCKET')) !== undefined,
  };
}

/** @typedef {ReturnType<typeof readSettings>} Settings */

/** @param {string | undefined} text */
function webAddress(text) {
  const address = text && URL.canParse(text) ? new URL(text) : undefined;
  if (!address || !/^https?:$/.test(address.protocol)) throw new Refusal('PUBLIC_URL is no http or https address. Write it as https://bench.example.org.');
  return address.origin;
}

/** @param {string} name @param {string | undefined} text */
function portNumber(name, text) {
  if (text === undefined) return undefined;
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) throw new Refusal(`${name} is ${text}, which is no port. Use a number from 1 to 65535.`);
  return port;
}
