import type { Job, LoadCase } from '../../src/job/job.js';
import type { Metal } from '../../src/material/material.js';
import type { LimitId } from '../../src/report/report.js';

/**
 * Every limit on a metal tube written a second time, straight from the engineering basis: plain powers, exact
 * polynomials of the radii, nothing hoisted and nothing taken from the engine but its types. SI units.
 */

const { PI, abs, max, min, sqrt } = Math;
const power = (base: number, exponent: number): number => Math.pow(base, exponent);

/** A tube as it is checked: the wall at its lower tolerance, the nominal outer diameter held. */
export interface Tube {
  readonly ro: number;
  readonly ri: number;
  readonly r: number;
  readonly tc: number;
  readonly A: number;
  readonly I: number;
  readonly J: number;
}

export interface Utilisation {
  readonly limit: LimitId;
  /** index of the load case; null where the limit does not depend on load */
  readonly load: number | null;
  readonly U: number;
}

export function tubeOf(metal: Metal, D: number, t: number): Tube {
  const tc = t * (1 - metal.wallTolerance);
  const ro = D / 2;
  const ri = ro - tc;
  // ro² − ri² and ro⁴ − ri⁴ by their factors, so that a thin wall keeps its digits
  const A = PI * tc * (ro + ri);
  const I = (PI / 4) * (power(ro, 2) + power(ri, 2)) * tc * (ro + ri);
  return { ro, ri, r: (ro + ri) / 2, tc, A, I, J: 2 * I };
}

/** ρ·π(ro² − (ro − t)²)·L, kg */
export function massOf(job: Job, metal: Metal, D: number, t: number): number {
  return metal.density * PI * t * (D - t) * job.tube.length;
}

/** F(e; p) */
export function tangentParabola(e: number, p: number): number {
  return e >= p / 2 ? p * (1 - p / (4 * e)) : e;
}

/** ½[c + √(c² + 4s²)] */
const interactionRoot = (c: number, s: number): number => (c + sqrt(power(c, 2) + 4 * power(s, 2))) / 2;

const thrustOf = (load: LoadCase): number => max(0, -load.axial);

function eulerLoad(job: Job, metal: Metal, { I }: Tube): number {
  return (power(PI, 2) * metal.youngsModulus * I) / power(job.tube.supportSpacing, 2);
}

/** M* = M/(1 − n·P/P_E), held at 1000 M */
function amplified(job: Job, metal: Metal, tube: Tube, load: LoadCase, n: number): number {
  return load.bending / (1 - min((n * thrustOf(load)) / eulerLoad(job, metal, tube), 0.999));
}

function strength(job: Job, metal: Metal, tube: Tube, load: LoadCase, n: number, Ft: number, Fs: number): number {
  const tau = (abs(load.torque) * tube.ro) / tube.J;
  const sigma = abs(load.axial) / tube.A + (amplified(job, metal, tube, load, n) * tube.ro) / tube.I;
  return (n * sqrt(power(sigma / Ft, 2) + power(tau / Fs, 2))) / metal.jointFactor;
}

/** τ_e, the larger of the moderately long and the long form */
export function elasticShearBuckling(job: Job, metal: Metal, { r, tc }: Tube): number {
  const { youngsModulus: E, poissonRatio: nu } = metal;
  const kappa = job.buckling.torsionKnockdown;
  const m = 1 - power(nu, 2);
  const moderate =
    ((kappa * 0.85 * power(PI, 2)) / 12) * E * power(m, -5 / 8) * power(tc / r, 5 / 4) * sqrt(r / job.tube.length);
  const long = ((power(kappa, 4 / 3) * E) / (3 * sqrt(2) * power(m, 3 / 4))) * power(tc / r, 3 / 2);
  return max(moderate, long);
}

function wallBuckling(job: Job, metal: Metal, tube: Tube, load: LoadCase): number {
  const { r, tc } = tube;
  const { youngsModulus: E, poissonRatio: nu } = metal;
  const n = load.bucklingFactor;
  const plateau = min(metal.shearUltimate, 1.2 * metal.shearYield);
  const tauCr = tangentParabola(elasticShearBuckling(job, metal, tube), plateau);
  const phi = sqrt(r / tc) / 16;
  const direct = (loss: number): number => {
    const gamma = 1 - loss * (1 - Math.exp(-phi));
    const elastic = ((gamma * E) / sqrt(3 * (1 - power(nu, 2)))) * (tc / r);
    return tangentParabola(elastic, metal.compressiveYield);
  };
  const Rs = (n * abs(load.torque)) / (2 * PI * power(r, 2) * tc) / tauCr;
  const Rc = (n * thrustOf(load)) / (2 * PI * r * tc) / direct(0.901);
  const Rb = (n * amplified(job, metal, tube, load, n)) / (PI * power(r, 2) * tc) / direct(0.731);
  return interactionRoot(Rc + Rb, Rs);
}

