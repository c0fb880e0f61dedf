import { randomInt } from 'node:crypto';
import { parseArgs } from 'node:util';
import { ulid } from 'ulid';
import { closeDatabase, database } from '@/db/client';
import { writeAudit } from '@/db/mutations/audit';
import { insertBench, insertPerson } from '@/db/mutations/benches';
import { countPeople } from '@/db/queries/people';
import { inTransaction } from '@/db/transaction';
import { hashPassword } from '@/lib/auth/password';
import { slugOf } from '@/lib/circuits/make-bench';
import { emailSchema } from '@/lib/schemas/session';
import { lineSchema } from '@/lib/schemas/text';

/**
 * Makes the first person of an empty installation, steward of its first bench, and prints the password once.
 * `npm run -s first-steward -- --name "Your name" --email you@your.site --bench "Name of the bench"`
 */
const usage = 'Give --name "Your name" --email you@your.site --bench "Name of the bench".';
const letters = 'abcdefghijkmnopqrstuvwxyzABCDEFGHJKLMNPQRSTUVWXYZ23456789';

function refuse(words: string): never {
  process.stderr.write(`${words}\n`);
  process.exit(1);
}

const { values } = parseArgs({ options: { name: { type: 'string' }, email: { type: 'string' }, bench: { type: 'string' } } });
const name = lineSchema.safeParse(values.name);
const email = emailSchema.safeParse(values.email);
const bench = lineSchema.safeParse(values.bench);
if (!name.success || !email.success || !bench.success) refuse(usage);

const db = database();
if (await countPeople(db) > 0) refuse('There are people here already. Ask a steward of your bench for an invitation.');

const password = Array.from({ length: 16 }, () => letters[randomInt(letters.length)]).join('');
const person = { id: ulid(), name: name.data, email: email.data, passwordHash: await hashPassword(password) };
const made = { id: ulid(), slug: slugOf(bench.data), name: bench.data };
await inTransaction(db, async (tx) => {
  await insertPerson(tx, person);
  await insertBench(tx, made, person.id);
  await writeAudit(tx, { bench: made.id, actor: person.id, action: 'made the bench', detail: { name: made.name }, requestId: ulid() });
});
await closeDatabase();
process.stdout.write(`${person.name} is steward of ${made.name}. Password, shown this once: ${password}\n`);
