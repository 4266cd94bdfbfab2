import { leftExo } from "./world";

/** The fields of a sound new case, some of them replaced. */
export function caseFields(changes: Record<string, unknown> = {}): Record<string, unknown> {
  return { code: "C-100", consent: "drawn", reference: { finding: leftExo(20), basis: "panel" }, ...changes };
}

/** The upload form as a browser sends it. */
export function caseForm(fields: unknown, photograph?: Uint8Array, name = "photograph.jpg"): FormData {
  const form = new FormData();
  form.set("case", typeof fields === "string" ? fields : JSON.stringify(fields));
  if (photograph) form.set("photograph", new File([new Uint8Array(photograph)], name));
  return form;
}
