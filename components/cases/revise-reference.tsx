"use client";

import { type FormEvent, useState } from "react";
import { Button } from "@/components/ui/button";
import { Field } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Textarea } from "@/components/ui/textarea";
import { type CaseDetail, CaseDetailSchema } from "@/lib/cases/schema";
import { fromFinding } from "@/lib/desk/draft-finding";
import { asProblemError, type ProblemError, sendJson } from "@/lib/http/fetch-json";
import { ReferenceFields, toReference } from "./reference-fields";

type ReviseReferenceProps = { detail: CaseDetail; onRevised: (detail: CaseDetail) => void };

/** Gives the case a new reference, with the reason; closed rounds that show it get new results beside the old ones. */
export function ReviseReference({ detail, onRevised }: ReviseReferenceProps) {
  const [isOpen, setIsOpen] = useState(false);
  const [current] = detail.references;
  const [value, setValue] = useState({
    finding: fromFinding(detail.finding),
    basis: current?.basis ?? "",
    uncertainty: current?.uncertaintyDegrees?.toString() ?? "",
  });
  const [reason, setReason] = useState("");
  const [error, setError] = useState<ProblemError | null>(null);
  const [isBusy, setIsBusy] = useState(false);

  async function submit(event: FormEvent) {
    event.preventDefault();
    setIsBusy(true);
    setError(null);
    try {
      const body = { ...toReference(value), reason };
      onRevised(await sendJson("POST", `/api/cases/${detail.id}/references`, body, CaseDetailSchema));
      setIsOpen(false);
      setReason("");
    } catch (thrown) {
      setError(asProblemError(thrown));
    } finally {
      setIsBusy(false);
    }
  }

  if (!isOpen) {
    return (
      <div>
        <Button onClick={() => setIsOpen(true)}>Change the reference…</Button>
      </div>
    );
  }
  return (
    <form onSubmit={submit} className="grid gap-5 border-t border-hair pt-5" noValidate>
      <ReferenceFields value={value} onChange={setValue} errorOf={(field) => error?.fieldError(field)} />
      <Field
        label="Why it changes"
        hint="Rounds already closed get a new revision of their results; the old one stays."
        error={error?.fieldError("reason")}
      >
        {(wiring) => (
          <Textarea {...wiring} value={reason} maxLength={500} onChange={(event) => setReason(event.target.value)} />
        )}
      </Field>
      {error && (
        <Notice tone="bad" title="The reference was not changed.">
          {error.problem.detail}
        </Notice>
      )}
      <div className="flex flex-wrap gap-2">
        <Button onClick={() => setIsOpen(false)}>Keep it</Button>
        <Button kind="main" type="submit" isBusy={isBusy}>
          Store the new reference
        </Button>
      </div>
    </form>
  );
}
