"use client";

import { useRouter } from "next/navigation";
import { type FormEvent, useState } from "react";
import { z } from "zod";
import { Button } from "@/components/ui/button";
import { Checkbox } from "@/components/ui/checkbox";
import { ChoiceGroup } from "@/components/ui/choice-group";
import { Field } from "@/components/ui/field";
import { Notice, Remark } from "@/components/ui/notice";
import { TextInput } from "@/components/ui/text-input";
import { Textarea } from "@/components/ui/textarea";
import { asProblemError, type ProblemError, sendForm } from "@/lib/http/fetch-json";
import { PhotographField } from "./photograph-field";
import { EMPTY_REFERENCE, ReferenceFields, toReference } from "./reference-fields";

const Created = z.object({ id: z.uuid() });

/** A photograph, a code and a reference. A refusal changes nothing that was entered. */
export function NewCaseForm() {
  const router = useRouter();
  const [file, setFile] = useState<File | null>(null);
  const [reference, setReference] = useState(EMPTY_REFERENCE);
  const [error, setError] = useState<ProblemError | null>(null);
  const [isBusy, setIsBusy] = useState(false);

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const fields = new FormData(event.currentTarget);
    const form = new FormData();
    const input = {
      code: fields.get("code"),
      note: fields.get("note"),
      isAnchor: fields.get("isAnchor") === "on",
      consent: fields.get("consent") ?? undefined,
      reference: toReference(reference),
    };
    form.set("case", JSON.stringify(input));
    if (file) form.set("photograph", file);
    setIsBusy(true);
    setError(null);
    try {
      const { id } = await sendForm("POST", "/api/cases", form, Created);
      router.push(`/cases/${id}`);
      router.refresh();
    } catch (thrown) {
      setError(asProblemError(thrown));
      setIsBusy(false);
    }
  }

  return (
    <form onSubmit={submit} className="grid gap-x-11 gap-y-7 lg:grid-cols-2" noValidate>
      <div className="grid content-start gap-5">
        <PhotographField file={file} onChange={setFile} error={error?.fieldError("photograph")} />
        <ChoiceGroup
          legend="Consent"
          name="consent"
          layout="rows"
          columns={1}
          choices={[
            { value: "patient-consent", label: "The patient consented to this use" },
            { value: "drawn", label: "The eyes are drawn; nobody is shown" },
          ]}
          error={error?.fieldError("consent")}
        />
        <Remark tone="warn">
          <b>Photographs of people only with consent for this use, cropped to the eyes.</b> Metadata is removed here. A
          photograph with an unequal or white pupil reflex, or a new squint, goes to a clinician promptly, outside this
          program.
        </Remark>
        <Field label="Code" hint="As you find it again, such as 031." error={error?.fieldError("code")}>
          {(wiring) => <TextInput {...wiring} name="code" isMeasured maxLength={24} className="max-w-48" />}
        </Field>
        <Field label="Note" isOptional error={error?.fieldError("note")}>
          {(wiring) => <Textarea {...wiring} name="note" maxLength={500} />}
        </Field>
        <Checkbox
          name="isAnchor"
          label="Anchor case"
          hint="Returns from round to round, so that drift is not taken for a harder set."
        />
      </div>
      <div className="grid content-start gap-5">
        <h2 className="text-h2">Reference</h2>
        <ReferenceFields
          value={reference}
          onChange={setReference}
          errorOf={(field) => error?.fieldError(`reference/${field}`)}
        />
        {error && (
          <Notice tone="bad" title="The case was not added.">
            {error.problem.detail ?? error.problem.title}
          </Notice>
        )}
        <div>
          <Button kind="main" type="submit" isBusy={isBusy}>
            {isBusy ? "Adding the case…" : "Add the case"}
          </Button>
        </div>
      </div>
    </form>
  );
}
