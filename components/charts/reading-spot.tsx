type ReadingSpotProps = {
  x: number;
  y: number;
  r: number;
  isOutside: boolean;
  isActive: boolean;
  onActive: (isOver: boolean) => void;
};

/** One or more readings on one spot. It answers to a pointer within 9 px, however small it is drawn. */
export function ReadingSpot({ x, y, r, isOutside, isActive, onActive }: ReadingSpotProps) {
  const colour = isOutside ? "var(--tawny)" : "var(--ink)";
  return (
    <g onPointerEnter={() => onActive(true)} onPointerLeave={() => onActive(false)}>
      <circle cx={x} cy={y} r={Math.max(9, r)} fill="transparent" />
      <circle
        cx={x}
        cy={y}
        r={r}
        fill={colour}
        fillOpacity={isOutside ? 0.85 : 0.16}
        stroke={colour}
        strokeWidth={isActive ? 2.8 : 1.2}
      />
    </g>
  );
}
