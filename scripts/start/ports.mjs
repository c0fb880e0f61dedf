import { anyFreePort, portIsFree, preferredPort } from '../machine/free-port.mjs';
import { Refusal } from '../machine/say.mjs';
import { reachable } from '../parts/web-part.mjs';

const usualWebPort = 3000;

/**
 * Ports of this start: those asked for, which must be free, and free ones for the rest.
 * @param {import('./settings.mjs').Settings} settings
 */
export async function choosePorts(settings) {
  const { host } = settings;
  if (settings.port !== undefined && settings.port === settings.realtimePort) {
    throw new Refusal(`PORT and REALTIME_PORT are both ${settings.port}. Give them different ports.`);
  }
  const web = settings.port === undefined ? await preferredPort(usualWebPort, host) : await asked('PORT', settings.port, host);
  const realtime = settings.realtimePort === undefined ? await anyFreePort(host) : await asked('REALTIME_PORT', settings.realtimePort, host);
  const publicUrl = settings.publicUrl ?? `http://${reachable(host)}:${web}`;
  const local = isLoopback(new URL(publicUrl).hostname);
  return {
    web, realtime, publicUrl,
    /** Demo people and the local stand-ins exist only then. */
    local,
    database: settings.databaseUrl ? undefined : await anyFreePort(),
    mail: local && !settings.mailGiven ? await anyFreePort() : undefined,
    files: local && !settings.storageGiven ? await anyFreePort() : undefined,
  };
}

/** @typedef {Awaited<ReturnType<typeof choosePorts>>} Ports */

/** @param {string} name @param {number} port @param {string} host */
async function asked(name, port, host) {
  if (await portIsFree(port, host)) return port;
  throw new Refusal(`Port ${port} (${name}) is taken by another program. Stop that, or set ${name} to a free port.`);
}

/** As `lib/env/loopback.ts`, which cannot be imported before packages and build are there. @param {string} hostname */
function isLoopback(hostname) {
  const name = hostname.replace(/^\[|\]$/g, '');
  return name === 'localhost' || name.endsWith('.localhost') || name === '::1' || /^127(\.\d{1,3}){3}$/.test(name);
}
