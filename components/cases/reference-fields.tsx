"use client";

import { FindingQuestions } from "@/components/desk/finding-questions";
import { Readback } from "@/components/desk/readback";
import { UnreadableQuestion } from "@/components/desk/unreadable-question";
import { Button } from "@/components/ui/button";
import { Field, FieldError } from "@/components/ui/field";
import { Select } from "@/components/ui/select";
import { TextInput } from "@/components/ui/text-input";
import { REFERENCE_BASES, REFERENCE_BASIS_NAMES } from "@/lib/cases/schema";
import { type Answer, answer, completeDraft, type DraftFinding, EMPTY_DRAFT } from "@/lib/desk/draft-finding";

export type ReferenceDraft = { finding: DraftFinding; basis: string; uncertainty: string };

export const EMPTY_REFERENCE: ReferenceDraft = { finding: EMPTY_DRAFT, basis: "", uncertainty: "" };

/** The reference as it is sent. What is missing stays missing, so that the server says what to change. */
export function toReference({ finding, basis, uncertainty }: ReferenceDraft) {
  const complete = completeDraft(finding);
  return {
    finding: "finding" in complete ? complete.finding : undefined,
    basis: basis || undefined,
    uncertaintyDegrees: uncertainty.trim() === "" ? null : Number(uncertainty.replace(",", ".")),
  };
}

type ReferenceFieldsProps = {
  value: ReferenceDraft;
  onChange: (value: ReferenceDraft) => void;
  errorOf: (field: string) => string | undefined;
};

const BASIS_OPTIONS = [
  { value: "", label: "Choose…" },
  ...REFERENCE_BASES.map((basis) => ({ value: basis, label: REFERENCE_BASIS_NAMES[basis] })),
];

/** The assigned reading of a case, what it rests on, and how sure it is. */
export function ReferenceFields({ value, onChange, errorOf }: ReferenceFieldsProps) {
  const { finding } = value;
  const give = (given: Answer) => onChange({ ...value, finding: answer(finding, given) });
  return (
    <div className="grid gap-5">
      {finding.isReadable ? (
        <>
          <FindingQuestions draft={finding} onAnswer={give} name="reference" />
          <div>
            <Button size="slim" onClick={() => give({ question: "readable", value: false })}>
              The photograph cannot be read
            </Button>
          </div>
        </>
      ) : (
        <UnreadableQuestion reason={finding.reason} onAnswer={give} name="reference" />
      )}
      <Readback draft={finding} />
      {errorOf("finding") && <FieldError>Complete the reference: {missingText(finding)}.</FieldError>}
      <div className="grid gap-4 sm:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
        <Field label="Rests on" error={errorOf("basis")}>
          {(wiring) => (
            <Select
              {...wiring}
              options={BASIS_OPTIONS}
              value={value.basis}
              onChange={(event) => onChange({ ...value, basis: event.target.value })}
            />
          )}
        </Field>
        <Field
          label="Uncertainty, degrees"
          isOptional
          hint="One standard deviation."
          error={errorOf("uncertaintyDegrees")}
        >
          {(wiring) => (
            <TextInput
              {...wiring}
              isMeasured
              unit="°"
              inputMode="decimal"
              value={value.uncertainty}
              onChange={(event) => onChange({ ...value, uncertainty: event.target.value })}
            />
          )}
        </Field>
      </div>
    </div>
  );
}

function missingText(finding: DraftFinding): string {
  const complete = completeDraft(finding);
  return "missing" in complete ? complete.missing.join(", ") : "check its parts";
}
