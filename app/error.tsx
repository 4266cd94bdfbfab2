"use client";

import { ErrorPage } from "@/components/shell/error-page";

/** Whatever no page expected. The reference id leads to the entry in the log; nothing inner is shown. */
export default function AppError({ error, retry }: { error: unknown; retry: () => void }) {
  return <ErrorPage error={error} onRetry={retry} />;
}
