import { migrateDatabase } from '@/db/migrate';
import { requireSetting } from '@/lib/env/require-setting';

/** Brings the database of DATABASE_URL up to the committed migrations. `npm start` runs it; so does an upgrade. */
await migrateDatabase(requireSetting('DATABASE_URL'));
