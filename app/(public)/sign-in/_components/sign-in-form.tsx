"use client";

import { useRouter } from "next/navigation";
import { signIn } from "next-auth/react";
import { type FormEvent, useState } from "react";
import { Button } from "@/components/ui/button";
import { Field } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { TextInput } from "@/components/ui/text-input";

type State = "idle" | "busy" | "refused" | "offline";

/** E-mail and password. What was typed stays when the sign-in is refused. */
export function SignInForm({ next }: { next: string | undefined }) {
  const router = useRouter();
  const [state, setState] = useState<State>("idle");

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    setState("busy");
    const answer = await signIn("credentials", {
      email: form.get("email"),
      password: form.get("password"),
      redirect: false,
    }).catch(() => undefined);
    if (!answer) return setState("offline");
    if (!answer.ok) return setState("refused");
    router.push(ownPath(next));
    router.refresh();
  }

  return (
    <form onSubmit={submit} className="grid gap-3.5">
      {state === "refused" && (
        <Notice tone="bad" title="The e-mail address and the password do not fit together.">
          Check both and try again.
        </Notice>
      )}
      {state === "offline" && (
        <Notice tone="warn" title="The server cannot be reached.">
          Try again when the line is back.
        </Notice>
      )}
      <div className="grid gap-3 sm:grid-cols-2">
        <Field label="Work address">
          {(wiring) => <TextInput {...wiring} name="email" type="email" autoComplete="username" required />}
        </Field>
        <Field label="Password">
          {(wiring) => (
            <TextInput {...wiring} name="password" type="password" autoComplete="current-password" required />
          )}
        </Field>
      </div>
      <div>
        <Button kind="main" type="submit" isBusy={state === "busy"} className="max-sm:w-full">
          Sign in
        </Button>
      </div>
    </form>
  );
}

/** Only a path of our own: an address from outside must not decide where a person lands. */
function ownPath(next: string | undefined): string {
  return next?.startsWith("/") && !next.startsWith("//") && !next.includes("\\") ? next : "/";
}
