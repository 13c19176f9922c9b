import { finding } from './run.js';
import { row, type Row } from './row.js';

const polar = (D: number, t: number): number => (Math.PI / 2) * ((D / 2) ** 4 - (D / 2 - t) ** 4);

const HIBBELER = 'Hibbeler, Mechanics of Materials, 10th edition in SI units, example 5.1';
const BEER = 'Beer and Johnston, Mechanics of Materials, examples 3.01 and 3.02, from memory';
const GERE = 'Gere, Mechanics of Materials, example 3-2, from memory';
const BREDT = 'Bredt’s thin-wall formulas against the exact circle; computed from first principles';

const hibbelerTube = { outerDiameter: '200 mm', wall: '25 mm', allowable: '75 MPa' } as const;
const beerTube = { outerDiameter: '60 mm', wall: '10 mm', allowable: '120 MPa' } as const;
const gere = { torque: '1200 N·m', allowable: '40 MPa', rate: '0.75 deg/m', G: '78 GPa' } as const;

/** The diameter at which a limit is full, from a trial one: stress goes with d⁻³ and twist with d⁻⁴. */
const scaled = (trial: number, utilisation: number, power: number): number => trial * utilisation ** (1 / power);

const textbook: readonly Row[] = [
  row({
    id: 'hibbeler-5.1-solid-torque',
    source: HIBBELER,
    inputs: { radius: '100 mm', allowable: '75 MPa' },
    expected: '117.8 kN·m',
    hand: ({ radius, allowable }) => (allowable * Math.PI * radius ** 3) / 2,
    code: ({ radius, allowable }, { Section }) =>
      (allowable * new Section(0).set(2 * radius, radius).polarMoment) / radius,
  }),
  row({
    id: 'hibbeler-5.1-tube-torque',
    source: HIBBELER,
    inputs: hibbelerTube,
    expected: '80.53 kN·m',
    hand: ({ outerDiameter: D, wall, allowable }) => (allowable * polar(D, wall)) / (D / 2),
    code: ({ outerDiameter, wall, allowable }, engine) => {
      const load = { torque: 1, shearStressMax: allowable };
      return 1 / finding(engine, 'shear-allowable', { outerDiameter, wall, load }).utilisation;
    },
  }),
  row({
    id: 'hibbeler-5.1-inner-stress',
    source: `${HIBBELER}, from memory`,
    inputs: { ...hibbelerTube, torque: '80.53 kN·m' },
    expected: '56.25 MPa',
    hand: ({ allowable, outerDiameter: D, wall }) => (allowable * (D / 2 - wall)) / (D / 2),
    code: ({ outerDiameter, wall, torque }, { Section }) =>
      (torque * (outerDiameter / 2 - wall)) / new Section(0).set(outerDiameter, wall).polarMoment,
  }),
  row({
    id: 'beer-3.01-polar-moment',
    source: BEER,
    inputs: beerTube,
    expected: '1.021e-6 m⁴',
    hand: ({ outerDiameter, wall }) => polar(outerDiameter, wall),
    code: ({ outerDiameter, wall }, { Section }) => new Section(0).set(outerDiameter, wall).polarMoment,
  }),
  row({
    id: 'beer-3.01-torque',
    source: BEER,
    inputs: beerTube,
    expected: '4.08 kN·m',
    hand: ({ outerDiameter: D, wall, allowable }) => (allowable * polar(D, wall)) / (D / 2),
    code: ({ outerDiameter, wall, allowable }, engine) => {
      const load = { torque: -1, shearStressMax: allowable };
      return 1 / finding(engine, 'shear-allowable', { outerDiameter, wall, load }).utilisation;
    },
  }),
  row({
    id: 'beer-3.01-inner-stress',
    source: BEER,
    inputs: { ...beerTube, torque: '4.08 kN·m' },
    expected: '80 MPa',
    hand: ({ allowable, outerDiameter: D, wall }) => (allowable * (D / 2 - wall)) / (D / 2),
    code: ({ outerDiameter: D, wall, torque }, { Section }) =>
      (torque * (D / 2 - wall)) / new Section(0).set(D, wall).polarMoment,
  }),
  row({
    id: 'beer-3.02-torque',
    source: BEER,
    inputs: { outerDiameter: '60 mm', wall: '10 mm', length: '1.5 m', G: '77 GPa', twist: '2 deg' },
    expected: '1.83 kN·m',
    hand: ({ outerDiameter, wall, length, G, twist }) => (G * polar(outerDiameter, wall) * twist) / length,
    code: ({ outerDiameter, wall, length, G, twist }, engine) => {
      const load = { torque: 1, twistMax: twist };
      const held = { outerDiameter, wall, tube: { length }, load, metal: { shearModulus: G } };
      return 1 / finding(engine, 'twist', held).utilisation;
    },
  }),
  row({
    id: 'gere-3-2-solid-strength',
    source: GERE,
    inputs: gere,
    expected: '53.5 mm',
    hand: ({ torque, allowable }) => ((16 * torque) / (Math.PI * allowable)) ** (1 / 3),
    code: ({ torque, allowable }, engine) => {
      const load = { torque, shearStressMax: allowable };
      const held = { outerDiameter: 0.05, wall: 0.025, load };
      return scaled(0.05, finding(engine, 'shear-allowable', held).utilisation, 3);
    },
  }),
  row({
    id: 'gere-3-2-solid-twist',
    source: GERE,
    inputs: gere,
    expected: '58.8 mm',
    hand: ({ torque, rate, G }) => ((32 * torque) / (Math.PI * G * rate)) ** (1 / 4),
    code: ({ torque, rate, G }, engine) => {
      const load = { torque, twistMax: rate };
      const held = { outerDiameter: 0.05, wall: 0.025, load, metal: { shearModulus: G } };
      return scaled(0.05, finding(engine, 'twist', held).utilisation, 4);
    },
  }),
  row({
    id: 'gere-3-2-hollow-strength',
    source: GERE,
    inputs: gere,
    expected: '63.7 mm',
    hand: ({ torque, allowable }) => ((16 * torque) / (Math.PI * allowable * (1 - 0.8 ** 4))) ** (1 / 3),
    code: ({ torque, allowable }, engine) => {
      const held = { outerDiameter: 0.05, wall: 0.005, load: { torque, shearStressMax: allowable } };
      return scaled(0.05, finding(engine, 'shear-allowable', held).utilisation, 3);
    },
  }),
  row({
    id: 'gere-3-2-hollow-twist',
    source: GERE,
    inputs: gere,
    expected: '67.1 mm',
    hand: ({ torque, rate, G }) => ((32 * torque) / (Math.PI * G * rate * (1 - 0.8 ** 4))) ** (1 / 4),
    code: ({ torque, rate, G }, engine) => {
      const load = { torque, twistMax: rate };
      const held = { outerDiameter: 0.05, wall: 0.005, load, metal: { shearModulus: G } };
      return scaled(0.05, finding(engine, 'twist', held).utilisation, 4);
    },
  }),
  row({
    id: 'gere-3-2-mass-ratio',
    source: GERE,
    inputs: { hollow: '67.1 mm', solid: '58.8 mm' },
    expected: '0.47',
    hand: ({ hollow, solid }) => (hollow / solid) ** 2 * (1 - 0.8 ** 2),
    code: ({ hollow, solid }, { Mass }) => {
      const mass = new Mass(7850, 1);
      return mass.of(hollow, hollow / 10) / mass.of(solid, solid / 2);
    },
  }),
];

