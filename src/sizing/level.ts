import type { Check } from '../limit/check.js';
import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import { OUTWARD, Span } from '../tube/span.js';

/** ln U is held within this, either way: where a limit asks for nothing at all U is 0. */
const FAR = 60;

/** The fullest of several checks, whose curve U = 1 a map draws: at a point, and over a box. */
export class Level {
  /** place of the fullest check at the point last looked at */
  fullest = 0;
  /** over the box last looked at: whether U may be 1 there */
  crossed = false;
  /** over the box last looked at: whether U can only grow, or only fall, with either size */
  steady = false;
  private readonly span = new Span();

  constructor(readonly checks: readonly Check[]) {}

  /** ln U at a point */
  at(section: Section): number {
    let most = -1;
    for (let i = 0; i < this.checks.length; i++) {
      const utilisation = (this.checks[i] as Check).utilisation(section);
      if (utilisation > most) {
        most = utilisation;
        this.fullest = i;
      }
    }
    return Math.min(Math.max(Math.log(most), -FAR), FAR);
  }

  /** ln U of one check at a point */
  one(place: number, section: Section): number {
    const utilisation = (this.checks[place] as Check).utilisation(section);
    return Math.min(Math.max(Math.log(utilisation), -FAR), FAR);
  }

  /** Looks at a box; checks that pass all over it have no part in the curve. */
  over(box: Box): void {
    const { span } = this;
    let [active, most] = [0, 0];
    let [d0, d1, t0, t1] = [Infinity, -Infinity, Infinity, -Infinity];
    for (const check of this.checks) {
      check.bound(box, span);
      most = Math.max(most, span.lo);
      if (span.hi <= 1 - OUTWARD) continue;
      active++;
      d0 = Math.min(d0, span.dLo);
      d1 = Math.max(d1, span.dHi);
      t0 = Math.min(t0, span.tLo);
      t1 = Math.max(t1, span.tHi);
    }
    this.crossed = active > 0 && most <= 1 + OUTWARD;
    this.steady = (d0 >= 0 || d1 <= 0) && (t0 >= 0 || t1 <= 0);
  }
}
