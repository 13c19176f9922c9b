import type { LimitId } from '../report/report.js';
import type { WallBuckling } from '../buckling/wall.js';
import { Box } from '../tube/box.js';
import { MEASURES, type Measure } from '../tube/measure.js';
import type { Section } from '../tube/section.js';
import { Span } from '../tube/span.js';
import type { Check } from './check.js';
import { Groups } from './groups.js';

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
  private readonly groups: Groups;
  private readonly steps: readonly ((at: Section) => void)[];
  private readonly values: Float64Array;
  private readonly scales: Float64Array;
  private readonly eased: boolean;
  /** the wall's buckling where no other check is left, as under pure torsion */
  private readonly lone: WallBuckling | null;

  constructor(checks: readonly Check[], eased?: Eased) {
    const scale = ({ limit }: Check): number => (limit === eased?.limit ? 1 / eased.by : 1);
    for (const check of checks) {
      if (check.proportion === null) continue;
      const { measure, factor } = check.proportion;
      this.factors[measure] = Math.max(this.factors[measure] as number, factor * scale(check));
    }
    this.groups = new Groups(checks.filter(({ proportion }) => proportion === null));
    const { all } = this.groups;
    this.eased = eased !== undefined;
    this.scales = Float64Array.from(all, scale);
    this.values = new Float64Array(all.length);
    this.steps = this.groups.steps(this.values);
    this.lone = this.groups.lone;
    this.count = MEASURES + all.length;
    this.spans = Array.from({ length: this.count }, () => new Span().homogeneous(0, 0, 0, 0, 0));
    // any box will do: what is to be set is the slopes
    const box = new Box(0, 4).set(1, 1, 0.1, 0.1);
    this.factors.forEach((factor, place) => {
      if (factor > 0) box.multiple(place as Measure, factor, this.spans[place] as Span);
    });
  }

  /** The largest U at a point. */
  fullest(at: Section): number {
    const { values, scales, steps, lone } = this;
    if (lone !== null) return Math.max(at.fullest(this.factors), lone.utilisation(at) * (scales[0] as number));
    for (let i = 0; i < steps.length; i++) (steps[i] as (at: Section) => void)(at);
    let most = at.fullest(this.factors);
    for (let i = 0; i < values.length; i++) most = Math.max(most, (values[i] as number) * (scales[i] as number));
    return most;
  }

  /** One place at a point. */
  utilisation(place: number, at: Section): number {
    if (place < MEASURES) return at.multiple(place as Measure, this.factors[place] as number);
    const i = place - MEASURES;
    return (this.groups.all[i] as Check).utilisation(at) * (this.scales[i] as number);
  }

  /** Every place enclosed over a box, into `spans`. */
  bounds(over: Box): void {
    const { groups, scales, spans } = this;
    over.multiples(this.factors, spans);
    groups.bounds(over, spans, MEASURES);
    if (!this.eased) return;
    for (let i = 0; i < scales.length; i++) {
      const span = spans[MEASURES + i] as Span;
      span.scaled(span, scales[i] as number);
    }
  }
}
