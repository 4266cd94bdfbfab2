"use client";

import { useEffect, useRef, useState } from "react";
import { asProblemError, type ProblemError, sendJson } from "@/lib/http/fetch-json";
import { type RoundDetail, RoundDetailSchema, type RoundDraft } from "@/lib/rounds/schema";

const WAIT_MS = 700;

export type DraftState = { kind: "saved"; at: string } | { kind: "saving" } | { kind: "failed"; error: ProblemError };

function toDraft({ title, instructions, opensAt, closesAt, items, examinerIds }: RoundDetail): RoundDraft {
  return { title, instructions, opensAt, closesAt, items, examinerIds };
}

/** A draft that is stored shortly after each change. Saves follow each other, so that the last change wins. */
export function useDraft(round: RoundDetail) {
  const [draft, setDraft] = useState(() => toDraft(round));
  const [state, setState] = useState<DraftState>({ kind: "saved", at: round.updatedAt });
  const queue = useRef<Promise<boolean>>(Promise.resolve(true));
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);

  function save(changed: RoundDraft): Promise<boolean> {
    clearTimeout(timer.current);
    queue.current = queue.current.then(async () => {
      setState({ kind: "saving" });
      try {
        const stored = await sendJson("PUT", `/api/rounds/${round.id}`, changed, RoundDetailSchema);
        setState({ kind: "saved", at: stored.updatedAt });
        return true;
      } catch (error) {
        setState({ kind: "failed", error: asProblemError(error) });
        return false;
      }
    });
    return queue.current;
  }

  function change(part: Partial<RoundDraft>) {
    const changed = { ...draft, ...part };
    setDraft(changed);
    clearTimeout(timer.current);
    timer.current = setTimeout(() => save(changed), WAIT_MS);
  }

  useEffect(() => () => clearTimeout(timer.current), []);

  return { draft, change, state, saveNow: () => save(draft) };
}
