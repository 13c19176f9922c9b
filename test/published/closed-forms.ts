import type { Engine } from './engine.js';
import { designInHand, lightest, type Question } from './run.js';
import { row, type Row } from './row.js';

/**
 * Wall buckling alone, in pure torsion: with s = t/r the torque is 2πr³·s·F(τ_e; Fp) and the mass goes with r²·s. Each
 * form is derived by trying every s, not by the calculus that gave it.
 */
const OWN = 'Closed form of least mass under wall buckling alone; derived here by numeric search';

interface Wrung {
  readonly torque: number;
  readonly L: number;
  readonly E: number;
  readonly nu: number;
  readonly Fp: number;
  readonly density: number;
}

const long = { torque: '500 N·m', L: '6 m', E: '210 GPa', nu: 0.3, Fp: '100 MPa', density: '7850 kg/m³' } as const;
const moderate = { ...long, torque: '5 kN·m', L: '0.5 m' } as const;

const F = (e: number, p: number): number => (e >= p / 2 ? p * (1 - p / (4 * e)) : e);

/** K·E of τ_l = K·E·s^(3/2), no knock-down */
const longStiffness = ({ E, nu }: Wrung): number => E / (3 * Math.SQRT2 * (1 - nu ** 2) ** 0.75);

/** τ_m of a wall of thickness s = t/r and radius r, no knock-down */
const moderateStress = ({ E, nu, L }: Wrung, s: number, r: number): number =>
  0.85 * (Math.PI ** 2 / 12) * E * (1 - nu ** 2) ** -0.625 * s ** 1.25 * Math.sqrt(r / L);

/** The radius at which a wall of thickness s is full of torque, by bisection: strength grows with r. */
function fullRadius(x: Wrung, s: number, stress: (s: number, r: number) => number): number {
  let [lo, hi] = [1e-4, 1];
  for (let turn = 0; turn < 60; turn++) {
    const r = Math.sqrt(lo * hi);
    if (2 * Math.PI * r ** 3 * s * F(stress(s, r), x.Fp) < x.torque) lo = r;
    else hi = r;
  }
  return hi;
}

/** The lightest tube, by golden section in ln s. */
function searched(x: Wrung, stress: (s: number, r: number) => number): { mass: number; working: number } {
  const golden = (Math.sqrt(5) - 1) / 2;
  const massAt = (s: number): number => 2 * Math.PI * x.density * x.L * s * fullRadius(x, s, stress) ** 2;
  let [a, b] = [Math.log(1e-3), Math.log(0.3)];
  for (let turn = 0; turn < 60; turn++) {
    const [c, d] = [b - golden * (b - a), a + golden * (b - a)];
    if (massAt(Math.exp(c)) < massAt(Math.exp(d))) b = d;
    else a = c;
  }
  const s = Math.exp((a + b) / 2);
  return { mass: massAt(s), working: x.torque / (2 * Math.PI * s * fullRadius(x, s, stress) ** 3) };
}

const searchedLong = (x: Wrung) => searched(x, (s) => longStiffness(x) * s ** 1.5);
const searchedModerate = (x: Wrung) => searched(x, (s, r) => moderateStress(x, s, r));

function question(x: Wrung): Question {
  const strong = { tensileYield: 1e12, tensileUltimate: 1e12, compressiveYield: 1e12, shearYield: 1e12, wallMin: 0 };
  return {
    tube: { length: x.L },
    load: { torque: x.torque, yieldFactor: 0.1, ultimateFactor: 0.1 },
    metal: { ...strong, youngsModulus: x.E, poissonRatio: x.nu, shearUltimate: x.Fp, density: x.density },
  };
}

function working(x: Wrung, engine: Engine): number {
  const { meanRadius: r, wall } = lightest(engine, question(x));
  return x.torque / (2 * Math.PI * r ** 2 * wall);
}

const massOf = (x: Wrung, engine: Engine): number => lightest(engine, question(x)).mass;

/** s = (Fp/(K·E))^(2/3), r³ = T/(2π·¾Fp·s), mass = 2πρL·r²·s */
function closedMass(x: Wrung): number {
  const s = (x.Fp / longStiffness(x)) ** (2 / 3);
  const r = (x.torque / (2 * Math.PI * 0.75 * x.Fp * s)) ** (1 / 3);
  return 2 * Math.PI * x.density * x.L * r ** 2 * s;
}

