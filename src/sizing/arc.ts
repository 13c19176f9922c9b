import type { Section } from '../tube/section.js';
import type { Level } from './level.js';
import type { MapScale } from './mapScale.js';
import { rootBetween } from './root.js';

/** A place on the map in shares of its axes. */
export interface Place {
  readonly x: number;
  readonly y: number;
}

/** A point of a traced curve, with the check that is fullest from here to the next. */
export interface Traced extends Place {
  readonly check: number;
}

/** How far a chord may lie from its curve, as a share of the axis: a twentieth of what is promised. */
const SAGITTA = 5e-5;
/** Chords shorter than this are not parted. */
const SHORTEST = 2e-6;
/** Room for rounding at a corner, ln U. */
const ROUNDING = 1e-9;
/** Room for rounding of a place, as a share of the axis. */
const NEAR = 1e-9;
const STEP = 1e-7;
const NEWTON = 12;

/** Finds points of one level's curve. */
export class Arcs {
  constructor(
    private readonly scale: MapScale,
    private readonly section: Section,
    private readonly level: Level,
  ) {}

  /** ln U at a place */
  at(x: number, y: number): number {
    return this.level.at(this.section.set(this.scale.outer.at(x), this.scale.wall.at(y)));
  }

  /** The point between two places at which the curve crosses, given ln U at both, of opposite signs. */
  crossing(ax: number, ay: number, fa: number, bx: number, by: number, fb: number): Traced {
    const s = rootBetween((at) => this.at(ax + at * (bx - ax), ay + at * (by - ay)), fa, fb);
    const [x, y] = [ax + s * (bx - ax), ay + s * (by - ay)];
    this.at(x, y);
    return { x, y, check: this.level.fullest };
  }

  /**
   * The curve from p to q where both coordinates only grow or only fall on the way: all points but p, corners among
   * them. A chord is halved until it lies on its curve; where another check takes over the corner is solved for.
   */
  between(p: Traced, q: Traced): Traced[] {
    if (Math.hypot(q.x - p.x, q.y - p.y) < SHORTEST) return [q];
    if (p.check !== q.check) {
      const corner = this.corner(p, q, NEAR);
      if (corner !== null) {
        const before = this.between(p, { ...corner, check: p.check });
        return [
          ...before.slice(0, -1),
          { ...corner, check: q.check },
          ...this.between({ ...corner, check: q.check }, q),
        ];
      }
    }
    const middle = this.middle(p, q);
    return middle === null ? [q] : [...this.between(p, middle), ...this.between(middle, q)];
  }

  /** The two fullest checks at the ends meet in a corner, where it is on the curve and near; else null. */
  corner(p: Traced, q: Traced, reach: number): Traced | null {
    let [x, y] = [(p.x + q.x) / 2, (p.y + q.y) / 2];
    for (let step = 0; step < NEWTON; step++) {
      const [a, b] = this.pair(p, q, x, y);
      const [ax, bx] = this.pair(p, q, x + STEP, y);
      const [ay, by] = this.pair(p, q, x, y + STEP);
      const [aX, aY, bX, bY] = [ax - a, ay - a, bx - b, by - b].map((slope) => slope / STEP) as [
        number,
        number,
        number,
        number,
      ];
      const det = aX * bY - aY * bX;
      const [dx, dy] = [(aY * b - bY * a) / det, (bX * a - aX * b) / det];
      if (!(Math.hypot(dx, dy) < 1)) return null;
      [x, y] = [x + dx, y + dy];
      if (Math.hypot(dx, dy) < 1e-12) break;
    }
    const near = within(x, p.x, q.x, reach) && within(y, p.y, q.y, reach);
    return near && Math.abs(this.at(x, y)) < ROUNDING ? { x, y, check: q.check } : null;
  }

  private pair(p: Traced, q: Traced, x: number, y: number): [number, number] {
    const section = this.section.set(this.scale.outer.at(x), this.scale.wall.at(y));
    return [this.level.one(p.check, section), this.level.one(q.check, section)];
  }

  /** The curve's point on the normal through the middle of the chord; null where the chord is near enough. */
  private middle(p: Traced, q: Traced): Traced | null {
    const [x, y] = [(p.x + q.x) / 2, (p.y + q.y) / 2];
    const [w, h] = [Math.abs(q.x - p.x), Math.abs(q.y - p.y)];
    const slope = (q.x - p.x) * (q.y - p.y) > 0 ? -1 : 1;
    // the normal leaves the rectangle of the two ends through its longer sides
    const [nx, ny] = h > w ? [w / 2 + NEAR, (slope * w * w) / (2 * h)] : [(h * h) / (2 * w), slope * (h / 2 + NEAR)];
    if (Math.min(w, h) < SAGITTA) return null;
    const [fa, fb] = [this.at(x - nx, y - ny), this.at(x + nx, y + ny)];
    if (fa > 0 === fb > 0) return null;
    const found = this.crossing(x - nx, y - ny, fa, x + nx, y + ny, fb);
    return Math.hypot(found.x - x, found.y - y) < SAGITTA ? null : found;
  }
}

function within(value: number, a: number, b: number, reach: number): boolean {
  return value >= Math.min(a, b) - reach && value <= Math.max(a, b) + reach;
}
