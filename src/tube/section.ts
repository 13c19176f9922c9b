import type { Measure } from './measure.js';

/**
 * The checked section of a metal tube (engineering basis §1), set anew for every size so that the inner loop makes no
 * objects. Exact for thick walls: A = π(ro² − ri²), I = π/4(ro⁴ − ri⁴), J = 2I, written as products so that nothing
 * cancels. The nominal diameter is held and the wall is taken at its lower tolerance; the missing metal is missing at
 * the bore.
 */
export class Section {
  /** nominal outer diameter, m */
  outerDiameter = Number.NaN;
  /** nominal wall, m */
  wall = Number.NaN;
  /** r, the radius to the median line of the checked wall, m */
  meanRadius = Number.NaN;
  /** tc/r */
  thickness = Number.NaN;
  /** A, m² */
  area = Number.NaN;
  /** I/A, m² */
  gyrationSquared = Number.NaN;
  /** 1/I, m⁻⁴: many limits divide by it */
  perSecondMoment = Number.NaN;
  /** ro/J, m⁻³: shear stress at the surface for a unit of torque */
  shearPerTorque = Number.NaN;

  private readonly kept = Number.NaN;

  /** @param tolerance δ, the fraction by which the wall may be under nominal */
  constructor(tolerance: number) {
    this.kept = 1 - tolerance;
  }

  /** Takes the nominal outer diameter and wall, m. */
  set(outerDiameter: number, wall: number): this {
    const tc = wall * this.kept;
    const ro = outerDiameter / 2;
    const r = ro - tc / 2;
    this.outerDiameter = outerDiameter;
    this.wall = wall;
    this.meanRadius = r;
    this.thickness = tc / r;
    const area = 2 * Math.PI * r * tc;
    const gyrationSquared = r * r * 0.5 + tc * tc * 0.125;
    const secondMoment = area * gyrationSquared;
    const perSecondMoment = 1 / secondMoment;
    this.area = area;
    this.gyrationSquared = gyrationSquared;
    this.perSecondMoment = perSecondMoment;
    this.shearPerTorque = 0.5 * ro * perSecondMoment;
    return this;
  }

  // what the inner loop does not ask for

  /** tc, m */
  get checkedWall(): number {
    return this.wall * this.kept;
  }

  /** ro, m */
  get outerRadius(): number {
    return this.outerDiameter / 2;
  }

  /** I, m⁴ */
  get secondMoment(): number {
    return this.area * this.gyrationSquared;
  }

  /** J, m⁴ */
  get polarMoment(): number {
    const { secondMoment } = this;
    return 2 * secondMoment;
  }

  /** factor × the measure */
  multiple(measure: Measure, factor: number): number {
    const { outerDiameter, wall } = this;
    switch (measure) {
      case 0:
        return factor * this.shearPerTorque;
      case 1:
        return factor * this.perSecondMoment;
      case 2:
        return factor * outerDiameter;
      case 3:
        return factor / outerDiameter;
      case 4:
        return factor / wall;
      case 5:
        return factor * (outerDiameter / wall);
      case 6:
        return factor / (outerDiameter / wall);
      case 7:
        return factor / (outerDiameter - 2 * wall);
    }
  }

  /** The largest of factor × measure over all measures by number: the same as above, without a branch for each. */
  fullest(factors: Float64Array): number {
    const { outerDiameter, wall } = this;
    const slimness = outerDiameter / wall;
    return Math.max(
      (factors[0] as number) * this.shearPerTorque,
      (factors[1] as number) * this.perSecondMoment,
      (factors[2] as number) * outerDiameter,
      (factors[3] as number) / outerDiameter,
      (factors[4] as number) / wall,
      (factors[5] as number) * slimness,
      (factors[6] as number) / slimness,
      (factors[7] as number) / (outerDiameter - 2 * wall),
    );
  }
}
