"use client";

import { formatTime } from "@/components/ui/format-time";
import { Notice, Remark } from "@/components/ui/notice";
import type { DeskSheet } from "@/lib/desk/schema";
import { CheckList } from "./check-list";
import { HandIn } from "./hand-in";
import { useDeskSheet } from "./use-desk-sheet";

/** Every case with one's own reading, what is missing first, and the way to hand in. */
export function CheckSheet({ initial, zone }: { initial: DeskSheet; zone: string }) {
  const { data: sheet = initial, mutate } = useDeskSheet(initial.id, initial);
  const isOpen = sheet.state === "open";
  return (
    <div className="grid gap-6">
      <StateNotice sheet={sheet} zone={zone} />
      {isOpen && sheet.readCount < sheet.itemCount && (
        <Remark tone="warn">
          <b>
            {sheet.itemCount - sheet.readCount === 1
              ? "One case is not read yet."
              : `${sheet.itemCount - sheet.readCount} cases are not read yet.`}
          </b>{" "}
          They come first below. A case that cannot be read is an answer too.
        </Remark>
      )}
      {sheet.items.length > 0 && <CheckList sheet={sheet} isOpen={isOpen} />}
      {isOpen && <HandIn sheet={sheet} onHandedIn={(next) => mutate(next, { revalidate: false })} />}
    </div>
  );
}

function StateNotice({ sheet, zone }: { sheet: DeskSheet; zone: string }) {
  switch (sheet.state) {
    case "waiting":
      return <Notice tone="info" title={`The round opens on ${formatTime(sheet.opensAt, zone, "moment")}.`} />;
    case "open":
      return null;
    case "submitted":
      return (
        <Notice tone="ok" title={`Handed in: ${sheet.readCount} readings.`}>
          They can no longer be changed. Your scorecard opens when the round is released.
        </Notice>
      );
    case "closed":
      return (
        <Notice tone="info" title={`The round has closed; ${sheet.readCount} of your readings count.`}>
          Your scorecard opens when it is released.
        </Notice>
      );
    case "released":
      return <Notice tone="info" title="The round is released. Your scorecard is on the desk." />;
  }
}
