import { defineConfig } from 'drizzle-kit';

/** `npx drizzle-kit generate --name <what-changes>` writes the next migration; nothing is ever pushed. */
export default defineConfig({
  dialect: 'mysql',
  schema: './db/schema/*.ts',
  out: './db/migrations',
});
