import { defineConfig } from 'drizzle-kit';

/** `npx drizzle-kit generate --name what-it-does`, then read the SQL before committing it. */
export default defineConfig({
  dialect: 'sqlite',
  schema: './shared/db/hub.ts',
  out: './drizzle',
});
