import type { Label } from './figure.js';
import { labelBox } from './label.js';
import type { Area } from './mapSheet.js';
import type { Point } from './point.js';

/** Room that labels leave each other, px. */
const APART = 2;

/** Breadth of a cell of marks, px, and more cells than any sheet is high. */
const CELL = 24;
const ROW = 4096;

/** How near a line a mark lies on it, and how far from its beginning marks count, px. */
const ON = 3;
const CLOSE = 8;

type Box = readonly Point[];

function cellOf(x: number, y: number): number {
  return Math.floor(x / CELL) * ROW + Math.floor(y / CELL);
}

/** Keeps account of where a drawing's labels lie, so that none covers another, and of what they had better not cover. */
export class Placing {
  private readonly boxes: Box[] = [];
  private readonly marks = new Map<number, Point[]>();

  /** @param area what all labels must lie in */
  constructor(private readonly area: Area) {}

  /** Takes room for something that is no label. */
  block({ left, top, right, bottom }: Area): void {
    this.boxes.push([
      { x: left, y: top },
      { x: right, y: top },
      { x: right, y: bottom },
      { x: left, y: bottom },
    ]);
  }

  /** Marks places of lines that labels had better not cover. */
  avoid(places: readonly Point[]): void {
    for (const place of places) {
      const key = cellOf(place.x, place.y);
      const cell = this.marks.get(key);
      if (cell === undefined) this.marks.set(key, [place]);
      else cell.push(place);
    }
  }

  /** Whether labels lie in the area and clear of all that were taken. */
  fits(labels: readonly Label[], area: Area = this.area): boolean {
    return labels.every((label) => {
      const box = grown(label);
      return box.every((corner) => isIn(corner, area)) && !this.boxes.some((other) => overlap(box, other));
    });
  }

  take(labels: readonly Label[]): void {
    for (const label of labels) this.boxes.push(labelBox(label));
  }

  /** How many marks the labels cover. */
  covered(labels: readonly Label[]): number {
    return labels.reduce((sum, label) => sum + this.marksIn(labelBox(label)), 0);
  }

  /** How many marks a straight line meets. */
  crossed(from: Point, to: Point): number {
    let count = 0;
    const length = Math.hypot(to.x - from.x, to.y - from.y);
    const [dx, dy] = [(to.x - from.x) / length, (to.y - from.y) / length];
    for (const { x, y } of this.near([from, to])) {
      const along = (x - from.x) * dx + (y - from.y) * dy;
      const across = Math.abs((x - from.x) * dy - (y - from.y) * dx);
      if (across < ON && along > CLOSE && along < length) count++;
    }
    return count;
  }

  /** The marks in the cells that a box lies in. */
  private *near(box: Box): Generator<Point> {
    const [left, right] = extent(box, 1, 0).map((x) => Math.floor(x / CELL)) as [number, number];
    const [top, bottom] = extent(box, 0, 1).map((y) => Math.floor(y / CELL)) as [number, number];
    for (let i = left; i <= right; i++) for (let j = top; j <= bottom; j++) yield* this.marks.get(i * ROW + j) ?? [];
  }

  private marksIn(box: Box): number {
    const [a, b, , d] = box;
    if (a === undefined || b === undefined || d === undefined) return 0;
    const [ux, uy, vx, vy] = [b.x - a.x, b.y - a.y, d.x - a.x, d.y - a.y];
    const [uu, vv] = [ux * ux + uy * uy, vx * vx + vy * vy];
    let count = 0;
    for (const { x, y } of this.near(box)) {
      const u = (x - a.x) * ux + (y - a.y) * uy;
      if (u < 0 || u > uu) continue;
      const v = (x - a.x) * vx + (y - a.y) * vy;
      if (v >= 0 && v <= vv) count++;
    }
    return count;
  }
}

/** A label's box with the room about it. */
function grown(label: Label): Box {
  const box = labelBox(label);
  const [a, b, , d] = box as readonly [Point, Point, Point, Point];
  const [w, h] = [Math.hypot(b.x - a.x, b.y - a.y), Math.hypot(d.x - a.x, d.y - a.y)];
  const [ux, uy, vx, vy] = [(b.x - a.x) / w, (b.y - a.y) / w, (d.x - a.x) / h, (d.y - a.y) / h].map(
    (one) => one * APART,
  ) as [number, number, number, number];
  const signs = [
    [-1, -1],
    [1, -1],
    [1, 1],
    [-1, 1],
  ] as const;
  return box.map(({ x, y }, i) => {
    const [u, v] = signs[i] as readonly [number, number];
    return { x: x + u * ux + v * vx, y: y + u * uy + v * vy };
  });
}

function isIn({ x, y }: Point, { left, top, right, bottom }: Area): boolean {
  return x >= left && x <= right && y >= top && y <= bottom;
}

/** Whether two rectangles overlap, however turned, by the theorem of separating axes. */
function overlap(a: Box, b: Box): boolean {
  if (!meet(a, b, 1, 0) || !meet(a, b, 0, 1)) return false;
  return [a, b].every(([p, q, , s]) => {
    if (p === undefined || q === undefined || s === undefined) return false;
    return meet(a, b, q.x - p.x, q.y - p.y) && meet(a, b, s.x - p.x, s.y - p.y);
  });
}

function meet(a: Box, b: Box, x: number, y: number): boolean {
  const [a0, a1] = extent(a, x, y);
  const [b0, b1] = extent(b, x, y);
  return a0 < b1 && b0 < a1;
}

function extent(box: Box, x: number, y: number): readonly [number, number] {
  let [least, most] = [Infinity, -Infinity];
  for (const corner of box) {
    const along = corner.x * x + corner.y * y;
    if (along < least) least = along;
    if (along > most) most = along;
  }
  return [least, most];
}
