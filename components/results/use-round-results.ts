"use client";

import useSWR from "swr";
import { fetchJson, type ProblemError } from "@/lib/http/fetch-json";
import { type RoundResults, RoundResultsAnswerSchema } from "@/lib/results/schema";

const WAIT_MS = 2_000;

type Answer = { results: RoundResults | null };

/** Stored results do not change, so they are asked for again only while they are still being computed. */
export function useRoundResults(roundId: string, initial: RoundResults | null) {
  return useSWR<Answer, ProblemError>(
    `/api/rounds/${roundId}/results`,
    (url: string) => fetchJson(url, RoundResultsAnswerSchema),
    {
      fallbackData: { results: initial },
      revalidateOnFocus: false,
      revalidateOnMount: false,
      refreshInterval: (latest) => (latest?.results ? 0 : WAIT_MS),
    },
  );
}