function column(job: Job, metal: Metal, tube: Tube, load: LoadCase): number {
  const n = load.bucklingFactor;
  const Pcr = tube.A * tangentParabola(eulerLoad(job, metal, tube) / tube.A, metal.compressiveYield);
  const Tcr = (2 * PI * metal.youngsModulus * tube.I) / job.tube.supportSpacing;
  return interactionRoot((n * thrustOf(load)) / Pcr, (n * abs(load.torque)) / Tcr);
}

/** ω₁, rad/s */
export function whirlSpeed(job: Job, metal: Metal, tube: Tube, load: LoadCase): number {
  const { youngsModulus: E, shearModulus: G, poissonRatio: nu, density } = metal;
  const { A, I } = tube;
  const Ls = job.tube.supportSpacing;
  const kappaS = (2 * (1 + nu)) / (4 + 3 * nu);
  const Tcr = (2 * PI * E * I) / Ls;
  const left = 1 - thrustOf(load) / eulerLoad(job, metal, tube) - power(load.torque / Tcr, 2);
  const slow = 1 + power(PI / Ls, 2) * (I / A) * (1 + E / (kappaS * G));
  return (power(PI / Ls, 2) * sqrt((E * I) / (density * A)) * sqrt(max(left, 1e-6))) / sqrt(slow);
}

function loaded(job: Job, metal: Metal, tube: Tube, load: LoadCase): [LimitId, number][] {
  const { torque, twistMax, shearStressMax } = load;
  const { ro, J } = tube;
  const { tensileYield, shearYield, tensileUltimate, shearUltimate, shearModulus } = metal;
  const all: [LimitId, number | null][] = [
    ['shear-yield', strength(job, metal, tube, load, load.yieldFactor, tensileYield, shearYield)],
    ['shear-ultimate', strength(job, metal, tube, load, load.ultimateFactor, tensileUltimate, shearUltimate)],
    ['shear-allowable', shearStressMax === null ? null : (abs(torque) * ro) / J / shearStressMax],
    ['twist', twistMax === null ? null : (abs(torque) * job.tube.length) / (shearModulus * J) / twistMax],
    ['wall-buckling', wallBuckling(job, metal, tube, load)],
    ['column', column(job, metal, tube, load)],
    ['whirl', job.speed && (job.speed.margin * job.speed.max) / whirlSpeed(job, metal, tube, load)],
  ];
  return all.filter((entry): entry is [LimitId, number] => entry[1] !== null);
}

function geometric(job: Job, metal: Metal, D: number, t: number): [LimitId, number][] {
  const { wallMin, outerDiameterMax, outerDiameterMin, boreMin, diameterToWallMin, diameterToWallMax } = job.tube;
  const bore = D - 2 * t;
  return [
    ['wall-min', max(metal.wallMin, wallMin ?? 0) / t],
    ['outer-diameter', max(outerDiameterMax === null ? 0 : D / outerDiameterMax, (outerDiameterMin ?? 0) / D)],
    ['bore', boreMin === null ? 0 : bore > 0 ? boreMin / bore : Infinity],
    ['diameter-to-wall', max(diameterToWallMin / (D / t), D / t / diameterToWallMax)],
  ];
}

/** How full every limit is at a size, m, limit by limit and load by load. The tube must have a bore: D > 2t. */
export function utilisations(job: Job, metal: Metal, D: number, t: number): Utilisation[] {
  const tube = tubeOf(metal, D, t);
  return [
    ...job.loads.flatMap((load, index) =>
      loaded(job, metal, tube, load).map(([limit, U]) => ({ limit, load: index, U })),
    ),
    ...geometric(job, metal, D, t).map(([limit, U]) => ({ limit, load: null, U })),
  ];
}

/** The largest utilisation at a size, m; +∞ where there is no bore. Limits named in `lifted` do not count. */
export function fullest(job: Job, metal: Metal, D: number, t: number, lifted?: ReadonlySet<LimitId>): number {
  if (!(t > 0 && D > 2 * t)) return Infinity;
  return max(0, ...utilisations(job, metal, D, t).map(({ limit, U }) => (lifted?.has(limit) === true ? 0 : U)));
}
