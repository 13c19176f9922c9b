/** What part of the plane of sizes a map shows, m; both axes linear or both logarithmic. */
export interface MapWindow {
  readonly outerLo: number;
  readonly outerHi: number;
  readonly wallLo: number;
  readonly wallHi: number;
  readonly log: boolean;
}

/** A tube on the map; m. */
export interface MapPoint {
  readonly outerDiameter: number;
  readonly wall: number;
}

/** How far past the window is looked, as a share of it, so that nothing that matters lies on the rim of what is looked at. */
const BEYOND = 0.031;

/** Where an axis that begins at zero is looked at from, as a share of it: a tube has a wall. */
const FLOOR = 2e-4;

/** One axis: 0 to 1 across the window. */
export class AxisScale {
  private readonly from: number;
  private readonly span: number;

  constructor(
    lo: number,
    hi: number,
    private readonly log: boolean,
  ) {
    this.from = log ? Math.log(lo) : lo;
    this.span = (log ? Math.log(hi) : hi) - this.from;
  }

  /** size, m, at a share of the axis */
  at(share: number): number {
    const value = this.from + share * this.span;
    return this.log ? Math.exp(value) : value;
  }

  /** share of the axis at a size, m */
  share(size: number): number {
    return ((this.log ? Math.log(size) : size) - this.from) / this.span;
  }

  /** Least share that is looked at. */
  get least(): number {
    return this.at(-BEYOND) > 0 ? -BEYOND : this.share(this.at(0) + FLOOR * this.span);
  }

  get greatest(): number {
    return 1 + BEYOND;
  }
}

/** Both axes of a map. */
export class MapScale {
  readonly outer: AxisScale;
  readonly wall: AxisScale;

  constructor({ outerLo, outerHi, wallLo, wallHi, log }: MapWindow) {
    this.outer = new AxisScale(outerLo, outerHi, log);
    this.wall = new AxisScale(wallLo, wallHi, log);
  }
}
