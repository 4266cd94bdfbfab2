import { ChoiceGroup } from "@/components/ui/choice-group";
import type { Answer, DraftFinding } from "@/lib/desk/draft-finding";
import type { ReadableFinding } from "@/lib/reflex/finding";
import { DegreesQuestion } from "./degrees-question";
import { QuestionLegend } from "./question-legend";

type FindingQuestionsProps = {
  draft: DraftFinding;
  onAnswer: (answer: Answer) => void;
  /** Two or more desks of questions on one page need names of their own. */
  name?: string;
  /** At the desk: with the keys that answer, and arranged for a wide screen. */
  isDesk?: boolean;
};

const EYES = [
  { value: "right", label: "Right", shortcut: "R" },
  { value: "left", label: "Left", shortcut: "L" },
  { value: "none", label: "Neither", detail: "the reflexes sit alike", shortcut: "N" },
] as const satisfies readonly { value: ReadableFinding["eye"]; label: string; detail?: string; shortcut: string }[];

const HORIZONTALS = [
  { value: "eso", label: "Eso", detail: "turned in", shortcut: "E" },
  { value: "exo", label: "Exo", detail: "turned out", shortcut: "X" },
  { value: "none", label: "None", shortcut: "S" },
] as const;

const VERTICALS = [
  { value: "hyper", label: "Hyper", detail: "turned up", shortcut: "U" },
  { value: "hypo", label: "Hypo", detail: "turned down", shortcut: "D" },
  { value: "none", label: "None", shortcut: "V" },
] as const;

/** The four questions of a readable finding: eye, horizontal, vertical, degrees. The desk and the reference share them. */
export function FindingQuestions({ draft, onAnswer, name = "finding", isDesk = false }: FindingQuestionsProps) {
  const readable = draft.isReadable ? draft : null;
  const keyed = <Value extends { shortcut: string }>(choices: readonly Value[]) =>
    choices.map((choice) => (isDesk ? choice : { ...choice, shortcut: undefined }));
  const isAligned = readable?.eye === "none";
  return (
    <>
      <ChoiceGroup
        legend={<QuestionLegend number={1}>Which eye deviates?</QuestionLegend>}
        legendLook="question"
        name={`${name}-eye`}
        columns={isDesk ? "desk-pair" : 3}
        choices={keyed(EYES)}
        value={readable?.eye ?? null}
        onChange={(value) => onAnswer({ question: "eye", value })}
      />
      <ChoiceGroup
        legend={<QuestionLegend number={2}>Horizontal</QuestionLegend>}
        legendLook="question"
        name={`${name}-horizontal`}
        columns={isDesk ? "desk-pair" : 3}
        choices={keyed(HORIZONTALS)}
        value={readable?.horizontal ?? null}
        onChange={(value) => onAnswer({ question: "horizontal", value })}
        className={isAligned ? "opacity-60" : undefined}
      />
      <ChoiceGroup
        legend={<QuestionLegend number={3}>Vertical</QuestionLegend>}
        legendLook="question"
        name={`${name}-vertical`}
        columns={isDesk ? "desk-stack" : 3}
        choices={keyed(VERTICALS)}
        value={readable?.vertical ?? null}
        onChange={(value) => onAnswer({ question: "vertical", value })}
        className={isAligned ? "opacity-60" : undefined}
      />
      <DegreesQuestion draft={readable} onAnswer={onAnswer} name={name} showsKeys={isDesk} />
    </>
  );
}
