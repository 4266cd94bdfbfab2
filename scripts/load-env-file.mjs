import { loadEnvFile } from "./setup.mjs";

// Loaded before a script of its own (node --import), so that .env counts there as it does for npm start.
loadEnvFile();
