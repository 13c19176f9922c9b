import { ELASTIC, finding } from './run.js';
import { row, type Row } from './row.js';
import { batdorf, long, moderate, oneTube, plate, torsion, type Wall } from './wall.js';

const SP8007 = 'NASA SP-8007 (1968), cylinders in torsion, from memory';
const SET =
  'Isotropic set of published formulas for one tube (E 72.4 GPa, ν 0.33, r 25, t 0.5, L 500 mm), formulas from memory';

/** The unit wall E = r = L = 1 with t/r = 1 shows a coefficient bare. */
const bare = (nu: number): Wall => ({ E: 1, nu, r: 1, t: 1, L: 1 });

const coefficients: readonly Row[] = [
  row({
    id: 'sp8007-moderate-any-nu',
    source: 'k = 0.85(γZ)^(3/4) of NASA SP-8007 written out for any ν; computed from first principles',
    inputs: { nu: 0 },
    expected: '0.6991',
    hand: () => (0.85 * Math.PI ** 2) / 12,
    code: ({ nu }, engine) => moderate(bare(nu), engine),
  }),
  row({
    id: 'sp8007-moderate-nu-exponent',
    source: 'k = 0.85(γZ)^(3/4) of NASA SP-8007 written out for any ν; computed from first principles',
    inputs: { nu: 0.3 },
    expected: '-0.625',
    hand: () => 3 / 8 - 1,
    code: ({ nu }, engine) => Math.log(moderate(bare(nu), engine) / moderate(bare(0), engine)) / Math.log(1 - nu ** 2),
  }),
  row({
    id: 'sp8007-moderate-nu-0.3',
    source: 'k = 0.85(γZ)^(3/4) of NASA SP-8007 at ν = 0.3; computed from first principles',
    inputs: { nu: 0.3 },
    expected: '0.7415',
    hand: ({ nu }) => plate(0.85 * batdorf(bare(nu)) ** 0.75, bare(nu)),
    code: ({ nu }, engine) => moderate(bare(nu), engine),
  }),
  row({
    id: 'sp8007-moderate-printed',
    source: `${SP8007}, explicit form for ν = 0.3`,
    inputs: { nu: 0.3 },
    expected: '0.747',
    offset: '0.993',
    // 0.85 is a rounded 0.856, which the explicit form keeps
    hand: ({ nu }) => plate(0.856 * batdorf(bare(nu)) ** 0.75, bare(nu)),
    code: ({ nu }, engine) => moderate(bare(nu), engine),
  }),
  row({
    id: 'sp8007-long-nu-0.3',
    source: `${SP8007}; Timoshenko and Gere, Theory of Elastic Stability, §11.13`,
    inputs: { nu: 0.3 },
    expected: '0.253',
    hand: ({ nu }) => 1 / (3 * Math.SQRT2 * (1 - nu ** 2) ** 0.75),
    code: ({ nu }, engine) => long(bare(nu), engine),
  }),
  row({
    id: 'sp8007-knockdown-in-long-form',
    source: `${SP8007}: γ^(3/4) = 0.67, so γ = 0.586 in the long form`,
    inputs: { kappa: 0.67, nu: 0.3 },
    expected: '0.586',
    hand: ({ kappa }) => kappa ** (4 / 3),
    code: ({ kappa, nu }, engine) => torsion(bare(nu), engine, kappa).longStress(1, 1) / long(bare(nu), engine),
  }),
  row({
    id: 'sp8007-regimes-meet',
    source: 'Medium above long form for γZ < 70.4(r/t)² at ν = 0.3; computed from first principles',
    inputs: { nu: 0.3, slenderness: 60 },
    expected: '70.4',
    hand: ({ nu }) => (1 / (3 * Math.SQRT2 * 0.6991)) ** -4 * (1 - nu ** 2),
    // τ_m/τ_l falls as L^(−1/2) and Z grows as L²
    code: ({ nu, slenderness }, engine) => {
      const x = { E: 1, nu, r: 1, t: 1 / slenderness, L: 1 };
      return (batdorf(x) * (moderate(x, engine) / long(x, engine)) ** 4) / slenderness ** 2;
    },
  }),
  row({
    id: 'donnell-long',
    source: 'Donnell, NACA Report 479 (1933), long tube, from memory',
    inputs: { nu: 0 },
    expected: '0.272',
    // Donnell's theory is 15 % above the exact value where two waves run round the tube
    offset: '0.867',
    hand: () => 0.77 / 2 ** 1.5,
    code: ({ nu }, engine) => long(bare(nu), engine),
  }),
];

const set: readonly Row[] = [
  row({
    id: 'set-batdorf-parameter',
    source: SET,
    inputs: oneTube,
    expected: '1.888e4',
    hand: batdorf,
    // from the stress back: Z = (12(1 − ν²)τ(L/t)²/(0.85π²E))^(4/3)
    code: (x, engine) => (moderate(x, engine) / plate(0.85, x)) ** (4 / 3),
  }),
  row({
    id: 'set-sp8007-moderate',
    source: `${SET}: NASA SP-8007, γ = 1`,
    inputs: oneTube,
    expected: '91.48 MPa',
    hand: (x) => plate(0.85 * batdorf(x) ** 0.75, x),
    code: moderate,
  }),
  row({
    id: 'set-sp8007-knocked-down',
    source: `${SET}: NASA SP-8007, γ^(3/4) = 0.67`,
    inputs: oneTube,
    expected: '61.29 MPa',
    hand: (x) => 0.67 * plate(0.85 * batdorf(x) ** 0.75, x),
    code: (x, engine) => torsion(x, engine, 0.67).moderateStress(x.r, x.t),
  }),
  row({
    id: 'set-critical-torque',
    source: `${SET}: NASA SP-8007, γ^(3/4) = 0.67`,
    inputs: oneTube,
    expected: '120.35 N·m',
    hand: (x) => 2 * Math.PI * x.r ** 2 * x.t * 0.67 * plate(0.85 * batdorf(x) ** 0.75, x),
    code: ({ E, nu, r, t, L }, engine) =>
      finding(engine, 'wall-buckling', {
        outerDiameter: 2 * r + t,
        wall: t,
        tube: { length: L },
        metal: { ...ELASTIC, youngsModulus: E, poissonRatio: nu },
        torsionKnockdown: 0.67,
      }).capacity,
  }),
  row({
    id: 'set-long',
    source: `${SET}: NASA SP-8007 very long form, not the one that holds`,
    inputs: oneTube,
    expected: '52.63 MPa',
    hand: ({ E, nu, r, t }) => (E / (3 * Math.SQRT2 * (1 - nu ** 2) ** 0.75)) * (t / r) ** 1.5,
    code: long,
  }),
  row({
    id: 'set-the-greater-holds',
    source: `${SET}: the regime rule is the greater of two`,
    inputs: oneTube,
    expected: '91.48 MPa',
    hand: (x) => Math.max(plate(0.85 * batdorf(x) ** 0.75, x), 52.63e6),
    code: (x, engine) => torsion(x, engine).stress(new engine.Section(0).set(2 * x.r + x.t, x.t)),
  }),
];

export const torsionBuckling: readonly Row[] = [...coefficients, ...set];
