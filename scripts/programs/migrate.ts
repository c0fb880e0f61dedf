import { migrateDatabase } from '@/db/migrate';
import { requireSetting } from '@/lib/env/require-setting';

/** Brings the database of DATABASE_URL up to the committed migrations. `npm start` runs it; so does an upgrade. */
try {
  await migrateDatabase(requireSetting('DATABASE_URL'));
} catch (error) {
  // The driver's own words stand in the cause: "Access denied", "Unknown database", a refused connection.
  const cause = error instanceof Error && error.cause instanceof Error ? error.cause : error;
  const why = cause instanceof AggregateError ? cause.errors.map(String).join('; ') : cause instanceof Error ? cause.message : String(cause);
  process.stderr.write(`The database of DATABASE_URL could not be brought up to date: ${why}\n`);
  process.exit(1);
}
