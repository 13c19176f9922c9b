/** A place on a drawing, px: x to the right, y down. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

/** A number as path data writes it: hundredths of a pixel, no needless zeros, no −0. */
export function coordinate(value: number): string {
  return String(Number(value.toFixed(2)) + 0);
}

/** Straight strokes from point to point, closed where asked. */
export function polyline(points: readonly Point[], closed = false): string {
  const [first, ...rest] = points.map(({ x, y }) => `${coordinate(x)} ${coordinate(y)}`);
  if (first === undefined) return '';
  return `M${first}${rest.map((point) => `L${point}`).join('')}${closed ? 'z' : ''}`;
}
