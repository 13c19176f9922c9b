import { Look, WHOLE, type Witness } from './branch.js';
import { Descent, type Found } from './descend.js';
import { PASS, type Problem } from './problem.js';

/** Relative distance between the mass found and the mass that is proved to be out of reach. */
export const GAP = 9e-7;

/** Boxes looked at before the search gives up and reports the bound that it has; far more than any job needs. */
const PATIENCE = 200_000;

/** ln U that can be mended at most for one of ln objective: a tube's torsional stiffness goes with D³. */
const MENDED = 3;

export interface Least {
  /** the best size, or null where nothing passes */
  readonly found: Found | null;
  /** no size that passes has a smaller objective; +∞ where nothing passes */
  readonly lowerBound: number;
}

export interface Options {
  readonly start?: Start | undefined;
  /** is told of every box that was excluded */
  readonly witness?: Witness | undefined;
  /** stops at the first size that passes, with a lower bound of 0 */
  readonly anyWillDo?: boolean;
}

/** A start for the walk, m; what a neighbouring problem found, if there is one. */
export interface Start {
  readonly outerDiameter: number;
  readonly wall: number;
}

/**
 * The global least objective over all sizes, with its proof: a walk finds a candidate, then boxes of (D, t) that cover
 * everything searched are excluded one after another (branch and bound, Land & Doig; enclosures as in `Look`). A box
 * that cannot be excluded is tried for a better size, and else halved along its longer side.
 */
export function least(problem: Problem, { start, witness, anyWillDo = false }: Options = {}): Least {
  const descent = new Descent(problem);
  const look = new Look(problem);
  let best = walk(problem, descent, start ?? firstGuess(problem));
  let under = best === null ? Number.POSITIVE_INFINITY : best.value * (1 - GAP);
  if (anyWillDo && best !== null) return { found: best, lowerBound: 0 };
  let open = Number.POSITIVE_INFINITY;
  const stack: number[] = [...WHOLE];
  for (let boxes = 0; stack.length > 0; boxes++) {
    const t1 = stack.pop() as number;
    const t0 = stack.pop() as number;
    const d1 = stack.pop() as number;
    const d0 = stack.pop() as number;
    if (!look.at(d0, d1, t0, t1, under)) {
      witness?.(d0, d1, t0, t1, under);
      continue;
    }
    const w = Math.log(look.outerHi / look.outerLo);
    const h = Math.log(look.wallHi / look.wallLo);
    if (boxes > PATIENCE || Math.max(w, h) < 1e-9) {
      open = Math.min(open, problem.objective.value(problem.section.set(look.outerLo, look.wallLo)));
      continue;
    }
    witnessRim(witness, d0, d1, t0, t1, look, under);
    if (Math.max(w, h) < 0.5) {
      const better = tryBox(problem, descent, look, best);
      if (better !== null) {
        best = better;
        under = best.value * (1 - GAP);
        if (anyWillDo) return { found: best, lowerBound: 0 };
      }
    }
    const { outerLo, outerHi, wallLo, wallHi } = look;
    const whole = Math.log(d1 / d0) + Math.log(t1 / t0);
    if (w + h < 0.6 * whole) stack.push(outerLo, outerHi, wallLo, wallHi);
    else if (w > h) {
      const middle = Math.sqrt(outerLo * outerHi);
      stack.push(outerLo, middle, wallLo, wallHi, middle, outerHi, wallLo, wallHi);
    } else {
      const middle = Math.sqrt(wallLo * wallHi);
      stack.push(outerLo, outerHi, wallLo, middle, outerLo, outerHi, middle, wallHi);
    }
  }
  return { found: best, lowerBound: Math.min(under, open) };
}

function walk(problem: Problem, descent: Descent, from: Start): Found | null {
  const found = descent.from(from.outerDiameter, from.wall);
  return found.excess <= PASS ? found : null;
}

/** A tube of D/t = 40, scaled until its fullest limit would be full if all grew with the cube of size. */
function firstGuess(problem: Problem): Start {
  const outerDiameter = 0.05 * Math.exp(Math.min(problem.excess(0.05, 0.05 / 40), 12) / 3);
  return { outerDiameter, wall: outerDiameter / 40 };
}

/** Walks from the box's most promising point, where it lies under what is known. */
function tryBox(problem: Problem, descent: Descent, look: Look, best: Found | null): Found | null {
  const { bestOuter, bestWall } = look;
  const value = problem.objective.value(problem.section.set(bestOuter, bestWall));
  if (best !== null && (value >= best.value || isNear(best, look))) return null;
  // what is overfull costs mass to mend: not worth a walk where that eats up what would be saved
  if (best !== null && problem.excess(bestOuter, bestWall) > MENDED * Math.log(best.value / value)) return null;
  const found = walk(problem, descent, { outerDiameter: bestOuter, wall: bestWall });
  return found !== null && (best === null || found.value < best.value) ? found : null;
}

/** Whether a size lies in the box or within its breadth of it: a walk from the box would end there again. */
function isNear({ outerDiameter, wall }: Found, { outerLo, outerHi, wallLo, wallHi }: Look): boolean {
  const w = outerHi / outerLo;
  const h = wallHi / wallLo;
  return outerDiameter * w >= outerLo && outerDiameter <= outerHi * w && wall * h >= wallLo && wall <= wallHi * h;
}

/** The strips between a box and what was left of it. */
function witnessRim(
  witness: Witness | undefined,
  d0: number,
  d1: number,
  t0: number,
  t1: number,
  left: Look,
  under: number,
): void {
  if (witness === undefined) return;
  if (left.outerLo > d0) witness(d0, left.outerLo, t0, t1, under);
  if (left.outerHi < d1) witness(left.outerHi, d1, t0, t1, under);
  if (left.wallLo > t0) witness(left.outerLo, left.outerHi, t0, left.wallLo, under);
  if (left.wallHi < t1) witness(left.outerLo, left.outerHi, left.wallHi, t1, under);
}
