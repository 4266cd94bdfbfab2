import { LandmarkRule } from "@/components/readings/landmark-rule";
import { Button } from "@/components/ui/button";
import { ChoiceGroup } from "@/components/ui/choice-group";
import type { Answer, DraftFinding } from "@/lib/desk/draft-finding";
import { BEYOND_LIMBUS, DEGREES_MAX, type Degrees } from "@/lib/reflex/finding";
import { QuestionLegend } from "./question-legend";

type Part = "horizontal" | "vertical";
type Readable = Extract<DraftFinding, { isReadable: true }>;

type DegreesQuestionProps = {
  draft: Readable | null;
  onAnswer: (answer: Answer) => void;
  name: string;
  showsKeys: boolean;
};

const LANDMARKS: { value: string; degrees: Degrees; label: string; detail: string }[] = [
  { value: "15", degrees: 15, label: "15°", detail: "margin" },
  { value: "30", degrees: 30, label: "30°", detail: "midway" },
  { value: "45", degrees: 45, label: "45°", detail: "limbus" },
  { value: ">45", degrees: BEYOND_LIMBUS, label: ">45°", detail: "sclera" },
];

/** How far: the landmark, then single degrees, for each part that deviates. */
export function DegreesQuestion({ draft, onAnswer, name, showsKeys }: DegreesQuestionProps) {
  const parts = (["horizontal", "vertical"] as const).filter((part) => draft?.[part] && draft[part] !== "none");
  const shown: Part[] = parts.length > 0 ? parts : ["horizontal"];
  return (
    <div className="min-w-0">
      <p className="mb-2.5 flex items-baseline justify-between gap-3 font-serif text-h3 font-medium">
        <QuestionLegend number={4}>Degrees</QuestionLegend>
        <span className="font-sans text-note font-normal text-ink-2">reflex seen at</span>
      </p>
      <div className="grid gap-5">
        {shown.map((part) => (
          <PartDegrees
            key={part}
            part={part}
            isNamed={parts.length > 1}
            isDisabled={parts.length === 0}
            value={draft?.[`${part}Degrees`] ?? null}
            onChange={(value) => onAnswer({ question: `${part}Degrees`, value })}
            name={name}
            keyPrefix={showsKeys ? (part === "vertical" && parts.length > 1 ? "Shift " : "") : null}
          />
        ))}
      </div>
    </div>
  );
}

type PartDegreesProps = {
  part: Part;
  isNamed: boolean;
  isDisabled: boolean;
  value: Degrees | null;
  onChange: (value: Degrees) => void;
  name: string;
  keyPrefix: string | null;
};

function PartDegrees({ part, isNamed, isDisabled, value, onChange, name, keyPrefix }: PartDegreesProps) {
  const title = part === "horizontal" ? "Horizontal degrees" : "Vertical degrees";
  const chosen = LANDMARKS.find(({ degrees }) => degrees === value)?.value ?? null;
  return (
    <div className="min-w-0">
      <ChoiceGroup
        legend={title}
        legendLook={isNamed ? "label" : "hidden"}
        name={`${name}-${part}-degrees`}
        columns={4}
        isDisabled={isDisabled}
        choices={LANDMARKS.map(({ value: step, label, detail }, index) => ({
          value: step,
          label,
          detail,
          shortcut: keyPrefix === null ? undefined : `${keyPrefix}${index + 1}`,
        }))}
        value={chosen}
        onChange={(step) => {
          const landmark = LANDMARKS.find((each) => each.value === step);
          if (landmark) onChange(landmark.degrees);
        }}
      />
      {!isDisabled && (
        <div className="mt-3 grid gap-2">
          <LandmarkRule label={title} value={value} onChange={onChange} />
          <div className="flex items-center gap-2">
            <Button aria-label={`${title}: one less`} onClick={() => onChange(stepped(value, -1))}>
              −
            </Button>
            <output className="min-w-20 rounded-control border border-edge px-3 py-2.5 text-center font-mono font-medium">
              {value === null ? "–" : `${value}°`}
            </output>
            <Button aria-label={`${title}: one more`} onClick={() => onChange(stepped(value, 1))}>
              +
            </Button>
          </div>
        </div>
      )}
    </div>
  );
}

/** One degree up or down; past the last one lies beyond the limbus. */
function stepped(value: Degrees | null, by: 1 | -1): Degrees {
  if (value === null) return 15;
  if (value === BEYOND_LIMBUS) return by === 1 ? BEYOND_LIMBUS : DEGREES_MAX;
  const next = Math.max(1, value + by);
  return next > DEGREES_MAX ? BEYOND_LIMBUS : next;
}
