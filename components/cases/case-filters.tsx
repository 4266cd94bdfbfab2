import { Search } from "lucide-react";
import { Button } from "@/components/ui/button";
import { FilterChipLink, FilterChips } from "@/components/ui/filter-chips";
import { TextInput } from "@/components/ui/text-input";
import { CASE_KIND_NAMES } from "@/lib/cases/case-kind";
import { CASE_KINDS, type CaseFilter } from "@/lib/cases/schema";

/** Filters kept in the address, so that a filtered library can be shared and Back works. */
export function CaseFilters({ filter }: { filter: CaseFilter }) {
  const hrefWith = (part: Partial<CaseFilter>) => {
    const wanted = { ...filter, ...part };
    const query = new URLSearchParams();
    for (const [key, value] of Object.entries(wanted)) if (value) query.set(key, value);
    return query.size > 0 ? `/cases?${query}` : "/cases";
  };
  const chip = (label: string, isOn: boolean, on: Partial<CaseFilter>, off: Partial<CaseFilter>) => (
    <FilterChipLink key={label} label={label} isOn={isOn} href={hrefWith(isOn ? off : on)} />
  );
  return (
    <div className="mb-6 flex flex-wrap items-end gap-x-6 gap-y-4">
      <form action="/cases" className="flex items-end gap-2">
        {filter.kind && <input type="hidden" name="kind" value={filter.kind} />}
        {filter.anchors && <input type="hidden" name="anchors" value={filter.anchors} />}
        {filter.retired && <input type="hidden" name="retired" value={filter.retired} />}
        <TextInput
          name="q"
          defaultValue={filter.q}
          placeholder="Code or note"
          aria-label="Find a case"
          className="w-52"
        />
        <Button type="submit" icon={Search}>
          Find
        </Button>
      </form>
      <FilterChips label="Show only">
        {CASE_KINDS.map((kind) => chip(CASE_KIND_NAMES[kind], filter.kind === kind, { kind }, { kind: undefined }))}
        {chip("Anchors", filter.anchors === "only", { anchors: "only" }, { anchors: undefined })}
        {chip("Retired", filter.retired === "only", { retired: "only" }, { retired: undefined })}
      </FilterChips>
    </div>
  );
}
