import { Button } from "@/components/ui/button";
import { ChoiceGroup } from "@/components/ui/choice-group";
import type { Answer } from "@/lib/desk/draft-finding";
import { UNREADABLE_REASONS, type UnreadableReason } from "@/lib/reflex/finding";
import { UNREADABLE_REASON_WORDS } from "@/lib/reflex/unreadable-reason-words";

type UnreadableQuestionProps = {
  reason: UnreadableReason | undefined;
  onAnswer: (answer: Answer) => void;
  name?: string;
  showsKeys?: boolean;
};

/** Why a photograph cannot be read: an answer of its own, with its own agreement. */
export function UnreadableQuestion({ reason, onAnswer, name = "finding", showsKeys = false }: UnreadableQuestionProps) {
  return (
    <div>
      <ChoiceGroup
        legend="Not readable: why?"
        legendLook="question"
        name={`${name}-reason`}
        layout="rows"
        columns={2}
        choices={UNREADABLE_REASONS.map((value, index) => ({
          value,
          label: capitalise(UNREADABLE_REASON_WORDS[value]),
          shortcut: showsKeys ? String(index + 1) : undefined,
        }))}
        value={reason ?? null}
        onChange={(value) => onAnswer({ question: "reason", value })}
      />
      <Button kind="bare" className="mt-3" onClick={() => onAnswer({ question: "readable", value: true })}>
        It can be read after all
      </Button>
    </div>
  );
}

function capitalise(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
