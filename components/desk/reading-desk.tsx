"use client";

import { useRouter, useSearchParams } from "next/navigation";
import { Button } from "@/components/ui/button";
import type { DeskItem, DeskSheet } from "@/lib/desk/schema";
import { DeskCase } from "./desk-case";
import { DeskHead } from "./desk-head";
import { useDeskSheet } from "./use-desk-sheet";
import { useSaveReading } from "./use-save-reading";

/** One case to a screen, in one's own order. Where one is stands in the address, so that Back and reload work. */
export function ReadingDesk({ initial, zone }: { initial: DeskSheet; zone: string }) {
  const router = useRouter();
  const { data: sheet = initial, mutate } = useDeskSheet(initial.id, initial);
  const { state, save } = useSaveReading(mutate);
  const place = currentPlace(sheet, useSearchParams().get("case"));
  const item = sheet.items.find((each) => each.place === place);

  function goTo(target: number) {
    router.replace(`/desk/${sheet.id}?case=${target}`, { scroll: false });
  }

  async function saveAndGoOn(showing: DeskItem, reading: Parameters<typeof save>[1]) {
    if (!(await save(showing, reading))) return;
    const next = nextUnread(sheet, showing);
    if (next) goTo(next.place);
    else router.push(`/desk/${sheet.id}/check`);
  }

  if (!item) return null;
  const following = sheet.items.find((each) => each.place === place + 1);
  return (
    <div className="flex min-h-dvh flex-col">
      <DeskHead sheet={sheet} place={place} saveState={state} zone={zone} />
      <DeskCase
        key={item.id}
        item={item}
        itemCount={sheet.itemCount}
        instructions={sheet.instructions}
        saveState={state}
        onSave={(reading) => saveAndGoOn(item, reading)}
        onStep={(by) => goTo(Math.min(sheet.itemCount, Math.max(1, place + by)))}
        pager={
          <div className="flex gap-2">
            <Button size="slim" disabled={place === 1} onClick={() => goTo(place - 1)}>
              Case before
            </Button>
            <Button size="slim" disabled={place === sheet.itemCount} onClick={() => goTo(place + 1)}>
              Case after
            </Button>
          </div>
        }
      />
      {following && <link rel="prefetch" as="image" href={following.pictureHref} />}
    </div>
  );
}

/** The place asked for in the address, or the first case not read yet. */
function currentPlace(sheet: DeskSheet, asked: string | null): number {
  const place = Number(asked);
  if (Number.isInteger(place) && place >= 1 && place <= sheet.itemCount) return place;
  return sheet.items.find(({ reading }) => !reading)?.place ?? 1;
}

/** The next case without a reading after this one, or before it; none when every other one is read. */
function nextUnread(sheet: DeskSheet, current: DeskItem): DeskItem | undefined {
  const unread = sheet.items.filter(({ id, reading }) => !reading && id !== current.id);
  return unread.find(({ place }) => place > current.place) ?? unread[0];
}
