"use client";

import { useRouter } from "next/navigation";
import { z } from "zod";
import type { View } from "@/lib/auth/view";
import { sendJson } from "@/lib/http/fetch-json";

const SwitchAnswer = z.object({ landing: z.string() });

/** Takes another role or department and goes to its first page. */
export function useTakeView(): (view: View) => Promise<void> {
  const router = useRouter();
  return async (view) => {
    const { landing } = await sendJson("PUT", "/api/view", view, SwitchAnswer);
    router.push(landing);
    router.refresh();
  };
}
