import type { Check, Pair } from '../limit/check.js';
import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';
import type { MapWindow } from './mapScale.js';

/** One side of a window, as if it were a limit: the region ends there. */
class Rim implements Check {
  readonly limit = 'outer-diameter';
  readonly load = null;
  readonly proportion = null;

  /**
   * @param of which size
   * @param edge m
   * @param way 1 where the size may be no greater than the edge, −1 where it may be no less
   */
  constructor(
    private readonly of: 'outer' | 'wall',
    private readonly edge: number,
    private readonly way: 1 | -1,
  ) {}

  utilisation({ outerDiameter, wall }: Section): number {
    return this.ratio(this.of === 'outer' ? outerDiameter : wall);
  }

  bound(over: Box, out: Span): void {
    const [lo, hi] = this.of === 'outer' ? [over.outerLo, over.outerHi] : [over.wallLo, over.wallHi];
    const slope = this.of === 'outer' ? this.way : 0;
    const ends = [this.ratio(lo), this.ratio(hi)] as const;
    out.homogeneous(Math.min(...ends), Math.max(...ends), slope, slope, this.way);
  }

  pair(): Pair {
    return { demand: Number.NaN, capacity: this.edge, interaction: false };
  }

  private ratio(size: number): number {
    return this.way > 0 ? size / this.edge : this.edge / size;
  }
}

/** The sides of a window; none where it begins at zero. */
export function rims({ outerLo, outerHi, wallLo, wallHi }: MapWindow): readonly Check[] {
  const sides = [new Rim('outer', outerHi, 1), new Rim('wall', wallHi, 1)];
  if (outerLo > 0) sides.push(new Rim('outer', outerLo, -1));
  if (wallLo > 0) sides.push(new Rim('wall', wallLo, -1));
  return sides;
}
