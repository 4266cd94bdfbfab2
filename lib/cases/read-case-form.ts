import { AppError, invalidField } from "@/lib/errors";
import { parseShape } from "@/lib/http/parse";
import type { Upload } from "./create-case";
import { NewCase } from "./schema";

/** What a form may weigh: the largest photograph and its fields. */
const FORM_BYTES_MAX = 20_200_000;

/** Reads the upload form: the file `photograph` and the JSON field `case`. Throws an AppError that says what to change. */
export async function readCaseForm(request: Request): Promise<{ input: NewCase; upload: Upload }> {
  if (Number(request.headers.get("content-length") ?? 0) > FORM_BYTES_MAX) {
    throw new AppError("too-large", "photograph-too-large", "The file is over 20 MB. Save the photograph smaller.");
  }
  const form = await request.formData().catch(() => {
    throw new AppError("malformed", "not-a-form", "The request is not a form with a photograph.");
  });
  const input = parseShape(parseField(form.get("case")), NewCase);
  const file = form.get("photograph");
  if (!(file instanceof File) || file.size === 0) throw invalidField("photograph", "Choose a photograph to upload.");
  return { input, upload: { name: file.name, body: new Uint8Array(await file.arrayBuffer()) } };
}

function parseField(field: FormDataEntryValue | null): unknown {
  try {
    return JSON.parse(typeof field === "string" ? field : "");
  } catch {
    throw new AppError("malformed", "not-json", "The field “case” is not JSON.");
  }
}
