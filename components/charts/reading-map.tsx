import { joinClasses } from "@/components/ui/join-classes";
import type { Eye, Finding } from "@/lib/reflex/finding";
import { eyesOnMap, jitterMm, READING_MAP_MM, readingMapPosition } from "@/lib/reflex/reading-map-position";
import styles from "./charts.module.css";
import { ReferenceRing } from "./marks";
import { describeMap, describeUnreadable } from "./reading-map-words";

type ReadingMapProps = {
  reference?: Finding;
  /** The reading of the person looking. */
  own?: Finding;
  others?: readonly Finding[];
  title: string;
  /** Fixes the small shifts that keep equal readings apart. */
  seed?: number;
};

/** Units of the drawing per mm; the drawing scales with its place, its words do not. */
const UNITS_PER_MM = 10;
const [WIDTH, HEIGHT] = [410, 188];
const CENTRE_X: Record<Eye, number> = { right: 94, left: WIDTH - 94 };
const CENTRE_Y = HEIGHT / 2;

/** Both eyes from the front, the patient's right at the left, with every reading where it says the reflex lies. */
export function ReadingMap({ reference, own, others = [], title, seed = 1 }: ReadingMapProps) {
  const unreadable = describeUnreadable({ reference, own, others });
  return (
    <div className={joinClasses("relative max-w-105 min-w-0", styles.chart)}>
      <div role="img" aria-label={describeMap(title, { reference, own, others })}>
        <div className="mb-1 flex justify-between text-small leading-none text-ink-2">
          <span>R</span>
          <span>L</span>
        </div>
        <svg viewBox={`0 0 ${WIDTH} ${HEIGHT}`} width="100%" aria-hidden="true">
          <EyeRings side="right" />
          <EyeRings side="left" />
          {others.flatMap((finding, i) =>
            places(finding, jitterMm(seed, i)).map(({ side, x, y }) => (
              <circle
                // biome-ignore lint/suspicious/noArrayIndexKey: the readings of others have no name here, by design
                key={`${i} ${side}`}
                cx={x}
                cy={y}
                r={4.6}
                fill="var(--sheet)"
                stroke="var(--ink)"
                strokeWidth={1.8}
              />
            )),
          )}
          {reference && places(reference).map(({ side, x, y }) => <ReferenceRing key={side} x={x} y={y} r={10.5} />)}
          {own &&
            places(own).map(({ side, x, y }) => (
              <circle key={side} cx={x} cy={y} r={7.4} fill="var(--brass-dot)" stroke="var(--ink)" strokeWidth={2} />
            ))}
        </svg>
        <div className="mt-1.5 flex items-center justify-center gap-2 text-note leading-none text-ink-3">
          <span className="h-px w-5 bg-edge" />
          nose
          <span className="h-px w-5 bg-edge" />
        </div>
      </div>
      {unreadable && <p className="mt-2 text-note text-ink-2">{unreadable}</p>}
    </div>
  );
}

/** Pupil margin dashed (15 degrees), midway dotted (30), limbus solid (45), and the sclera beyond. */
function EyeRings({ side }: { side: Eye }) {
  const [x, y] = [CENTRE_X[side], CENTRE_Y];
  const { pupil, midway, limbus, sclera } = READING_MAP_MM;
  const ring = { cx: x, cy: y, stroke: "var(--limbus)", vectorEffect: "non-scaling-stroke" } as const;
  return (
    <g fill="none">
      <circle {...ring} r={sclera * UNITS_PER_MM} fill="var(--sclera)" stroke="var(--edge)" />
      <circle {...ring} r={limbus * UNITS_PER_MM} fill="var(--iris)" fillOpacity={0.55} strokeWidth={1.4} />
      <circle {...ring} r={midway * UNITS_PER_MM} strokeDasharray="1.2 3.2" strokeLinecap="round" />
      <circle {...ring} r={pupil * UNITS_PER_MM} fill="var(--pupil)" fillOpacity={0.3} strokeDasharray="4 2.8" />
      <path d={`M${x - 5} ${y}h10M${x} ${y - 5}v10`} stroke="var(--limbus)" vectorEffect="non-scaling-stroke" />
    </g>
  );
}

function places(finding: Finding, shift = { x: 0, y: 0 }): { side: Eye; x: number; y: number }[] {
  return eyesOnMap(finding).flatMap((side) => {
    const at = readingMapPosition(finding, side);
    if (!at) return [];
    const x = CENTRE_X[side] + (at.x + shift.x) * UNITS_PER_MM;
    return [{ side, x, y: CENTRE_Y + (at.y + shift.y) * UNITS_PER_MM }];
  });
}
