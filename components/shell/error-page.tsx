"use client";

import { RotateCw } from "lucide-react";
import { useEffect } from "react";
import { Button, ButtonLink } from "@/components/ui/button";
import { Page, PageHead } from "./page";
import { RunningHead } from "./running-head";

/** The page in place of one that failed: what is safe, one way on, and the id under which the failure was logged. */
export function ErrorPage({ error, onRetry }: { error: unknown; onRetry: () => void }) {
  useEffect(() => console.error(error), [error]);
  const referenceId = readDigest(error);
  return (
    <>
      <RunningHead homeHref="/" />
      <Page>
        <div role="alert">
          <PageHead
            title="This page could not be shown"
            lede="The failure is on our side. Readings that were marked as saved are safe."
          />
        </div>
        <div className="flex flex-wrap gap-2.5">
          <Button kind="main" icon={RotateCw} onClick={onRetry}>
            Try again
          </Button>
          <ButtonLink href="/">Go to the first page</ButtonLink>
        </div>
        <p className="mt-6 max-w-read text-small text-ink-2">
          {referenceId ? (
            <>
              If it happens again, tell whoever looks after Evenglint this reference:{" "}
              <code className="font-mono font-medium text-ink">{referenceId}</code>
            </>
          ) : (
            "If it happens again, tell whoever looks after Evenglint what you were doing and when."
          )}
        </p>
      </Page>
    </>
  );
}

/** The id Next gives to a failure on the server. A failure in the browser has none. */
function readDigest(error: unknown): string | null {
  if (typeof error !== "object" || error === null || !("digest" in error)) return null;
  return typeof error.digest === "string" ? error.digest : null;
}
