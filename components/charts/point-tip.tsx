import { ChartText } from "./chart-text";
import styles from "./charts.module.css";
import type { ChartBox } from "./use-chart-box";

export type Tip = { title: string; lines: string[] };

const [SIZE_PX, LINE_PX, PAD_PX, OFF_PX] = [13, 19, 10, 14];

/** What a point says, beside it: to its upper right where there is room, and always inside the drawing. */
export function PointTip({
  x,
  y,
  tip,
  box,
  height,
}: {
  x: number;
  y: number;
  tip: Tip;
  box: ChartBox;
  height: number;
}) {
  const texts = [tip.title, ...tip.lines];
  const widest = Math.max(...texts.map((text, i) => box.measure(text, SIZE_PX, "sans", i === 0 ? 600 : 400)));
  const [w, h] = [widest + 2 * PAD_PX, texts.length * LINE_PX + 2 * PAD_PX - 5];
  const left = x + OFF_PX + w <= box.width ? x + OFF_PX : Math.max(0, Math.min(x - OFF_PX - w, box.width - w));
  const above = y - OFF_PX - h;
  const top = above >= 0 ? above : Math.max(0, Math.min(y + OFF_PX, height - h));
  return (
    <g className={styles.tip}>
      <rect x={left} y={top} width={w} height={h} fill="var(--sheet)" stroke="var(--ink)" />
      {texts.map((text, i) => (
        <ChartText
          // biome-ignore lint/suspicious/noArrayIndexKey: lines have no identity but their place
          key={i}
          x={left + PAD_PX}
          y={top + PAD_PX + 10 + i * LINE_PX}
          size={SIZE_PX}
          tone={i === 0 ? "ink" : "quiet"}
          isStrong={i === 0}
        >
          {text}
        </ChartText>
      ))}
    </g>
  );
}

/** A tip as one sentence, for those who hear it. */
export function speakTip({ title, lines }: Tip): string {
  return [title, ...lines].join(", ");
}
