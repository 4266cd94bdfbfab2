import type { ReactNode } from "react";
import type { ControlState } from "./control-point";
import { Diamond, Dot, OpenDot, Triangle } from "./marks";

/** A point by its state: dot, open triangle beyond a warning limit, filled diamond beyond an action limit. */
export function ControlMark({ x, y, state, isSmall }: { x: number; y: number; state: ControlState; isSmall: boolean }) {
  const r = isSmall ? 3 : 5.2;
  if (state === "action") return <Diamond x={x} y={y} r={isSmall ? 3.8 : 5.4} />;
  if (state === "warning") return <Triangle x={x} y={y} r={isSmall ? 4 : 6} isOpen />;
  if (state === "none") return <OpenDot x={x} y={y} r={r - 0.4} colour="var(--edge)" />;
  return <Dot x={x} y={y} r={r} />;
}

const SIGN_PX = 18;

/** What the marks of a control chart mean. The samples of the lines stand in for their words on narrow screens. */
export function ControlKey() {
  const at = SIGN_PX / 2;
  return (
    <ul className="mt-3.5 flex flex-wrap gap-x-5 gap-y-1.5 text-small text-ink-2">
      <KeyItem text="within limits">
        <Dot x={at} y={at} r={5.2} />
      </KeyItem>
      <KeyItem text="beyond a warning limit">
        <Triangle x={at} y={at} r={6} isOpen />
      </KeyItem>
      <KeyItem text="beyond an action limit">
        <Diamond x={at} y={at} r={5.4} />
      </KeyItem>
      <KeyItem text="no reason to act">
        <rect x={0} y={4} width={SIGN_PX} height={10} fill="var(--verdi)" fillOpacity={0.14} />
      </KeyItem>
      <KeyItem text="warning limit" isNarrowOnly>
        <path d={`M0 ${at}H${SIGN_PX}`} stroke="var(--tawny)" strokeWidth={1.3} strokeDasharray="7 4" />
      </KeyItem>
      <KeyItem text="action limit" isNarrowOnly>
        <path d={`M0 ${at}H${SIGN_PX}`} stroke="var(--oxide)" strokeWidth={1.6} />
      </KeyItem>
    </ul>
  );
}

function KeyItem({ text, isNarrowOnly, children }: { text: string; isNarrowOnly?: boolean; children: ReactNode }) {
  return (
    <li className={isNarrowOnly ? "flex items-center gap-2 @[480px]:hidden" : "flex items-center gap-2"}>
      <svg width={SIGN_PX} height={SIGN_PX} aria-hidden="true">
        {children}
      </svg>
      {text}
    </li>
  );
}
