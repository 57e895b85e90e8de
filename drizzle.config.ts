import { defineConfig } from 'drizzle-kit';

export default defineConfig({
  dialect: 'postgresql',
  schema: './libs/domain/src/schema/*.ts',
  out: './db/migrations',
});
