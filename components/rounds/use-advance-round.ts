"use client";

import { useState } from "react";
import { asProblemError, type Problem, sendJson } from "@/lib/http/fetch-json";
import { RoundDetailSchema } from "@/lib/rounds/schema";

/** Moves a round one step. Answers whether it moved; a refusal is kept to be shown. */
export function useAdvanceRound(roundId: string) {
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<Problem | null>(null);

  async function advance(to: "closed" | "released"): Promise<boolean> {
    setIsBusy(true);
    setProblem(null);
    try {
      await sendJson("PUT", `/api/rounds/${roundId}/state`, { to }, RoundDetailSchema);
      return true;
    } catch (error) {
      setProblem(asProblemError(error).problem);
      return false;
    } finally {
      setIsBusy(false);
    }
  }

  return { isBusy, problem, advance };
}
