import { Field } from "@/components/ui/field";
import { zoneName } from "@/components/ui/format-time";
import { Select } from "@/components/ui/select";
import { TextInput } from "@/components/ui/text-input";
import { Textarea } from "@/components/ui/textarea";
import { countKind, setRepeats } from "@/lib/rounds/compose-items";
import type { ItemKind, RoundDraft } from "@/lib/rounds/schema";
import { fromZonedInput, toZonedInput } from "@/lib/time/zoned";

type RoundFieldsProps = {
  draft: RoundDraft;
  zone: string;
  onChange: (part: Partial<RoundDraft>) => void;
  errorOf: (field: string) => string | undefined;
};

/** What a round is called, when it is open, and what its examiners are told. */
export function RoundFields({ draft, zone, onChange, errorOf }: RoundFieldsProps) {
  const repeatField = (kind: Exclude<ItemKind, "first">, label: string, hint: string) => (
    <Field label={label} hint={hint}>
      {(wiring) => (
        <Select
          {...wiring}
          options={repeatOptions(countKind(draft.items, "first"))}
          value={String(countKind(draft.items, kind))}
          onChange={(event) =>
            onChange({ items: setRepeats(draft.items, kind, Number(event.target.value), Math.random) })
          }
        />
      )}
    </Field>
  );
  return (
    <div className="grid gap-4">
      <Field label="Title" error={errorOf("title")}>
        {(wiring) => (
          <TextInput
            {...wiring}
            value={draft.title}
            maxLength={80}
            onChange={(event) => onChange({ title: event.target.value })}
          />
        )}
      </Field>
      <div className="grid gap-4 sm:grid-cols-2">
        <MomentField
          label="Opens"
          value={draft.opensAt}
          zone={zone}
          error={errorOf("opensAt")}
          onChange={(opensAt) => onChange({ opensAt })}
        />
        <MomentField
          label="Closes"
          value={draft.closesAt}
          zone={zone}
          error={errorOf("closesAt")}
          onChange={(closesAt) => onChange({ closesAt })}
        />
        {repeatField("repeat", "Shown twice", "Hidden repeats, for each examiner’s repeatability.")}
        {repeatField("mirrored", "Shown mirrored as well", "Flipped left to right; the expected eye changes.")}
      </div>
      <Field label="Instructions" isOptional error={errorOf("instructions")}>
        {(wiring) => (
          <Textarea
            {...wiring}
            value={draft.instructions}
            maxLength={2000}
            onChange={(event) => onChange({ instructions: event.target.value })}
          />
        )}
      </Field>
      {errorOf("items") && <p className="text-small text-oxide">{errorOf("items")}</p>}
    </div>
  );
}

type MomentFieldProps = {
  label: string;
  value: string | null;
  zone: string;
  error: string | undefined;
  onChange: (iso: string | null) => void;
};

/** A day and time in the department's time zone. */
function MomentField({ label, value, zone, error, onChange }: MomentFieldProps) {
  return (
    <Field label={label} hint={zoneName(zone)} error={error}>
      {(wiring) => (
        <TextInput
          {...wiring}
          type="datetime-local"
          isMeasured
          defaultValue={value ? toZonedInput(value, zone) : ""}
          onChange={(event) => onChange(fromZonedInput(event.target.value, zone))}
        />
      )}
    </Field>
  );
}

function repeatOptions(caseCount: number) {
  return Array.from({ length: Math.min(10, caseCount) + 1 }, (_, count) => ({
    value: String(count),
    label: count === 0 ? "none" : count === 1 ? "1 case" : `${count} cases`,
  }));
}
