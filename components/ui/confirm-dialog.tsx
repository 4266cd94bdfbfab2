"use client";

import { type ReactNode, useState } from "react";
import { Button } from "./button";
import { Dialog } from "./dialog";
import { Field } from "./field";
import { Notice } from "./notice";
import { TextInput } from "./text-input";

type ConfirmDialogProps = {
  isOpen: boolean;
  /** Asks, and names what it is about: "Close round 12 and release it?" */
  title: string;
  children: ReactNode;
  /** What will happen, with numbers. */
  consequences: readonly string[];
  /** What must be typed before the act is possible, such as the number of the round. */
  typed?: { label: string; word: string };
  /** The safe choice, said as what stays: "Keep it open". */
  keepLabel: string;
  actLabel: string;
  onKeep: () => void;
  onAct: () => void;
  isBusy?: boolean;
  /** Why the act did not happen, and what is safe. */
  error?: { title: string; detail?: string } | null;
};

/** For what cannot be undone, and nothing else. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  return (
    <Dialog isOpen={props.isOpen} onClose={props.onKeep} title={props.title}>
      <ConfirmForm {...props} />
    </Dialog>
  );
}

/** A part of its own, so that what was typed is gone when the dialog opens again. */
function ConfirmForm(props: ConfirmDialogProps) {
  const { children, consequences, typed, keepLabel, actLabel, onKeep, onAct, isBusy = false, error } = props;
  const [text, setText] = useState("");
  const isConfirmed = !typed || text.trim().toLowerCase() === typed.word.toLowerCase();
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault();
        if (isConfirmed && !isBusy) onAct();
      }}
    >
      <p>{children}</p>
      <ul className="my-2.5 mb-4 list-disc pl-5 text-ink-2">
        {consequences.map((consequence) => (
          <li key={consequence}>{consequence}</li>
        ))}
      </ul>
      {typed && (
        <Field label={typed.label}>
          {(wiring) => (
            <TextInput
              {...wiring}
              value={text}
              onChange={(event) => setText(event.target.value)}
              autoComplete="off"
              autoCapitalize="off"
              spellCheck={false}
              className="max-w-40"
            />
          )}
        </Field>
      )}
      {error && (
        <Notice tone="bad" title={error.title} className="mt-4">
          {error.detail}
        </Notice>
      )}
      <div className="mt-5 flex flex-wrap justify-end gap-2.5">
        <Button onClick={onKeep}>{keepLabel}</Button>
        <Button kind="main" type="submit" disabled={!isConfirmed} isBusy={isBusy}>
          {actLabel}
        </Button>
      </div>
    </form>
  );
}
