"use client";

import useSWR from "swr";
import { fetchJson, type ProblemError } from "@/lib/http/fetch-json";
import { type RoundProgress, RoundProgressSchema } from "@/lib/rounds/schema";

const REFRESH_MS = 5_000;

export const roundProgressKey = (roundId: string) => `/api/rounds/${roundId}/progress`;

/** Who has read how many, kept fresh while the page is looked at. */
export function useRoundProgress(roundId: string, initial: RoundProgress) {
  return useSWR<RoundProgress, ProblemError>(
    roundProgressKey(roundId),
    (url: string) => fetchJson(url, RoundProgressSchema),
    { fallbackData: initial, refreshInterval: REFRESH_MS },
  );
}
