import { Check, LockKeyhole, TriangleAlert } from "lucide-react";
import Link from "next/link";
import { Mark } from "@/components/shell/mark";
import { ButtonLink } from "@/components/ui/button";
import { formatTime } from "@/components/ui/format-time";
import { Icon } from "@/components/ui/icon";
import { ProgressRule } from "@/components/ui/progress-rule";
import type { DeskSheet } from "@/lib/desk/schema";
import type { SaveState } from "./use-save-reading";

type DeskHeadProps = { sheet: DeskSheet; place: number; saveState: SaveState; zone: string };

/** Where one is in the round, until when it is open, and whether the reading is safe. */
export function DeskHead({ sheet, place, saveState, zone }: DeskHeadProps) {
  return (
    <header className="bg-paper">
      <div className="flex min-h-14 flex-wrap items-center gap-x-5 gap-y-1 px-margin py-1">
        <Link href="/desk" aria-label="Evenglint, to the desk" className="flex min-h-touch items-center text-ink">
          <Mark />
        </Link>
        <p className="truncate font-serif text-h3 font-medium max-sm:max-w-[45vw]">{sheet.title}</p>
        <h1 className="ml-auto flex items-baseline gap-2 font-sans text-body font-normal tracking-normal sm:mx-auto">
          Case <b className="font-serif text-h2 font-medium">{place}</b> of {sheet.itemCount}
        </h1>
        <p className="flex items-center gap-1.5 text-small text-ink-2 max-lg:hidden">
          <Icon icon={LockKeyhole} /> Sealed; closes {formatTime(sheet.closesAt, zone, "moment")}
        </p>
        <SavedSign state={saveState} zone={zone} />
        <ButtonLink kind="bare" size="slim" href={`/desk/${sheet.id}/check`}>
          Check and hand in
        </ButtonLink>
      </div>
      <div className="px-margin">
        <ProgressRule
          label="Cases read"
          count={sheet.itemCount}
          done={sheet.items.map(({ reading }) => reading !== null)}
          current={place}
        />
      </div>
    </header>
  );
}

function SavedSign({ state, zone }: { state: SaveState; zone: string }) {
  return (
    <p role="status" className="flex min-w-28 items-center gap-1.5 text-small text-ink-2">
      {state.kind === "saving" && "Saving…"}
      {state.kind === "saved" && (
        <>
          <Icon icon={Check} /> Saved {formatTime(state.at, zone, "clock")}
        </>
      )}
      {state.kind === "failed" && (
        <span className="flex items-center gap-1.5 text-tawny">
          <Icon icon={TriangleAlert} /> Not saved
        </span>
      )}
    </p>
  );
}
