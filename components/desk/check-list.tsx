import { ButtonLink } from "@/components/ui/button";
import { PhotographThumb } from "@/components/ui/photograph-thumb";
import { Tag } from "@/components/ui/tag";
import type { DeskItem, DeskSheet } from "@/lib/desk/schema";
import { describeFinding } from "@/lib/reflex/describe-finding";

/** The cases of a round as strips with one's own sentence; unread ones first while the round is open. */
export function CheckList({ sheet, isOpen }: { sheet: DeskSheet; isOpen: boolean }) {
  const unread = sheet.items.filter(({ reading }) => !reading);
  const read = sheet.items.filter(({ reading }) => reading);
  const ordered = isOpen ? [...unread, ...read] : sheet.items;
  return (
    <ul className="border-t-2 border-t-ink border-b border-b-ink">
      {ordered.map((item) => (
        <CheckLine key={item.id} item={item} href={isOpen ? `/desk/${sheet.id}?case=${item.place}` : null} />
      ))}
    </ul>
  );
}

function CheckLine({ item, href }: { item: DeskItem; href: string | null }) {
  return (
    <li className="flex items-center gap-x-5 gap-y-2 border-b border-hair py-2.5 last:border-b-0 max-sm:flex-wrap">
      <PhotographThumb
        src={item.pictureHref}
        width={item.width}
        height={item.height}
        alt={`Case ${item.place}`}
        className="w-28 shrink-0 sm:w-36"
      />
      <span className="w-18 shrink-0 font-mono font-medium">Case {item.place}</span>
      <span className="min-w-0 grow max-sm:order-3 max-sm:basis-full">
        {item.reading ? describeFinding(item.reading.finding) : <Tag tone="warn">not read yet</Tag>}
      </span>
      {href && (
        <ButtonLink
          size="slim"
          href={href}
          aria-label={`${item.reading ? "Change" : "Read"} case ${item.place}`}
          className="ml-auto"
        >
          {item.reading ? "Change" : "Read"}
        </ButtonLink>
      )}
    </li>
  );
}
