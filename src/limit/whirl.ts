import type { LoadCase, Speed } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { Box } from '../tube/box.js';
import type { Section } from '../tube/section.js';
import { Span } from '../tube/span.js';
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
  private readonly c = new Span();

  /** @param span Ls, m */
  constructor(load: LoadCase, metal: Metal, span: number) {
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

  /** ω₁ over a box. */
  speedOver(over: Box, out: Span): void {
    const g = over.gyrationSquared;
    const z0 = this.shear * g.lo;
    const z1 = this.shear * g.hi;
    const lo = this.stiffness * Math.sqrt(g.lo / (1 + z0));
    const hi = this.stiffness * Math.sqrt(g.hi / (1 + z1));
    out.growing(g, 0.5 / (1 + z1), 0.5 / (1 + z0));
    out.lo = lo;
    out.hi = hi;
    if (this.thrust > 0 || this.torque > 0) out.product(out, this.leftOver(over, this.c));
  }

  /** √(1 − v) over a box: dln√(1 − v)/dln I = (½·P/P_E + (T/T_cr)²)/(1 − v), and 0 where it is held. */
  private leftOver(over: Box, out: Span): Span {
    const { secondMoment, perSecondMoment: c } = over;
    const p0 = this.thrust * c.lo;
    const p1 = this.thrust * c.hi;
    const s0 = this.torque * c.lo;
    const s1 = this.torque * c.hi;
    const t0 = s0 * s0;
    const t1 = s1 * s1;
    const most = Math.max(1 - p0 - t0 + ROUNDING, LEAST_LEFT);
    const least = Math.max(1 - p1 - t1 - ROUNDING, LEAST_LEFT);
    const f0 = least > LEAST_LEFT ? (0.5 * p0 + t0) / most : 0;
    const f1 = most > LEAST_LEFT ? (0.5 * p1 + t1) / least : 0;
    out.growing(secondMoment, f0, f1);
    out.lo = Math.sqrt(least);
    out.hi = Math.sqrt(most);
    return out;
  }
}

class Whirl implements Check {
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
    this.first = new WhirlSpeed(loadCase, metal, span);
    this.demand = margin * max;
  }

  utilisation(at: Section): number {
    return this.demand / this.first.speed(at);
  }

  bound(over: Box, out: Span): void {
    this.first.speedOver(over, out);
    out.inverse(out, this.demand);
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
