import type { Engine } from './engine.js';
import { ELASTIC, finding, type Held } from './run.js';
import { row, type Row } from './row.js';

const SP8007 = 'NASA SP-8007 (1968), from memory';
const PARABOLA = 'Tangent (Johnson) parabola; common practice, no source';

interface Ring {
  readonly r: number;
  readonly t: number;
  readonly E: number;
  readonly nu: number;
}

const ring = { r: '64 mm', t: '1 mm', E: '70 GPa', nu: 0.3 } as const;

/** 1 − c(1 − e^(−φ)), φ = (1/16)√(r/t) */
const gamma = (slenderness: number, loss: number): number => 1 - loss * (1 - Math.exp(-Math.sqrt(slenderness) / 16));

/** γE/√(3(1 − ν²))·t/r */
const classical = ({ r, t, E, nu }: Ring, loss: number): number =>
  (gamma(r / t, loss) * E * t) / (r * Math.sqrt(3 * (1 - nu ** 2)));

const held = ({ r, t, E, nu }: Ring, load: Held['load']): Held => ({
  outerDiameter: 2 * r + t,
  wall: t,
  load: { torque: 0, ...load },
  metal: { ...ELASTIC, youngsModulus: E, poissonRatio: nu },
});

const buckled = (engine: Engine, x: Ring, load: Held['load']): number =>
  finding(engine, 'wall-buckling', held(x, load)).utilisation;

const factors: readonly Row[] = (
  [
    ['compression', 0.901, 64, '0.645'],
    ['compression', 0.901, 256, '0.430'],
    ['compression', 0.901, 1024, '0.221'],
    ['bending', 0.731, 64, '0.712'],
    ['bending', 0.731, 256, '0.538'],
    ['bending', 0.731, 1024, '0.368'],
  ] as const
).map(([name, loss, slenderness, expected]) =>
  row({
    id: `knockdown-${name}-${slenderness}`,
    source: `${SP8007}, knock-down in ${name}`,
    inputs: { loss, slenderness },
    expected,
    hand: (x) => gamma(x.slenderness, x.loss),
    // from what the engine allows the wall, over what the perfect wall would stand
    code: (x, engine) => {
      const wall = { r: x.slenderness, t: 1, E: 1e9, nu: 0 };
      const perfect = 1e9 / Math.sqrt(3) / x.slenderness;
      const area = 2 * Math.PI * x.slenderness;
      return name === 'compression'
        ? 1 / buckled(engine, wall, { axial: -1 }) / area / perfect
        : 2 / buckled(engine, wall, { bending: 1 }) / area / x.slenderness / perfect;
    },
  }),
);

const stresses: readonly Row[] = [
  row({
    id: 'wall-compression',
    source: `${SP8007}, γE·t/(r√(3(1 − ν²)))`,
    inputs: ring,
    expected: '427 MPa',
    hand: (x) => classical(x, 0.901),
    code: (x, engine) => 1 / buckled(engine, x, { axial: -1 }) / (2 * Math.PI * x.r * x.t),
  }),
  row({
    id: 'wall-bending',
    source: `${SP8007}, γE·t/(r√(3(1 − ν²)))`,
    inputs: ring,
    expected: '472 MPa',
    hand: (x) => classical(x, 0.731),
    code: (x, engine) => 1 / buckled(engine, x, { bending: 1 }) / (Math.PI * x.r ** 2 * x.t),
  }),
];

/** Loads that are given shares of what the wall would stand of each alone. */
function together(x: Ring & { Rc: number; Rb: number; Rs: number }, engine: Engine): number {
  const torque = x.Rs / buckled(engine, x, { torque: 1 });
  const axial = -x.Rc / buckled(engine, x, { axial: -1 });
  // bending of which thrust makes M*: the wall is far from the column's critical thrust, and the share says how far
  const euler = 1 / finding(engine, 'column', held(x, { axial: -1 })).utilisation;
  const bending = (x.Rb / buckled(engine, x, { bending: 1 })) * (1 + axial / euler);
  return buckled(engine, x, { torque, axial, bending });
}

const interactions: readonly Row[] = (
  [
    ['compression-torsion', 'Rc + Rt² = 1', 0.36, 0, 0.8],
    ['bending-torsion', 'Rb + Rt² = 1', 0, 0.51, 0.7],
    ['all-three', 'Rc + Rb + Rst² = 1 (Bruhn, C8, unsure)', 0.2, 0.31, 0.7],
  ] as const
).map(([name, rule, Rc, Rb, Rs]) =>
  row({
    id: `interaction-${name}`,
    source: `${SP8007}: ${rule}`,
    inputs: { ...ring, Rc, Rb, Rs },
    expected: '1.0000',
    hand: (x) => x.Rc + x.Rb + x.Rs ** 2,
    code: together,
  }),
);

const johnson: readonly Row[] = [
  row({
    id: 'parabola-at-plateau',
    source: `${PARABOLA}: where the elastic stress equals the plateau, ¾ of it`,
    inputs: { elastic: '300 MPa', plateau: '300 MPa' },
    expected: '225.0 MPa',
    hand: ({ plateau }) => 0.75 * plateau,
    code: ({ elastic, plateau }, { parabola }) => parabola(elastic, plateau),
  }),
  row({
    id: 'parabola-column',
    source: `${PARABOLA}: column of critical stress Fcy at the Euler stress, through the column limit`,
    inputs: { outerDiameter: '50 mm', wall: '2 mm', E: '210 GPa', Fcy: '300 MPa' },
    expected: '67.9 kN',
    hand: ({ outerDiameter: D, wall: t, Fcy }) => 0.75 * Fcy * Math.PI * t * (D - t),
    code: ({ outerDiameter, wall, E, Fcy }, engine) => {
      const D = outerDiameter;
      const gyration = (D ** 2 + (D - 2 * wall) ** 2) / 16;
      const length = Math.PI * Math.sqrt((E * gyration) / Fcy);
      const metal = { youngsModulus: E, compressiveYield: Fcy };
      const load = { torque: 0, axial: -1 };
      return 1 / finding(engine, 'column', { outerDiameter, wall, tube: { length }, load, metal }).utilisation;
    },
  }),
];

export const knockdowns: readonly Row[] = [...factors, ...stresses, ...interactions, ...johnson];
