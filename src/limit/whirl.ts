import type { LoadCase, Speed } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import { times, type Span } from '../tube/span.js';
import type { Check, Limit, Pair } from './check.js';

/** The stiffness that thrust and torque leave, squared, is never taken below this. */
const LEAST_LEFT = 1e-6;

/** More than rounding can do to 1 − v: near 0 it is absolute, so it is allowed for before the root magnifies it. */
const ROUNDING = 1e-14;

/**
 * First whirl speed of a span, simply supported, with shear and rotary inertia, softened by thrust and torque at limit
 * load: ω₁ = (π/Ls)²√(EI/(ρA))/√(1 + z)·√(1 − v), z = (π/Ls)²(I/A)(1 + E/(κs·G)), v = P/P_E + (T/T_cr)².
 */
export class WhirlSpeed {
  private readonly stiffness = Number.NaN;
  private readonly shear = Number.NaN;
  private readonly thrust = Number.NaN;
  private readonly torque = Number.NaN;
  private readonly demand = Number.NaN;

  /**
   * @param span Ls, m
   * @param demand Ω that ω₁ is compared with, rad/s
   */
  constructor(load: LoadCase, metal: Metal, span: number, demand = 1) {
    this.demand = demand;
    const { youngsModulus, shearModulus, poissonRatio, density } = metal;
    const wave = Math.PI / span;
    // thin round tube: G. R. Cowper, J. Appl. Mech. 33 (1966), from memory
    const shearCoefficient = (2 * (1 + poissonRatio)) / (4 + 3 * poissonRatio);
    this.stiffness = wave * wave * Math.sqrt(youngsModulus / density);
    this.shear = wave * wave * (1 + youngsModulus / (shearCoefficient * shearModulus));
    this.thrust = Math.max(0, -load.axial) / (wave * wave * youngsModulus);
    this.torque = (Math.abs(load.torque) * span) / (2 * Math.PI * youngsModulus);
  }

  /** ω₁, rad/s */
  speed(at: Section): number {
    const { gyrationSquared: g, perSecondMoment } = at;
    const twisting = this.torque * perSecondMoment;
    const left = Math.max(1 - this.thrust * perSecondMoment - twisting * twisting, LEAST_LEFT);
    return this.stiffness * Math.sqrt((g * left) / (1 + this.shear * g));
  }

  /**
   * Ω/ω₁ over a box. The slopes of ω₁ are those of I/A times 1/(2(1 + z)), and those of I times what thrust and torque
   * take: (½·P/P_E + (T/T_cr)²)/(1 − v), or 0 where 1 − v is held.
   */
  ratioOver({ gyrationSquared: g, perSecondMoment: c }: Box, out: Span): void {
    const { shear, stiffness, thrust, torque, demand } = this;
    const z0 = 1 / (1 + shear * g.lo);
    const z1 = 1 / (1 + shear * g.hi);
    const p0 = thrust * c.lo;
    const p1 = thrust * c.hi;
    const s0 = torque * c.lo;
    const s1 = torque * c.hi;
    const t0 = s0 * s0;
    const t1 = s1 * s1;
    const most = Math.max(1 - p0 - t0 + ROUNDING, LEAST_LEFT);
    const least = Math.max(1 - p1 - t1 - ROUNDING, LEAST_LEFT);
    const f0 = least > LEAST_LEFT ? (0.5 * p0 + t0) / most : 0;
    const f1 = most > LEAST_LEFT ? (0.5 * p1 + t1) / least : 0;
    out.lo = demand / (stiffness * Math.sqrt(g.hi * z1 * most));
    out.hi = demand / (stiffness * Math.sqrt(g.lo * z0 * least));
    out.dLo = -times(g.dHi, 0.5 * z0, 0.5 * z1) - times(-c.dLo, f1, f0);
    out.dHi = -times(g.dLo, 0.5 * z1, 0.5 * z0) - times(-c.dHi, f0, f1);
    out.tLo = -times(g.tHi, 0.5 * z0, 0.5 * z1) - times(-c.tLo, f1, f0);
    out.tHi = -times(g.tLo, 0.5 * z1, 0.5 * z0) - times(-c.tHi, f0, f1);
  }
}

export class Whirl implements Check {
  readonly limit = 'whirl';
  readonly proportion = null;
  private readonly first: WhirlSpeed;
  private readonly demand = Number.NaN;

  constructor(
    readonly load: number,
    loadCase: LoadCase,
    metal: Metal,
    span: number,
    { max, margin }: Speed,
  ) {
    this.demand = margin * max;
    this.first = new WhirlSpeed(loadCase, metal, span, this.demand);
  }

  utilisation(at: Section): number {
    return this.demand / this.first.speed(at);
  }

  bound(over: Box, out: Span): void {
    this.first.ratioOver(over, out);
  }

  pair(at: Section): Pair {
    return { demand: this.demand, capacity: this.first.speed(at), interaction: false };
  }
}

/** First whirl speed against the running speed with its margin. */
export const whirl: Limit = {
  id: 'whirl',
  label: 'whirl',
  unit: 'rad/s',
  formula: 'U = margin·Ω_max/ω₁, ω₁ = (π/Ls)²√(EI/(ρA))/√(1 + (π/Ls)²(I/A)(1 + E/(κs·G)))·√(1 − P/P_E − (T/T_cr)²)',
  source:
    'Timoshenko beam, first mode; Cowper 1966 for κs; softening by thrust and torque, Southwell & Gough 1921; from memory',
  prepare: ({ loads, tube, speed }, metal) =>
    speed === null ? [] : loads.map((load, index) => new Whirl(index, load, metal, tube.supportSpacing, speed)),
};
