import { defineConfig } from 'drizzle-kit';

export default defineConfig({
  dialect: 'postgresql',
  schema: './server/db/schema',
  // Overridden where the check "generating yields no difference" works on a copy.
  out: process.env.BARMKIN_DRIZZLE_OUT ?? './drizzle',
  casing: 'snake_case',
});
