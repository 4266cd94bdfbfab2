import { useId } from "react";
import { joinClasses } from "@/components/ui/join-classes";
import { BEYOND_LIMBUS, DEGREES_MAX } from "@/lib/reflex/finding";
import { LANDMARK_DEGREES } from "@/lib/reflex/landmarks";
import { percentAlongRule } from "./landmark-steps";

const [BAR_TOP, BAR_HEIGHT] = [6, 36];
const BAR_END = BAR_TOP + BAR_HEIGHT;
const at = (degrees: number) => `${percentAlongRule(degrees)}%`;
const { pupilMargin, midway, limbus } = LANDMARK_DEGREES;

const NUMBERED = [0, pupilMargin, midway, limbus] as const;
const NUMBER =
  "absolute top-14 -translate-x-1/2 font-mono text-small leading-tight font-medium first-of-type:translate-x-0";

/** The drawn rule: pupil, iris with its fibres, limbus, sclera; a tick at each degree and a number at each landmark. */
export function LandmarkScale() {
  const fibres = useId();
  return (
    <div aria-hidden="true" className="pointer-events-none">
      <svg aria-hidden="true" width="100%" height={BAR_END + 12} className="block overflow-visible">
        <defs>
          <pattern id={fibres} width={19} height={BAR_HEIGHT} patternUnits="userSpaceOnUse">
            <rect width={19} height={BAR_HEIGHT} fill="var(--iris)" />
            <path d={`M5.5 0V${BAR_HEIGHT}M9.5 0V${BAR_HEIGHT}M18 0V${BAR_HEIGHT}`} stroke="var(--iris-2)" />
          </pattern>
        </defs>
        <rect x="0" y={BAR_TOP} width={at(pupilMargin)} height={BAR_HEIGHT} fill="var(--pupil)" />
        <rect
          x={at(pupilMargin)}
          y={BAR_TOP}
          width={at(limbus - pupilMargin)}
          height={BAR_HEIGHT}
          fill={`url(#${fibres})`}
        />
        <rect x={at(limbus)} y={BAR_TOP} width="19%" height={BAR_HEIGHT} fill="var(--sclera)" />
        <line
          x1={at(midway)}
          x2={at(midway)}
          y1={BAR_TOP}
          y2={BAR_END}
          stroke="var(--sclera)"
          strokeWidth={2}
          strokeDasharray="2 3"
        />
        <line x1={at(limbus)} x2={at(limbus)} y1={BAR_TOP} y2={BAR_END} stroke="var(--limbus)" strokeWidth={3} />
        <rect x="0" y={BAR_TOP} width="100%" height={BAR_HEIGHT} fill="none" stroke="var(--edge)" />
        {Array.from({ length: DEGREES_MAX + 1 }, (_, degrees) => {
          const length = degrees % 15 === 0 ? 11 : degrees % 5 === 0 ? 8 : 4;
          const x = at(degrees);
          // biome-ignore lint/suspicious/noArrayIndexKey: the index is the degree
          return <line key={degrees} x1={x} x2={x} y1={BAR_END} y2={BAR_END + length} stroke="var(--edge)" />;
        })}
      </svg>
      {NUMBERED.map((value) => (
        <span key={value} className={NUMBER} style={{ left: `${percentAlongRule(value)}%` }}>
          {value}
        </span>
      ))}
      <span className={joinClasses(NUMBER, "right-0 last-of-type:translate-x-0")}>{BEYOND_LIMBUS}</span>
    </div>
  );
}
