import type { LimitId } from '../report/report.js';
import type { Box } from '../tube/box.js';
import { MEASURES, type Measure } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import { Span } from '../tube/span.js';
import type { Check } from './check.js';

/** A limit that passes at U ≤ by, in every load case. */
export interface Eased {
  readonly limit: LimitId;
  readonly by: number;
}

/**
 * The checks of a problem as the search evaluates them, far faster than one by one. Of the checks that are multiples of
 * one measure of the tube only the strictest is kept: whatever passes it passes the others. So the first places belong
 * to the measures, by number, with U = 0 where no check goes by one; the checks that are no such multiples follow. An
 * eased limit is U over its level, so that every place passes at 1.
 */
export class Kernel {
  /** places: the measures and the checks after them */
  readonly count: number;
  /** U of every place over the box last looked at */
  readonly spans: readonly Span[];
  private readonly factors = new Float64Array(MEASURES);
  private readonly others: readonly Check[];
  private readonly scales: Float64Array;

  constructor(checks: readonly Check[], eased?: Eased) {
    const scale = ({ limit }: Check): number => (limit === eased?.limit ? 1 / eased.by : 1);
    for (const check of checks) {
      if (check.proportion === null) continue;
      const { measure, factor } = check.proportion;
      this.factors[measure] = Math.max(this.factors[measure] as number, factor * scale(check));
    }
    this.others = checks.filter(({ proportion }) => proportion === null);
    this.scales = Float64Array.from(this.others, scale);
    this.count = MEASURES + this.others.length;
    this.spans = Array.from({ length: this.count }, () => new Span().homogeneous(0, 0, 0, 0, 0));
  }

  /** The largest U at a point. */
  fullest(at: Section): number {
    const { others, scales } = this;
    let most = at.fullest(this.factors);
    for (let i = 0; i < others.length; i++) {
      most = Math.max(most, (others[i] as Check).utilisation(at) * (scales[i] as number));
    }
    return most;
  }

  /** One place at a point. */
  utilisation(place: number, at: Section): number {
    if (place < MEASURES) return at.multiple(place as Measure, this.factors[place] as number);
    const i = place - MEASURES;
    return (this.others[i] as Check).utilisation(at) * (this.scales[i] as number);
  }

  /** Every place enclosed over a box, into `spans`. */
  bounds(over: Box): void {
    const { others, scales, spans } = this;
    over.multiples(this.factors, spans);
    for (let i = 0; i < others.length; i++) {
      const span = spans[MEASURES + i] as Span;
      (others[i] as Check).bound(over, span);
      if (scales[i] !== 1) span.scaled(span, scales[i] as number);
    }
  }
}
