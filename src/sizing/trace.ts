import { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import { Arcs, type Traced } from './arc.js';
import { chain, type Polyline } from './chain.js';
import type { Level } from './level.js';
import type { MapScale } from './mapScale.js';

/** Halvings at which a curve is first looked for in a box, and at which a box is small enough for any curve. */
const COARSE = 4;
const FINE = 12;

/** How far from such a box the corner may lie that two curves make there, as a share of the axis: they may meet at a slim angle. */
const REACH = 0.005;

/** Where a box is halved: not in the middle, so that round sizes do not fall on the lines between boxes. */
const HALF = 0.4877;

/** D/t under which nothing is looked at: there must be a bore. */
const SLIMMEST = 2.02;

/**
 * Traces the curves U = 1 of several levels over a map. Boxes in which no U can be 1 are left out by their enclosures, so
 * that no branch is missed that is wider than a thousandth of the map; the others are quartered until U only grows or only
 * falls with either size. There the curve crosses each side of the box once at most, which the signs at its corners tell,
 * and runs between the crossings without turning back (marching squares, with enclosures in place of hope).
 */
export class Tracer {
  private readonly box: Box;
  private arcs: Map<Level, Traced[][]> = new Map();

  constructor(
    private readonly scale: MapScale,
    private readonly section: Section,
    tolerance: number,
  ) {
    this.box = new Box(tolerance, SLIMMEST);
  }

  /** The curves of each level, U > 1 to the left as x goes right and y goes up. */
  trace(levels: readonly Level[]): ReadonlyMap<Level, readonly Polyline[]> {
    this.arcs = new Map(levels.map((level) => [level, []]));
    const { outer, wall } = this.scale;
    this.visit(outer.least, outer.greatest, wall.least, wall.greatest, 0, levels);
    return new Map(levels.map((level) => [level, chain(this.arcs.get(level) ?? [])]));
  }

  private visit(x0: number, x1: number, y0: number, y1: number, depth: number, levels: readonly Level[]): void {
    const { outer, wall } = this.scale;
    const [d0, d1, t0, t1] = [outer.at(x0), outer.at(x1), wall.at(y0), wall.at(y1)];
    if (d1 <= SLIMMEST * t0) return;
    const allTubes = d0 > SLIMMEST * t1;
    this.box.set(d0, d1, t0, t1);
    const left: Level[] = [];
    for (const level of levels) {
      level.over(this.box);
      if (!level.crossed) continue;
      if (depth >= FINE || (depth >= COARSE && level.steady && allTubes)) {
        if (allTubes) this.emit(level, x0, x1, y0, y1, level.steady);
      } else left.push(level);
    }
    if (left.length === 0) return;
    const [x, y] = [x0 + HALF * (x1 - x0), y0 + HALF * (y1 - y0)];
    this.visit(x0, x, y0, y, depth + 1, left);
    this.visit(x, x1, y0, y, depth + 1, left);
    this.visit(x0, x, y, y1, depth + 1, left);
    this.visit(x, x1, y, y1, depth + 1, left);
  }

  /** The curve in one box: between the crossings of its sides. */
  private emit(level: Level, x0: number, x1: number, y0: number, y1: number, steady: boolean): void {
    const arcs = new Arcs(this.scale, this.section, level);
    const corners = [arcs.at(x0, y0), arcs.at(x1, y0), arcs.at(x1, y1), arcs.at(x0, y1)] as const;
    const [f0, f1, f2, f3] = corners;
    const found: Traced[] = [];
    // each side from the left or from below, so that the boxes on both sides of it find the same point
    if (f0 > 0 !== f1 > 0) found.push(arcs.crossing(x0, y0, f0, x1, y0, f1));
    if (f1 > 0 !== f2 > 0) found.push(arcs.crossing(x1, y0, f1, x1, y1, f2));
    if (f3 > 0 !== f2 > 0) found.push(arcs.crossing(x0, y1, f3, x1, y1, f2));
    if (f0 > 0 !== f3 > 0) found.push(arcs.crossing(x0, y0, f0, x0, y1, f3));
    for (let i = 0; i + 1 < found.length; i += 2) {
      const [p, q] = ordered(found[i] as Traced, found[i + 1] as Traced, x0, x1, y0, y1, corners);
      this.arcs.get(level)?.push([p, ...(steady ? arcs.between(p, q) : turned(arcs, p, q))]);
    }
  }
}

/** In the smallest boxes: straight, or round the corner that lies there. */
function turned(arcs: Arcs, p: Traced, q: Traced): Traced[] {
  const corner = p.check === q.check ? null : arcs.corner(p, q, REACH);
  return corner === null ? [q] : [corner, q];
}

/** The two ends so that U > 1 lies to the left of the way from one to the other. */
function ordered(
  p: Traced,
  q: Traced,
  x0: number,
  x1: number,
  y0: number,
  y1: number,
  [f0, f1, f2, f3]: readonly [number, number, number, number],
): [Traced, Traced] {
  const side = (x: number, y: number): number => (q.x - p.x) * (y - p.y) - (q.y - p.y) * (x - p.x);
  const sides = [side(x0, y0), side(x1, y0), side(x1, y1), side(x0, y1)];
  const far = sides.reduce((best, value, i) => (Math.abs(value) > Math.abs(sides[best] as number) ? i : best), 0);
  const over = ([f0, f1, f2, f3][far] as number) > 0;
  const [start, end] = (sides[far] as number) > 0 === over ? [p, q] : [q, p];
  return [start, end];
}
