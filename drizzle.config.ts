import { defineConfig } from "drizzle-kit";

// Only `generate` is used: migrations are run by the start script with the run-time migrator.
export default defineConfig({
  dialect: "mysql",
  schema: "./app/db/schema/*.ts",
  out: "./drizzle",
});