const gauged = { torque: '300 N·m', L: '1 m', G: '81 GPa', wall: '1 mm', twist: '2 deg' } as const;

/** Rows whose number is an optimum that the engine has to search for. */
export const leastMass: readonly Row[] = [
  row({
    id: 'long-works-at-three-quarters',
    source: `${OWN}: the long tube works at ¾ Fp`,
    inputs: long,
    expected: '75.0 MPa',
    hand: (x) => searchedLong(x).working,
    code: working,
  }),
  row({
    id: 'moderate-works-at-two-thirds',
    source: `${OWN}: the moderately long tube works at ⅔ Fp`,
    inputs: moderate,
    expected: '66.7 MPa',
    hand: (x) => searchedModerate(x).working,
    code: working,
  }),
  row({
    id: 'long-mass',
    source: `${OWN}: s = (Fp/(K·E))^(2/3), r³ = T/(2π·¾Fp·s)`,
    inputs: long,
    expected: '7.6336 kg',
    hand: closedMass,
    code: massOf,
  }),
  row({
    id: 'long-mass-searched',
    source: `${OWN}: the same by search`,
    inputs: long,
    expected: '7.6336 kg',
    hand: (x) => searchedLong(x).mass,
    code: massOf,
  }),
  row({
    id: 'moderate-mass-searched',
    source: `${OWN}: moderately long, by search`,
    inputs: moderate,
    expected: '1.9742 kg',
    hand: (x) => searchedModerate(x).mass,
    code: massOf,
  }),
  row({
    id: 'index-strength',
    source: `${OWN}: material index ρ·Fp^(−4/9)·E^(−2/9), twice the strength`,
    inputs: long,
    expected: '0.73487',
    hand: () => 2 ** (-4 / 9),
    code: (x, engine) => massOf({ ...x, Fp: 2 * x.Fp }, engine) / massOf(x, engine),
  }),
  row({
    id: 'index-modulus',
    source: `${OWN}: material index ρ·Fp^(−4/9)·E^(−2/9), half the modulus and a third of the density`,
    inputs: long,
    expected: '0.38884',
    hand: () => 2 ** (2 / 9) / 3,
    code: (x, engine) => massOf({ ...x, E: x.E / 2, density: x.density / 3 }, engine) / massOf(x, engine),
  }),
  row({
    id: 'gauge-and-twist-full',
    source: 'Gauge and twist both full: r³ = TL/(2πG·t·θ), thin wall; closed form',
    inputs: gauged,
    expected: '25.656 mm',
    hand: ({ torque, L, G, wall, twist }) => ((torque * L) / (2 * Math.PI * G * wall * twist)) ** (1 / 3),
    // J is 1 + σ²/4 of the thin form, so the exact radius is a little less: that much is put back
    code: ({ torque, L, G, wall, twist }, engine) => {
      const load = { torque, twistMax: twist };
      const metal = { shearModulus: G, wallMin: wall };
      const { meanRadius: r } = lightest(engine, { tube: { length: L }, load, metal });
      return r * (1 + (wall / r) ** 2 / 4) ** (1 / 3);
    },
  }),
];

export const strainEnergy: readonly Row[] = [
  ...(
    [
      ['energy-of-thin-tube', 'a thin tube stores twice what a solid bar does', '2.0'],
      ['energy-of-tube', 'exactly 1 + (ri/ro)² times, D/t = 600', '1.9933'],
    ] as const
  ).map(([id, what, expected]) =>
    row({
      id,
      source: `Strain energy at equal greatest stress, area and length: ${what}; common practice, no source`,
      inputs: { D: '60 mm', t: '0.1 mm', G: '81 GPa', stress: '100 MPa' },
      expected,
      hand: ({ D, t }) => 1 + (1 - (2 * t) / D) ** 2,
      code: ({ D, t, G, stress }, engine) => energy(engine, D, t, G, stress) / energy(engine, D, D / 2, G, stress),
    }),
  ),
];

/** Strain energy per volume at a greatest stress, J/m³. */
function energy(engine: Engine, D: number, t: number, G: number, stress: number): number {
  const torque = (stress * (Math.PI / 2) * ((D / 2) ** 4 - (D / 2 - t) ** 4)) / (D / 2);
  const held = { outerDiameter: D, wall: t, load: { torque }, metal: { shearModulus: G } };
  return designInHand(engine, held).strainEnergy / (Math.PI * t * (D - t));
}
