import { defineConfig } from 'drizzle-kit';

export default defineConfig({
  dialect: 'postgresql',
  schema: './db/schema/*.ts',
  out: './drizzle',
  dbCredentials: {
    url: process.env['DATABASE_OWNER_URL'] ?? 'postgres://lotwright_owner@127.0.0.1:4632/lotwright',
  },
});
