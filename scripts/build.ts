import { buildApplication } from "./build-application";

try {
  await buildApplication();
  console.log("The build is up to date.");
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}
