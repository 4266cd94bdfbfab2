"use client";

import { useEffect, useState } from "react";
import { Field } from "@/components/ui/field";

type PhotographFieldProps = { file: File | null; onChange: (file: File | null) => void; error: string | undefined };

/** Chooses a photograph and shows it before it is sent. */
export function PhotographField({ file, onChange, error }: PhotographFieldProps) {
  const preview = useObjectUrl(file);
  return (
    <div>
      <Field label="Photograph" hint="JPEG, PNG or WebP; up to 20 MB and 50 megapixels." error={error}>
        {(wiring) => (
          <input
            {...wiring}
            type="file"
            accept="image/jpeg,image/png,image/webp"
            onChange={(event) => onChange(event.target.files?.[0] ?? null)}
            className="block w-full text-small file:mr-3 file:min-h-touch file:rounded-control file:border file:border-solid file:border-edge file:bg-sheet file:px-4 file:font-medium file:text-ink hover:file:border-ink"
          />
        )}
      </Field>
      {preview && (
        <div className="mt-3 bg-field p-3">
          {/* biome-ignore lint/performance/noImgElement: the chosen file itself is shown, before it is sent */}
          <img src={preview} alt="The chosen file" className="mx-auto block max-h-72 max-w-full" />
        </div>
      )}
    </div>
  );
}

/** An address for a local file, given back when the file changes. */
function useObjectUrl(file: File | null): string | null {
  const [url, setUrl] = useState<string | null>(null);
  useEffect(() => {
    if (!file) return setUrl(null);
    const made = URL.createObjectURL(file);
    setUrl(made);
    return () => URL.revokeObjectURL(made);
  }, [file]);
  return url;
}
