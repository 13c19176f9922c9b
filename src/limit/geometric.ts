import type { LimitId } from '../report/report.js';
import type { Box } from '../tube/box.js';
import { MEASURE, type Measure } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';
import type { Check, Pair, Proportion } from './check.js';

/** A nominal size that a geometric limit holds from below, from above or both: its value, and the measures for it. */
interface Size<Itself extends Measure | null> {
  readonly at: (section: Section) => number;
  readonly itself: Itself;
  readonly reciprocal: Measure;
}

export const OUTER_DIAMETER: Size<Measure> = {
  at: ({ outerDiameter }) => outerDiameter,
  itself: MEASURE.outerDiameter,
  reciprocal: MEASURE.perOuterDiameter,
};

export const SLIMNESS: Size<Measure> = {
  at: ({ outerDiameter, wall }) => outerDiameter / wall,
  itself: MEASURE.slimness,
  reciprocal: MEASURE.perSlimness,
};

export const WALL: Size<null> = { at: ({ wall }) => wall, itself: null, reciprocal: MEASURE.perWall };

export const BORE: Size<null> = {
  at: ({ outerDiameter, wall }) => outerDiameter - 2 * wall,
  itself: null,
  reciprocal: MEASURE.perBore,
};

/** U = size/greatest. */
export class AtMost implements Check {
  readonly load = null;
  readonly proportion: Proportion;

  constructor(
    readonly limit: LimitId,
    private readonly size: Size<Measure>,
    private readonly greatest: number,
  ) {
    this.proportion = { measure: size.itself, factor: 1 / greatest };
  }

  utilisation(at: Section): number {
    return this.size.at(at) / this.greatest;
  }

  bound(over: Box, out: Span): void {
    over.multiple(this.proportion.measure, this.proportion.factor, out);
  }

  pair(at: Section): Pair {
    return { demand: this.size.at(at), capacity: this.greatest, interaction: false };
  }
}

/** U = least/size. */
export class AtLeast implements Check {
  readonly load = null;
  readonly proportion: Proportion;

  constructor(
    readonly limit: LimitId,
    private readonly size: Size<Measure | null>,
    private readonly least: number,
  ) {
    this.proportion = { measure: size.reciprocal, factor: least };
  }

  utilisation(at: Section): number {
    return this.least / this.size.at(at);
  }

  bound(over: Box, out: Span): void {
    over.multiple(this.proportion.measure, this.proportion.factor, out);
  }

  pair(at: Section): Pair {
    return { demand: this.least, capacity: this.size.at(at), interaction: false };
  }
}
