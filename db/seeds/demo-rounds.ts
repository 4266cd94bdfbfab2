import type { RoundDraft } from "@/lib/rounds/schema";
import { seededRandom } from "@/lib/statistics/random";

export type DemoRound = {
  title: string;
  instructions: string;
  opensAt: Date;
  closesAt: Date;
  end: "released" | "open" | "draft";
};

const INSTRUCTIONS =
  "Look at both reflexes before you decide. Give degrees by the landmark rule. If a picture cannot be read, say why.";

const DAY_MS = 86_400_000;
const TITLES = ["winter", "spring", "early summer", "late summer", "autumn", "early winter"];

/** Six released rounds two months apart, one open now and one draft, dated back from the day the demo is made. */
export function demoRounds(now: Date): DemoRound[] {
  const day = (offset: number, hour: number) => {
    const date = new Date(now.getTime() + offset * DAY_MS);
    date.setUTCHours(hour, 0, 0, 0);
    return date;
  };
  const past = TITLES.map((title, index): DemoRound => {
    const closes = -30 - 61 * (TITLES.length - 1 - index);
    return {
      title: `Calibration set ${index + 1}, ${title}`,
      instructions: INSTRUCTIONS,
      opensAt: day(closes - 14, 8),
      closesAt: day(closes, 17),
      end: "released",
    };
  });
  return [
    ...past,
    {
      title: "Calibration set 7",
      instructions: INSTRUCTIONS,
      opensAt: day(-5, 8),
      closesAt: day(9, 17),
      end: "open",
    },
    {
      title: "Calibration set 8",
      instructions: INSTRUCTIONS,
      opensAt: day(45, 8),
      closesAt: day(59, 17),
      end: "draft",
    },
  ];
}

export type LibraryCase = { id: string; isAnchor: boolean };

const DRAWN_COUNT = 22;

/**
 * Cases of one round: every anchor, others in a seeded order of which each round takes the next ones, two hidden
 * repeats and a mirrored one.
 */
export function chooseItems(library: readonly LibraryCase[], round: number): RoundDraft["items"] {
  const random = seededRandom(100);
  const others = library.filter(({ isAnchor }) => !isAnchor).map(({ id }) => ({ id, luck: random() }));
  const ordered = others.sort((a, b) => a.luck - b.luck);
  const drawn = ordered
    .map((_, index) => ordered[(index + round * DRAWN_COUNT) % ordered.length] ?? ordered[0])
    .slice(0, DRAWN_COUNT);
  const ids = drawn.flatMap((each) => each?.id ?? []);
  const items = (kind: "first" | "repeat" | "mirrored", of: string[]) => of.map((caseId) => ({ caseId, kind }));
  const anchors = library.filter(({ isAnchor }) => isAnchor).map(({ id }) => id);
  return [
    ...items("first", [...anchors, ...ids]),
    ...items("repeat", ids.slice(0, 2)),
    ...items("mirrored", ids.slice(2, 3)),
  ];
}
