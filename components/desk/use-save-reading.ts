"use client";

import { useState } from "react";
import type { KeyedMutator } from "swr";
import { type DeskItem, type DeskSheet, type ReadingInput, SavedReadingSchema } from "@/lib/desk/schema";
import { asProblemError, type Problem, sendJson } from "@/lib/http/fetch-json";

export type SaveState =
  | { kind: "idle" | "saving" }
  | { kind: "saved"; at: string }
  | { kind: "failed"; problem: Problem };

type Reading = Omit<ReadingInput, "saveId" | "revision">;

/** Saves a reading and puts it into the sheet. Answers whether it was saved; a failure keeps everything as it was. */
export function useSaveReading(mutate: KeyedMutator<DeskSheet>) {
  const [state, setState] = useState<SaveState>({ kind: "idle" });

  async function save(item: DeskItem, reading: Reading): Promise<boolean> {
    setState({ kind: "saving" });
    const input: ReadingInput = {
      ...reading,
      saveId: crypto.randomUUID(),
      revision: (item.reading?.revision ?? 0) + 1,
    };
    try {
      const saved = await sendJson("PUT", `/api/desk/items/${item.id}/reading`, input, SavedReadingSchema);
      await mutate((sheet) => sheet && withReading(sheet, item.id, saved), { revalidate: false });
      setState({ kind: "saved", at: saved.savedAt });
      return true;
    } catch (error) {
      setState({ kind: "failed", problem: asProblemError(error).problem });
      return false;
    }
  }

  return { state, save };
}

function withReading(sheet: DeskSheet, itemId: string, reading: NonNullable<DeskItem["reading"]>): DeskSheet {
  const items = sheet.items.map((item) => (item.id === itemId ? { ...item, reading } : item));
  return { ...sheet, items, readCount: items.filter((item) => item.reading).length };
}
