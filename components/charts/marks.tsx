type Place = { x: number; y: number };

/** A filled dot: a reading, a point within limits; in brass, the person looking. */
export function Dot({ x, y, r, colour = "var(--ink)" }: Place & { r: number; colour?: string }) {
  return <circle cx={x} cy={y} r={r} fill={colour} />;
}

/** An open dot: other people's readings, and what is too few to say. */
export function OpenDot({ x, y, r, colour = "var(--ink)" }: Place & { r: number; colour?: string }) {
  return <circle cx={x} cy={y} r={r} fill="var(--surface)" stroke={colour} strokeWidth={1.6} />;
}

/** A warning. Its centre of mass lies on the point, `r` is about the radius of a dot of the same weight. */
export function Triangle({ x, y, r, isOpen = false }: Place & { r: number; isOpen?: boolean }) {
  const points = `${x},${y - r * 1.35} ${x + r * 1.3},${y + r * 0.9} ${x - r * 1.3},${y + r * 0.9}`;
  if (!isOpen) return <polygon points={points} fill="var(--tawny)" />;
  return <polygon points={points} fill="var(--surface)" stroke="var(--tawny)" strokeWidth={2} strokeLinejoin="miter" />;
}

/** Beyond an action limit. The edge in the colour of its ground parts it from a line drawn through it. */
export function Diamond({ x, y, r }: Place & { r: number }) {
  const reach = r * 1.6;
  const points = `${x},${y - reach} ${x + reach},${y} ${x},${y + reach} ${x - reach},${y}`;
  return <polygon points={points} fill="var(--oxide)" stroke="var(--surface)" strokeWidth={1.5} />;
}

/** The reference: a ring with four spokes, known by its shape in grey and in print. */
export function ReferenceRing({ x, y, r }: Place & { r: number }) {
  const [inner, outer] = [r * 0.86, r * 1.43];
  const spokes = `M${x - outer} ${y}H${x - inner}M${x + inner} ${y}H${x + outer}M${x} ${y - outer}V${y - inner}M${x} ${y + inner}V${y + outer}`;
  return (
    <g fill="none" stroke="var(--cobalt)" strokeWidth={r * 0.23}>
      <circle cx={x} cy={y} r={r} stroke="var(--surface)" strokeWidth={r * 0.48} />
      <circle cx={x} cy={y} r={r} />
      <path d={spokes} />
    </g>
  );
}

/** An interval along x: an upright where it ends, or an arrow that points on beyond the axis where it is cut. */
export function intervalPath(
  low: number,
  high: number,
  y: number,
  { left, right }: { left: number; right: number },
): string {
  const lowEnd = low < left - 0.5 ? `M${left + 6} ${y - 5}L${left} ${y}l6 5` : `M${low} ${y - 5}v10`;
  const highEnd = high > right + 0.5 ? `M${right - 6} ${y - 5}L${right} ${y}l-6 5` : `M${high} ${y - 5}v10`;
  return `M${Math.max(left, low)} ${y}H${Math.min(right, high)}${lowEnd}${highEnd}`;
}
