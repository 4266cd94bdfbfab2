"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { type CaseChange, type CaseDetail, CaseDetailSchema } from "@/lib/cases/schema";
import { asProblemError, type Problem, sendJson } from "@/lib/http/fetch-json";

type CaseActionsProps = { detail: CaseDetail; onChange: (detail: CaseDetail) => void };

/** Anchor and retirement; both can be taken back. */
export function CaseActions({ detail, onChange }: CaseActionsProps) {
  const [problem, setProblem] = useState<Problem | null>(null);

  async function change(part: CaseChange) {
    setProblem(null);
    try {
      onChange(await sendJson("PATCH", `/api/cases/${detail.id}`, part, CaseDetailSchema));
    } catch (error) {
      setProblem(asProblemError(error).problem);
    }
  }

  return (
    <>
      {problem && (
        <Notice tone="bad" title="The case was not changed.">
          {problem.detail}
        </Notice>
      )}
      <Button onClick={() => change({ isAnchor: !detail.isAnchor })}>
        {detail.isAnchor ? "No longer an anchor" : "Make it an anchor"}
      </Button>
      <Button onClick={() => change({ isRetired: !detail.isRetired })}>
        {detail.isRetired ? "Bring it back" : "Retire"}
      </Button>
    </>
  );
}
