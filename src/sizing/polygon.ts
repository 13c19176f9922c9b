/**
 * A convex polygon cut down by half-planes (Sutherland & Hodgman's clipping), reused so that the inner loop makes no
 * objects. Coordinates are logarithms of size, relative to a point of the caller's choice.
 */
export class Polygon {
  /** number of vertices; 0 when nothing is left */
  count = 0;
  x: Float64Array;
  y: Float64Array;
  private nextX: Float64Array;
  private nextY: Float64Array;

  /** @param cuts greatest number of cuts between two rectangles */
  constructor(cuts: number) {
    const room = cuts + 8;
    this.x = new Float64Array(room);
    this.y = new Float64Array(room);
    this.nextX = new Float64Array(room);
    this.nextY = new Float64Array(room);
  }

  /** Starts again from [x0, x1] × [y0, y1]. */
  rectangle(x0: number, x1: number, y0: number, y1: number): void {
    const { x, y } = this;
    x[0] = x[3] = x0;
    x[1] = x[2] = x1;
    y[0] = y[1] = y0;
    y[2] = y[3] = y1;
    this.count = 4;
  }

  /** Keeps the part where a·x + b·y ≤ c, and whatever is not a number; false when nothing is left. */
  cut(a: number, b: number, c: number): boolean {
    const { x, y, nextX, nextY, count } = this;
    if (!this.reaches(a, b, c)) return count > 0;
    let kept = 0;
    let px = x[count - 1] ?? 0;
    let py = y[count - 1] ?? 0;
    let pOver = a * px + b * py - c;
    for (let i = 0; i < count; i++) {
      const qx = x[i] ?? 0;
      const qy = y[i] ?? 0;
      const qOver = a * qx + b * qy - c;
      if (pOver > 0 !== qOver > 0) {
        const s = pOver / (pOver - qOver);
        nextX[kept] = px + s * (qx - px);
        nextY[kept++] = py + s * (qy - py);
      }
      if (!(qOver > 0)) {
        nextX[kept] = qx;
        nextY[kept++] = qy;
      }
      px = qx;
      py = qy;
      pOver = qOver;
    }
    this.x = nextX;
    this.y = nextY;
    this.nextX = x;
    this.nextY = y;
    this.count = kept;
    return kept > 0;
  }

  /** Whether a vertex lies beyond the line; most cuts take nothing away. */
  private reaches(a: number, b: number, c: number): boolean {
    const { x, y, count } = this;
    for (let i = 0; i < count; i++) if (a * (x[i] as number) + b * (y[i] as number) > c) return true;
    return false;
  }

  /** Index of the vertex where a·x + b·y is least. */
  lowest(a: number, b: number): number {
    let best = 0;
    let least = Number.POSITIVE_INFINITY;
    for (let i = 0; i < this.count; i++) {
      const value = a * (this.x[i] ?? 0) + b * (this.y[i] ?? 0);
      if (value < least) {
        least = value;
        best = i;
      }
    }
    return best;
  }
}
