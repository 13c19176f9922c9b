import type { Span } from '../tube/span.js';
import { Polygon } from './polygon.js';
import { SEARCHED, type Problem } from './problem.js';

const X_LEAST = Math.log(2 * SEARCHED.wallLeast);
const X_GREATEST = Math.log(SEARCHED.outerGreatest);
const Y_LEAST = Math.log(SEARCHED.wallLeast);
const Y_GREATEST = Math.log(SEARCHED.outerGreatest / 2);

/** ln D within the sizes that are searched. */
export const withinX = (x: number): number => Math.min(Math.max(x, X_LEAST), X_GREATEST);
/** ln t within the sizes that are searched. */
export const withinY = (y: number): number => Math.min(Math.max(y, Y_LEAST), Y_GREATEST);

/**
 * Every limit and the objective at one size, as logarithms with their slopes: straight lines in x = ln D and y = ln t,
 * and the step that is best by them.
 */
export class Tangents {
  // where they were taken
  x = Number.NaN;
  y = Number.NaN;
  /** ln objective and its slopes */
  objective = Number.NaN;
  private gd = Number.NaN;
  private gt = Number.NaN;
  /** largest ln U past its level, and whose it is; −1 where no limit is there */
  excess = Number.NaN;
  lead = -1;
  // the step chosen, what merit should gain by it, and the least overfullness within reach
  stepX = Number.NaN;
  stepY = Number.NaN;
  predicted = Number.NaN;
  overfull = Number.NaN;
  /** ln of the least D/t */
  private readonly stoutest: number;
  private readonly polygon: Polygon;
  private readonly value: Float64Array;
  private readonly slopeD: Float64Array;
  private readonly slopeT: Float64Array;

  constructor(private readonly problem: Problem) {
    const n = problem.kernel.count;
    this.stoutest = Math.log(problem.slimmest);
    this.polygon = new Polygon(n + 2);
    this.value = new Float64Array(n);
    this.slopeD = new Float64Array(n);
    this.slopeT = new Float64Array(n);
  }

  /** Values and slopes of all checks and of the objective: one evaluation, over a box of no width. */
  measure(x: number, y: number): void {
    const { problem, value, slopeD, slopeT } = this;
    this.x = x;
    this.y = this.withBore(x, y);
    const { box, span, kernel } = problem;
    const outer = Math.exp(x);
    const wall = Math.exp(this.y);
    problem.evaluations++;
    kernel.bounds(box.set(outer, outer, wall, wall));
    this.excess = Number.NEGATIVE_INFINITY;
    this.lead = -1;
    for (let k = 0; k < kernel.count; k++) {
      const { lo, dLo, tLo } = kernel.spans[k] as Span;
      const past = Math.log(lo);
      value[k] = past;
      slopeD[k] = dLo;
      slopeT[k] = tLo;
      if (past > this.excess) {
        this.excess = past;
        this.lead = k;
      }
    }
    problem.objective.bound(box, span);
    this.objective = Math.log(span.lo);
    this.gd = span.dLo;
    this.gt = span.tLo;
  }

  /** ln t no greater than a tube of that D may have. */
  withBore(x: number, y: number): number {
    return Math.min(y, x - this.stoutest);
  }

  /** Slopes of the fullest limit. */
  get leadSlopes(): { readonly d: number; readonly t: number } {
    return { d: this.slopeD[this.lead] ?? 0, t: this.slopeT[this.lead] ?? 0 };
  }

  /** dln objective/dln t along the fullest limit. */
  reducedSlope(): number {
    if (this.lead < 0) return this.gt;
    const { d, t } = this.leadSlopes;
    return d === 0 ? Number.POSITIVE_INFINITY : this.gt - (this.gd * t) / d;
  }

  /**
   * Chooses the step within a square of the given radius that is best by the tangents.
   *
   * @param bend second derivative of ln objective along the fullest limit, by y
   * @param penalty what overfullness costs against ln objective
   */
  choose(radius: number, bend: number, penalty: number): void {
    let overfull = 0;
    if (!this.cutAt(radius, 0)) {
      let lower = 0;
      overfull = this.excess;
      while (overfull - lower > 1e-3 * overfull) {
        const middle = (lower + overfull) / 2;
        if (this.cutAt(radius, middle)) overfull = middle;
        else lower = middle;
      }
      this.cutAt(radius, overfull);
    }
    this.overfull = overfull;
    this.lowestStep(bend);
    const change = this.gd * this.stepX + this.gt * this.stepY + 0.5 * bend * this.stepY * this.stepY;
    this.predicted = penalty * (Math.max(0, this.excess) - overfull) - change;
  }

  /** Cuts the trust square, as far as sizes are searched, by every tangent at the given overfullness. */
  private cutAt(radius: number, overfull: number): boolean {
    const { polygon, value, slopeD, slopeT, x, y } = this;
    polygon.rectangle(
      Math.max(-radius, X_LEAST - x),
      Math.min(radius, X_GREATEST - x),
      Math.max(-radius, Y_LEAST - y),
      Math.min(radius, Y_GREATEST - y),
    );
    if (!polygon.cut(-1, 1, x - y - this.stoutest)) return false;
    for (let k = 0; k < value.length; k++) {
      const a = slopeD[k] ?? 0;
      const b = slopeT[k] ?? 0;
      const room = overfull - (value[k] ?? 0);
      if ((Math.abs(a) + Math.abs(b)) * radius <= room) continue;
      if (!polygon.cut(a, b, room)) return false;
    }
    return true;
  }

  /** The point of the polygon's edge where tangent and bend of the objective are least. */
  private lowestStep(bend: number): void {
    const { x, y, count } = this.polygon;
    let least = Number.POSITIVE_INFINITY;
    for (let i = 0; i < count; i++) {
      const x0 = x[i] ?? 0;
      const y0 = y[i] ?? 0;
      const ex = (x[(i + 1) % count] ?? 0) - x0;
      const ey = (y[(i + 1) % count] ?? 0) - y0;
      const along = this.gd * ex + this.gt * ey + bend * y0 * ey;
      const curve = bend * ey * ey;
      const s = along >= 0 ? 0 : curve > 0 ? Math.min(1, -along / curve) : 1;
      const px = x0 + s * ex;
      const py = y0 + s * ey;
      const cost = this.gd * px + this.gt * py + 0.5 * bend * py * py;
      if (cost < least) {
        least = cost;
        this.stepX = px;
        this.stepY = py;
      }
    }
  }
}
