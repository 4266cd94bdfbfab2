"use client";

import { useRouter } from "next/navigation";
import { type FormEvent, useState } from "react";
import { z } from "zod";
import { Button } from "@/components/ui/button";
import { Field } from "@/components/ui/field";
import { TextInput } from "@/components/ui/text-input";
import { asProblemError, sendJson } from "@/lib/http/fetch-json";

const Created = z.object({ id: z.uuid() });

/** Starts a draft and goes on to compose it. */
export function NewRoundForm({ nextNumber }: { nextNumber: number }) {
  const router = useRouter();
  const [error, setError] = useState<string | null>(null);
  const [isBusy, setIsBusy] = useState(false);

  async function create(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const title = new FormData(event.currentTarget).get("title");
    setIsBusy(true);
    try {
      const { id } = await sendJson("POST", "/api/rounds", { title }, Created);
      router.push(`/rounds/${id}/compose`);
    } catch (thrown) {
      const problem = asProblemError(thrown);
      setError(problem.fieldError("title") ?? problem.message);
      setIsBusy(false);
    }
  }

  return (
    <form onSubmit={create} className="flex flex-wrap items-end gap-2">
      <Field label={`Title of round ${nextNumber}`} error={error}>
        {(wiring) => <TextInput {...wiring} name="title" maxLength={80} className="sm:w-72" />}
      </Field>
      <Button kind="main" type="submit" isBusy={isBusy}>
        Start a draft
      </Button>
    </form>
  );
}
