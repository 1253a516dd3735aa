import { defineConfig } from 'drizzle-kit';

// Migrations are generated here (`npm run db:generate`) and run by scripts/lib/database.mjs; none that shipped is edited.
export default defineConfig({
	dialect: 'postgresql',
	schema: './src/lib/server/db/schema/*.ts',
	out: './drizzle',
	casing: 'snake_case'
});
