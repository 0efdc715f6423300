import { defineConfig } from 'drizzle-kit';

/** Only `drizzle-kit generate --name …`: never `push`, and a generated migration is never edited. */
export default defineConfig({
  dialect: 'sqlite',
  schema: './src/lib/server/db/schema/*.ts',
  out: './drizzle'
});
