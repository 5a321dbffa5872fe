import { defineConfig } from "drizzle-kit";

/** Only used to generate migrations from the schema; they are applied by scripts/migrate.ts. */
export default defineConfig({
  dialect: "postgresql",
  schema: "./db/schema/index.ts",
  out: "./db/migrations",
  casing: "snake_case",
});
