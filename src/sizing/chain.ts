import type { Traced } from './arc.js';

/** A curve as joined from its arcs; closed where it comes back to its beginning, which is not repeated. */
export interface Polyline {
  readonly points: readonly Traced[];
  readonly closed: boolean;
}

/** Ends nearer than this are one, as a share of the axis. */
const JOINT = 1e-8;
const CELLS = 2 ** 20;

/** Arcs by the cell of their beginning. */
class Beginnings {
  private readonly cells = new Map<number, Traced[][]>();

  constructor(arcs: readonly Traced[][]) {
    for (const arc of arcs) {
      const key = keyOf(arc[0] as Traced, 0, 0);
      const cell = this.cells.get(key);
      if (cell === undefined) this.cells.set(key, [arc]);
      else cell.push(arc);
    }
  }

  /** The arc that begins here and is not yet used, or null. */
  at(place: Traced, used: ReadonlySet<Traced[]>): Traced[] | null {
    for (const i of [0, -1, 1]) {
      for (const j of [0, -1, 1]) {
        const cell = this.cells.get(keyOf(place, i, j)) ?? [];
        const arc = cell.find((one) => !used.has(one) && near(one[0] as Traced, place));
        if (arc !== undefined) return arc;
      }
    }
    return null;
  }
}

function keyOf({ x, y }: Traced, i: number, j: number): number {
  return (Math.round(x * CELLS) + i) * 4 * CELLS + Math.round(y * CELLS) + j;
}

function near(a: Traced, b: Traced): boolean {
  return Math.abs(a.x - b.x) < JOINT && Math.abs(a.y - b.y) < JOINT;
}

/** Joins arcs where one ends and another begins, those first that nothing leads to; what is left are rings. */
export function chain(arcs: readonly Traced[][]): readonly Polyline[] {
  const ends = new Beginnings(arcs.map((arc) => [arc[arc.length - 1] as Traced]));
  const beginnings = new Beginnings(arcs);
  const nothing = new Set<Traced[]>();
  const heads = arcs.filter((arc) => ends.at(arc[0] as Traced, nothing) === null);
  const used = new Set<Traced[]>();
  const joined: Polyline[] = [];
  for (const first of [...heads, ...arcs]) {
    if (!used.has(first)) joined.push(joinedFrom(first, beginnings, used));
  }
  return joined.filter(({ points }) => points.length > 1);
}

function joinedFrom(first: Traced[], beginnings: Beginnings, used: Set<Traced[]>): Polyline {
  const points: Traced[] = [first[0] as Traced];
  for (let arc: Traced[] | null = first; arc !== null;) {
    used.add(arc);
    const last = points[points.length - 1] as Traced;
    // the arc's own beginning knows better which check is fullest from there on
    points[points.length - 1] = { ...last, check: (arc[0] as Traced).check };
    for (let i = 1; i < arc.length; i++) points.push(arc[i] as Traced);
    arc = beginnings.at(points[points.length - 1] as Traced, used);
  }
  const closed = points.length > 3 && near(points[0] as Traced, points[points.length - 1] as Traced);
  return { points: closed ? points.slice(0, -1) : points, closed };
}
