"use client";

import useSWR from "swr";
import { type DeskSheet, DeskSheetSchema } from "@/lib/desk/schema";
import { fetchJson, type ProblemError } from "@/lib/http/fetch-json";

export const deskSheetKey = (roundId: string) => `/api/desk/rounds/${roundId}`;

/** A round in one's own order, fetched anew when a page opens; while one reads it changes only by what is done here. */
export function useDeskSheet(roundId: string, initial: DeskSheet) {
  return useSWR<DeskSheet, ProblemError>(deskSheetKey(roundId), (url: string) => fetchJson(url, DeskSheetSchema), {
    fallbackData: initial,
    revalidateOnFocus: false,
  });
}
