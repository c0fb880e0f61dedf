import { connect } from 'node:net';
import type { Database } from '@/db/client';
import { ping } from '@/db/queries/durability';
import { environment } from '@/lib/env/environment';
import { engineState } from '@/lib/review/check-engine';
import { rooms } from '@/lib/rooms/room-client';
import type { Health } from '@/lib/schemas/health';

type PartState = Health['database'];
const patience = 2_000;

/** Fails when an answer takes longer than people wait for it: a part that hangs is down. */
async function inTime<T>(answer: Promise<T>): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<never>((_, reject) => { timer = setTimeout(() => reject(new Error('no answer in time')), patience); });
  try {
    return await Promise.race([answer, late]);
  } finally {
    clearTimeout(timer);
  }
}

/** True when something listens at an address. */
function listens(address: string, port: number): Promise<boolean> {
  return new Promise((resolve) => {
    const socket = connect({ host: new URL(address).hostname, port, timeout: patience });
    const done = (answer: boolean) => {
      socket.destroy();
      resolve(answer);
    };
    socket.once('connect', () => done(true));
    socket.once('timeout', () => done(false));
    socket.once('error', () => done(false));
  });
}

const usualPorts: Readonly<Record<string, number>> = { 'smtp:': 25, 'smtps:': 465, 'http:': 80, 'https:': 443 };

async function reachable(address: string | undefined): Promise<PartState> {
  if (!address) return 'off';
  const { port, protocol } = new URL(address);
  return await listens(address, Number(port) || (usualPorts[protocol] ?? 0)) ? 'ok' : 'down';
}

const up = (answers: boolean): PartState => (answers ? 'ok' : 'down');

/** State of each part, asked now. Names and words only: no addresses, versions or secrets. */
export async function readHealth(db: Database): Promise<Health> {
  const env = environment();
  const [database, realtime, storage, mail] = await Promise.all([
    inTime(ping(db)).then(() => up(true), () => up(false)), rooms().healthy().then(up), reachable(env.S3_ENDPOINT), reachable(env.SMTP_URL),
  ]);
  const parts = { database, realtime, engine: engineState(), storage, mail };
  return { status: Object.values(parts).includes('down') ? 'down' : 'ok', ...parts };
}
