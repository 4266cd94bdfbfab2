import { ButtonLink } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { ProgressRule } from "@/components/ui/progress-rule";
import { Sheet } from "@/components/ui/sheet";
import { Tag } from "@/components/ui/tag";
import { Time } from "@/components/ui/time";
import type { DeskRound } from "@/lib/desk/schema";

/** What waits first, then what was read before. */
export function DeskRounds({ rounds, zone }: { rounds: DeskRound[]; zone: string }) {
  const current = rounds.filter(({ state }) => state === "open" || state === "waiting");
  const earlier = rounds.filter((round) => !current.includes(round));
  return (
    <div className="grid gap-8">
      {current.length === 0 && (
        <EmptyState title="No round is open for you">
          The next one appears here when the training lead publishes it.
        </EmptyState>
      )}
      {current.map((round) => (
        <CurrentRound key={round.id} round={round} zone={zone} />
      ))}
      {earlier.length > 0 && (
        <section>
          <h2 className="text-h2">Earlier rounds</h2>
          <ul className="mt-3 border-t-2 border-t-ink border-b border-b-ink">
            {earlier.map((round) => (
              <EarlierRound key={round.id} round={round} zone={zone} />
            ))}
          </ul>
        </section>
      )}
    </div>
  );
}

function CurrentRound({ round, zone }: { round: DeskRound; zone: string }) {
  const isOpen = round.state === "open";
  const isRead = round.readCount === round.itemCount;
  return (
    <Sheet as="article">
      <div className="flex flex-wrap items-start justify-between gap-4">
        <div>
          <h2 className="text-h2">{round.title}</h2>
          <p className="mt-1.5 text-ink-2">
            {isOpen ? "Closes" : "Opens"} <Time iso={isOpen ? round.closesAt : round.opensAt} zone={zone} showsZone />.{" "}
            {isOpen && `${round.readCount} of ${round.itemCount} cases read.`}
          </p>
        </div>
        {isOpen && (
          <ButtonLink kind="main" href={isRead ? `/desk/${round.id}/check` : `/desk/${round.id}`}>
            {isRead ? "Check and hand in" : round.readCount > 0 ? "Go on reading" : "Start reading"}
          </ButtonLink>
        )}
      </div>
      {isOpen && (
        <div className="mt-5">
          <ProgressRule label="Cases read" count={round.itemCount} done={round.readCount} current={null} />
        </div>
      )}
    </Sheet>
  );
}

function EarlierRound({ round, zone }: { round: DeskRound; zone: string }) {
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-6 gap-y-1 border-b border-hair py-2.5 last:border-b-0">
      <span className="font-semibold">{round.title}</span>
      <span className="text-small text-ink-2">
        closed <Time iso={round.closesAt} zone={zone} form="date" /> · {round.readCount} of {round.itemCount} read
      </span>
      <span className="ml-auto">
        {round.state === "released" ? (
          <ButtonLink size="slim" href={`/scorecards/${round.id}`}>
            Scorecard
          </ButtonLink>
        ) : (
          <Tag tone={round.state === "submitted" ? "ok" : "mute"}>
            {round.state === "submitted" ? "handed in" : "closed, sealed"}
          </Tag>
        )}
      </span>
    </li>
  );
}
