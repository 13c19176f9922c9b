import { OUTWARD, type Span } from '../tube/span.js';
import { Polygon } from './polygon.js';
import { PASS, SEARCHED, type Problem } from './problem.js';

/** Room for rounding in a cut, on top of what passing allows; ln. */
const SLACK = PASS + 10 * OUTWARD;

/** U that does not pass, rounding allowed for. */
const TOO_FULL = 1 + PASS + 20 * OUTWARD;

/** Takes the boxes that were excluded: no design in one passes and is under the mass given. */
export type Witness = (outerLo: number, outerHi: number, wallLo: number, wallHi: number, under: number) => void;

/**
 * Looks at one box. In logarithms of D and t every limit is nearly linear, so the enclosure of its slopes gives a linear
 * function under ln U that is exact at a corner of the box; a design that passes, and is light enough, must lie in the
 * half-plane where that function does not pass its level. Cutting the rectangle by the half-planes of all limits and of
 * the objective leaves a polygon; where nothing is left the box is excluded, else it shrinks to the polygon's own
 * rectangle. The error of a cut is of second order in the width of the box, so few boxes prove an optimum even where it
 * is smooth.
 *
 * Two corners are used: the stout one (least diameter, greatest wall) and the slim one opposite, since lines of equal
 * mass run from one to the other. Where the stout corner is no tube, that of greatest diameter and wall stands in.
 */
export class Look {
  outerLo = Number.NaN;
  outerHi = Number.NaN;
  wallLo = Number.NaN;
  wallHi = Number.NaN;
  /** the corner of the rest where the objective is least, by its linear lower bound */
  bestOuter = Number.NaN;
  bestWall = Number.NaN;
  private readonly polygon: Polygon;
  /** places of the kernel that are not passed all over the box */
  private readonly active: Uint16Array;
  // the box in logarithms, from its corner of greatest sizes
  private width = 0;
  private height = 0;
  private stoutIsTube = true;

  constructor(private readonly problem: Problem) {
    this.polygon = new Polygon(2 * problem.kernel.count + 2);
    this.active = new Uint16Array(problem.kernel.count);
  }

  /**
   * @param under objective that a design must be under to matter
   * @returns false where no size in the box passes and is under it; else the rest is in outerLo … wallHi
   */
  at(outerLo: number, outerHi: number, wallLo: number, wallHi: number, under: number): boolean {
    const { slimmest } = this.problem.box;
    this.wallLo = wallLo;
    this.outerHi = outerHi;
    this.outerLo = Math.max(outerLo, wallLo * slimmest);
    this.wallHi = Math.min(wallHi, outerHi / slimmest);
    if (this.outerLo > outerHi || this.wallHi < wallLo) return false;
    this.width = Math.log(outerHi / this.outerLo);
    this.height = Math.log(this.wallHi / wallLo);
    this.stoutIsTube = this.outerLo >= this.wallHi * slimmest;
    if (!this.cutAll(under)) return false;
    this.shrink();
    return true;
  }

  /** One evaluation over the box, then one at each corner unless nothing is left before. */
  private cutAll(under: number): boolean {
    const { problem } = this;
    problem.evaluations++;
    problem.kernel.bounds(problem.box.set(this.outerLo, this.outerHi, this.wallLo, this.wallHi));
    const count = this.findActive();
    if (count < 0) return false;
    this.polygon.rectangle(-this.width, 0, -this.height, 0);
    return this.cutObjective(under) && this.cutSlim(count) && this.cutStout(count);
  }

  /** Lists the places that may cut; −1 where one of them is not passed anywhere in the box. */
  private findActive(): number {
    const { spans, count } = this.problem.kernel;
    let found = 0;
    for (let k = 0; k < count; k++) {
      const { lo, hi } = spans[k] as Span;
      if (lo > TOO_FULL) return -1;
      if (!(hi <= 1)) this.active[found++] = k;
    }
    return found;
  }

