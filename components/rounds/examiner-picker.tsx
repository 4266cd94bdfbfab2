import { Button } from "@/components/ui/button";
import { Checkbox } from "@/components/ui/checkbox";
import { FieldError } from "@/components/ui/field";
import { ROLE_NAMES } from "@/lib/auth/roles";
import type { PersonSummary } from "@/lib/people/schema";

type ExaminerPickerProps = {
  people: PersonSummary[];
  chosen: string[];
  onChange: (ids: string[]) => void;
  error: string | undefined;
};

/** Who reads. Leads know the references and are not offered. */
export function ExaminerPicker({ people, chosen, onChange, error }: ExaminerPickerProps) {
  const readers = people.filter(({ readsAs, isDisabled }) => readsAs && !isDisabled);
  const toggle = (id: string) => onChange(chosen.includes(id) ? chosen.filter((each) => each !== id) : [...chosen, id]);
  return (
    <fieldset>
      <legend className="mb-1 font-serif text-h3 font-medium">Examiners</legend>
      <div className="flex flex-wrap items-center justify-between gap-2">
        <p className="text-small text-ink-2">
          {chosen.length} of {readers.length} chosen. Leads know the references and cannot read blind.
        </p>
        <Button kind="bare" size="slim" onClick={() => onChange(readers.map(({ id }) => id))}>
          Choose all
        </Button>
      </div>
      {error && <FieldError>{error}</FieldError>}
      <ul className="grid sm:grid-cols-2 sm:gap-x-6">
        {readers.map(({ id, name, readsAs }) => (
          <li key={id}>
            <Checkbox
              label={
                <>
                  {name}{" "}
                  {readsAs === "trainee" && (
                    <span className="text-small text-ink-2">{ROLE_NAMES.trainee.toLowerCase()}</span>
                  )}
                </>
              }
              checked={chosen.includes(id)}
              onChange={() => toggle(id)}
            />
          </li>
        ))}
      </ul>
    </fieldset>
  );
}
