import { renameSync, writeFileSync } from 'node:fs';
import { closeDatabase, database } from '@/db/client';
import { demoCircuit } from '@/db/queries/guest-links';
import { emptyTables } from '@/db/mutations/empty-tables';
import { peopleEmails } from '@/db/queries/people';
import { requireSetting } from '@/lib/env/require-setting';
import { checkEngine } from '@/lib/review/check-engine';
import { replaceRooms } from '@/lib/rooms/room-client';
import { demoPassword, demoPeople } from '../demo/demo-people';
import { inProcessRooms } from '../demo/in-process-rooms';
import { seedDemo } from '../demo/seed-demo';

/**
 * Makes the demo bench when the database is empty, before web and realtime start. The accounts with their passwords go to the
 * private file named by DEMO_ACCOUNTS. A seeding that was cut off is begun anew; a database with people of its own is left alone.
 */
function writeAccounts(file: string, accounts: readonly { email: string; password: string; part: string }[]): void {
  writeFileSync(`${file}.partial`, `${JSON.stringify(accounts, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${file}.partial`, file);
}

const db = database();
const emails = await peopleEmails(db);
const demoOnly = emails.every((email) => demoPeople.some((person) => person.email === email));
const complete = await demoCircuit(db) !== undefined;
if (emails.length === 0 || (demoOnly && !complete)) {
  if (emails.length > 0) await emptyTables(db);
  const accounts = demoPeople.map(({ email, part }) => ({ email, password: demoPassword(), part }));
  // Before the first row: passwords that are stored nowhere else must not be lost.
  const file = process.env['DEMO_ACCOUNTS'];
  if (file) writeAccounts(file, accounts);
  const rooms = inProcessRooms(db);
  replaceRooms(rooms);
  await seedDemo(db, accounts, requireSetting('INTERNAL_SECRET'));
  await rooms.close();
  await checkEngine().dispose();
}
await closeDatabase();