  private cutSlim(count: number): boolean {
    const { problem, active } = this;
    const { kernel, section } = problem;
    if (count > 0) problem.evaluations++;
    section.set(this.outerHi, this.wallLo);
    for (let i = 0; i < count; i++) {
      const k = active[i] as number;
      if (!this.fromSlim(kernel.spans[k] as Span, SLACK - Math.log(kernel.utilisation(k, section)))) return false;
    }
    return true;
  }

  private cutStout(count: number): boolean {
    const { problem, active } = this;
    const { kernel, section } = problem;
    if (count > 0) problem.evaluations++;
    section.set(this.stoutIsTube ? this.outerLo : this.outerHi, this.wallHi);
    for (let i = 0; i < count; i++) {
      const k = active[i] as number;
      if (!this.fromStout(kernel.spans[k] as Span, SLACK - Math.log(kernel.utilisation(k, section)))) return false;
    }
    return true;
  }

  private cutObjective(under: number): boolean {
    const { objective, box, section, span } = this.problem;
    if (under === Number.POSITIVE_INFINITY) return true;
    objective.bound(box, span);
    if (span.lo > under * (1 + 20 * OUTWARD)) return false;
    const most = Math.log(under) + 10 * OUTWARD;
    const slim = objective.value(section.set(this.outerHi, this.wallLo));
    if (!this.fromSlim(span, most - Math.log(slim))) return false;
    const stout = objective.value(section.set(this.stoutIsTube ? this.outerLo : this.outerHi, this.wallHi));
    return this.fromStout(span, most - Math.log(stout));
  }

  /** Cuts by a function that may grow by `room`, as a logarithm, from the slim corner. */
  private fromSlim({ dHi, tLo }: Span, room: number): boolean {
    const t0 = tLo - OUTWARD;
    return this.polygon.cut(dHi + OUTWARD, t0, room - t0 * this.height);
  }

  /** The same from the stout corner, or from what stands in for it. */
  private fromStout({ dLo, dHi, tHi }: Span, room: number): boolean {
    if (!this.stoutIsTube) return this.polygon.cut(dHi + OUTWARD, tHi + OUTWARD, room);
    const d0 = dLo - OUTWARD;
    return this.polygon.cut(d0, tHi + OUTWARD, room - d0 * this.width);
  }

  /** Shrinks the box to the rest, outward by more than the rounding. */
  private shrink(): void {
    const { polygon, problem, outerHi, wallHi } = this;
    const { x, y, count } = polygon;
    problem.objective.bound(problem.box, problem.span);
    const best = polygon.lowest(problem.span.dLo, problem.span.tLo);
    this.bestOuter = outerHi * Math.exp(x[best] ?? 0);
    this.bestWall = wallHi * Math.exp(y[best] ?? 0);
    let x0 = 0;
    let x1 = -this.width;
    let y0 = 0;
    let y1 = -this.height;
    for (let i = 0; i < count; i++) {
      x0 = Math.min(x0, x[i] ?? 0);
      x1 = Math.max(x1, x[i] ?? 0);
      y0 = Math.min(y0, y[i] ?? 0);
      y1 = Math.max(y1, y[i] ?? 0);
    }
    this.outerLo = Math.max(this.outerLo, outerHi * Math.exp(x0 - OUTWARD));
    this.outerHi = Math.min(outerHi, outerHi * Math.exp(x1 + OUTWARD));
    this.wallLo = Math.max(this.wallLo, wallHi * Math.exp(y0 - OUTWARD));
    this.wallHi = Math.min(wallHi, wallHi * Math.exp(y1 + OUTWARD));
  }
}

/** The sizes that are searched at all. */
export const WHOLE = [
  2 * SEARCHED.wallLeast,
  SEARCHED.outerGreatest,
  SEARCHED.wallLeast,
  SEARCHED.outerGreatest / 2,
] as const;
