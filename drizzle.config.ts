import { defineConfig } from 'drizzle-kit';

// Migrations are generated from the schema and then completed by hand where drizzle-kit has no words
// (partitions, row-level security, functions). DEVELOPERS.md, "A migration".
export default defineConfig({
  dialect: 'postgresql',
  schema: './database/schema/*.ts',
  out: './database/migrations',
});
