import { PASS, type Problem } from './problem.js';
import { Tangents, withinX, withinY } from './tangents.js';

/** A size that passes, or the least overfull one that was found, with its objective. */
export interface Found {
  readonly outerDiameter: number;
  readonly wall: number;
  readonly value: number;
  /** largest ln U past its level; the size passes where it is ≤ 1e-9 */
  readonly excess: number;
}

/**
 * What a violated limit costs against ln objective, one after another: each must beat the limit's price, a ratio of
 * slopes, which is seldom over 10 but has no bound where a limit hardly depends on the wall.
 */
const PENALTIES = [30, 3e3, 3e5, 3e7] as const;
/** ln U past its level from which no price would bring the walk to a size that passes. */
const HOPELESS = 0.05;
/** Share of the predicted gain that a step must make to be trusted further. */
const GOOD = 0.7;
/** Overfullness for the length of a step, up to which it counts as the limit's bend. */
const CURVED = 0.5;
const STEPS = 80;
const LEAST_STEP = 1e-11;
/** ln objective that is not worth a step; where the optimum is smooth, sizes are then good to 1e-7. */
const LEAST_GAIN = 3e-14;

/**
 * Walks from a size to a local least objective. In logarithms the limits are nearly linear: each step cuts a square
 * round the point by every limit's tangent, and goes to the point of what is left where a model of the objective is
 * least: its tangent and, once two points lie on one limit, the bend of the objective along that limit (successive
 * linear programming with a trust region and a secant for the curvature). Where a long step leaves the limit because that
 * bends, it is carried back to it before it is judged (second-order correction; Fletcher 1982, from memory). At a corner
 * of two limits the steps shrink quadratically.
 */
export class Descent {
  private readonly tangents: Tangents;

  constructor(private readonly problem: Problem) {
    this.tangents = new Tangents(problem);
  }

  from(outerDiameter: number, wall: number): Found {
    const { tangents } = this;
    let radius = 1;
    tangents.measure(withinX(Math.log(outerDiameter)), withinY(Math.log(wall)));
    for (const penalty of PENALTIES) {
      this.walk(radius, penalty);
      if (tangents.excess <= 1e-7 || tangents.excess > HOPELESS) break;
      radius = 0.1;
    }
    return this.settle();
  }

  private walk(within: number, penalty: number): void {
    const { tangents } = this;
    let radius = within;
    let bend = 0;
    for (let step = 0; step < STEPS && radius > LEAST_STEP; step++) {
      const { lead, x, y } = tangents;
      const merit = this.merit(penalty);
      const reduced = tangents.reducedSlope();
      tangents.choose(radius, bend, penalty);
      const { predicted } = tangents;
      if (predicted < LEAST_GAIN || this.stuck()) break;
      tangents.measure(x + tangents.stepX, y + tangents.stepY);
      if (merit - this.merit(penalty) < GOOD * predicted) this.backToLimit(x, y);
      const gained = merit - this.merit(penalty);
      const dy = tangents.y - y;
      const reach = Math.max(Math.abs(tangents.x - x), Math.abs(dy));
      if (gained < 0.1 * predicted && gained < 1e-13) {
        tangents.measure(x, y);
        if (reach < 1e-9) break;
        radius = reach / 4;
        continue;
      }
      if (gained > GOOD * predicted && reach > 0.9 * radius) radius *= 2;
      const change = (tangents.reducedSlope() - reduced) / dy;
      bend = tangents.lead === lead && change > 0 && Number.isFinite(change) ? change : 0;
      if (reach < LEAST_STEP) break;
    }
  }

  private merit(penalty: number): number {
    return this.tangents.objective + penalty * Math.max(0, this.tangents.excess);
  }

  /** Whether overfullness hardly falls as far as the tangents reach: nothing fits here. */
  private stuck(): boolean {
    const { excess, overfull } = this.tangents;
    return excess > HOPELESS && overfull > 0.9 * excess;
  }

  /** A limit bends away under a long step along it: goes from there straight back to it. */
  private backToLimit(fromX: number, fromY: number): void {
    const { tangents } = this;
    const { excess, x, y } = tangents;
    if (!(excess > 0 && excess < CURVED * Math.max(Math.abs(x - fromX), Math.abs(y - fromY)))) return;
    const { d, t } = tangents.leadSlopes;
    const back = excess / (d * d + t * t);
    tangents.measure(withinX(x - back * d), withinY(y - back * t));
  }

  /** Moves the last rounding's worth to the safe side, by outer diameter or by wall, where that is what is full. */
  private settle(): Found {
    const { problem, tangents } = this;
    let { x, y } = tangents;
    let excess = problem.excess(Math.exp(x), Math.exp(y));
    for (let tries = 0; tries < 4 && excess > 0.1 * PASS && excess < 1e-4; tries++) {
      tangents.measure(x, y);
      const { d, t } = tangents.leadSlopes;
      const size = d * d + t * t;
      x -= (excess * d) / size;
      y = tangents.withBore(x, y - (excess * t) / size);
      excess = problem.excess(Math.exp(x), Math.exp(y));
    }
    const outerDiameter = Math.exp(x);
    const wall = Math.exp(y);
    const value = problem.objective.value(problem.section.set(outerDiameter, wall));
    return { outerDiameter, wall, value, excess };
  }
}
