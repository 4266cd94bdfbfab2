import { run } from "graphile-worker";
import { env } from "@/lib/env";
import { TASKS } from "@/lib/jobs/tasks";

/** Runs background work until it is told to stop. Any number of workers may run; each job is handed to one of them. */
const runner = await run({
  connectionString: env().DATABASE_URL,
  concurrency: 2,
  pollInterval: 1000,
  noHandleSignals: false,
  taskList: TASKS,
});
await runner.promise;
