import { defineConfig } from 'drizzle-kit';

// Only `drizzle-kit generate` reads this; migrations are applied by the app at start.
export default defineConfig({
	dialect: 'postgresql',
	schema: './src/lib/server/db/schema',
	casing: 'snake_case',
	out: './drizzle'
});
