import { seedDemo } from "../db/seeds/demo";
import { closeDatabase, database } from "../lib/database";
import { SettingsError } from "../lib/env";

// One transaction, and nothing where the demo is there already: it may be run again after any ending.
try {
  await seedDemo(database());
} catch (error) {
  console.error(error instanceof SettingsError ? error.message : error);
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
