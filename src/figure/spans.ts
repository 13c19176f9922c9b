/** A stretch of a line, from lower to higher parameter. */
export type Stretch = readonly [number, number];

/**
 * The stretch of the line (x, y) + s·(dx, dy) that lies inside a circle about (cx, cy), null where it misses it; (dx, dy)
 * of length 1, so that s is a length.
 */
export function insideCircle(
  line: { readonly x: number; readonly y: number; readonly dx: number; readonly dy: number },
  circle: { readonly x: number; readonly y: number; readonly r: number },
): Stretch | null {
  const nearest = (circle.x - line.x) * line.dx + (circle.y - line.y) * line.dy;
  const away = (circle.x - line.x) * line.dy - (circle.y - line.y) * line.dx;
  const half = circle.r * circle.r - away * away;
  if (circle.r <= 0 || half <= 0) return null;
  return [nearest - Math.sqrt(half), nearest + Math.sqrt(half)];
}

/** What two stretches share, null where they share nothing. */
export function shared(a: Stretch | null, b: Stretch | null): Stretch | null {
  if (a === null || b === null) return null;
  const both: Stretch = [Math.max(a[0], b[0]), Math.min(a[1], b[1])];
  return both[0] < both[1] ? both : null;
}

/** What is left of a stretch without another: none, one or two. */
export function without(a: Stretch | null, b: Stretch | null): readonly Stretch[] {
  if (a === null) return [];
  if (b === null) return [a];
  const parts: readonly Stretch[] = [
    [a[0], Math.min(a[1], b[0])],
    [Math.max(a[0], b[1]), a[1]],
  ];
  return parts.filter(([from, to]) => from < to);
}
