import "server-only";
import type { TaskList } from "graphile-worker";
import { z } from "zod";
import { database } from "@/lib/database";
import { computeResults } from "@/lib/results/compute-results";
import { closeWhenDue } from "@/lib/rounds/advance-round";

const CloseRound = z.object({ roundId: z.uuid() });
const ComputeResults = z.object({ roundId: z.uuid(), reason: z.string() });

/** What the worker does. Every task may be run again: after a crash the queue hands it out once more. */
export const TASKS: TaskList = {
  "close-round": (payload) => closeWhenDue(database(), CloseRound.parse(payload).roundId),
  "compute-results": (payload) => {
    const { roundId, reason } = ComputeResults.parse(payload);
    return computeResults(database(), roundId, reason);
  },
};