/** t over the mean radius, J/(2πr³t), τ_max/(T/(2πr²t)) */
const THIN: readonly (readonly [number, string, string])[] = [
  [0.02, '1.0001', '1.0099'],
  [0.05, '1.0006', '1.0244'],
  [0.1, '1.0025', '1.0474'],
  [0.2, '1.0100', '1.0891'],
  [0.3, '1.0225', '1.1247'],
];

const thin: readonly Row[] = THIN.flatMap(([ratio, stiffness, stress]) => [
  row({
    id: `thin-stiffness-${ratio}`,
    source: BREDT,
    inputs: { ratio },
    expected: stiffness,
    hand: (x) => 1 + x.ratio ** 2 / 4,
    code: (x, { Section }) => new Section(0).set(2 + x.ratio, x.ratio).polarMoment / (2 * Math.PI * x.ratio),
  }),
  row({
    id: `thin-stress-${ratio}`,
    source: BREDT,
    inputs: { ratio },
    expected: stress,
    hand: (x) => (1 + x.ratio / 2) / (1 + x.ratio ** 2 / 4),
    code: (x, engine) => {
      const held = { outerDiameter: 2 + x.ratio, wall: x.ratio, load: { torque: 1, shearStressMax: 1 } };
      return finding(engine, 'shear-allowable', held).demand * 2 * Math.PI * x.ratio;
    },
  }),
]);

const THIN_FORM = 'Thin-wall closed form with τ, T and mean radius given; computed from first principles';
const thinForm = {
  torque: '2000 N·m',
  radius: '35 mm',
  stress: '180 MPa',
  G: '80 GPa',
  density: '7850 kg/m³',
} as const;
const thinWall = (x: { torque: number; radius: number; stress: number }): number =>
  x.torque / (2 * Math.PI * x.radius ** 2 * x.stress);

const closed: readonly Row[] = [
  row({
    id: 'thin-form-wall',
    source: THIN_FORM,
    inputs: thinForm,
    expected: '1.4436 mm',
    offset: '1.0202',
    hand: thinWall,
    // the exact outermost stress of that wall is (1 + σ/2)/(1 + σ²/4) of Bredt's, σ = t/r = 0.04125
    code: ({ torque, radius, stress }, engine) => {
      const wall = 1.4436e-3;
      const load = { torque, shearStressMax: stress };
      return wall * finding(engine, 'shear-allowable', { outerDiameter: 2 * radius + wall, wall, load }).utilisation;
    },
  }),
  row({
    id: 'thin-form-twist',
    source: THIN_FORM,
    inputs: thinForm,
    expected: '3.683 deg/m',
    offset: '0.9996',
    hand: ({ radius, stress, G }) => stress / (G * radius),
    // the exact J is 1 + σ²/4 of Bredt's
    code: ({ torque, radius, G }, engine) => {
      const wall = 1.4436e-3;
      const load = { torque, twistMax: 1 };
      const held = { outerDiameter: 2 * radius + wall, wall, load, metal: { shearModulus: G } };
      return finding(engine, 'twist', held).demand;
    },
  }),
  row({
    id: 'thin-form-mass',
    source: THIN_FORM,
    inputs: thinForm,
    expected: '2.4921 kg/m',
    hand: (x) => 2 * Math.PI * x.radius * thinWall(x) * x.density,
    code: (x, { Mass }) => new Mass(x.density, 1).of(2 * x.radius + thinWall(x), thinWall(x)),
  }),
];

export const sectionAndStress: readonly Row[] = [...textbook, ...thin, ...closed];
