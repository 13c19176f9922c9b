import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import type { Span } from '../tube/span.js';

/** What is made least over (D, t): a positive measure of the tube, at a point and enclosed over a box. */
export interface Objective {
  value(at: Section): number;
  bound(over: Box, out: Span): void;
}

/** ρ·π(ro² − (ro − t)²)·L = ρπL·t(D − t), kg: the nominal wall, since that is what is bought. */
export class Mass implements Objective {
  /** ρπL, kg/m² */
  readonly perArea = Number.NaN;

  /**
   * @param density ρ, kg/m³
   * @param length L, m
   */
  constructor(density: number, length: number) {
    this.perArea = Math.PI * density * length;
  }

  value(at: Section): number {
    return this.of(at.outerDiameter, at.wall);
  }

  of(outerDiameter: number, wall: number): number {
    return this.perArea * wall * (outerDiameter - wall);
  }

  /** D − t = D(1 − v), v = t/D, has the slope 1/(1 − v) in D. */
  bound(over: Box, out: Span): void {
    const k0 = 1 / (1 - 1 / over.slimHi);
    const k1 = 1 / (1 - 1 / over.slimLo);
    const lo = Math.max(over.outerLo - over.wallHi, over.outerLo / k1) * over.wallLo;
    const hi = (over.outerHi - over.wallLo) * over.wallHi;
    out.homogeneous(this.perArea * lo, this.perArea * hi, k0, k1, 2);
  }
}
