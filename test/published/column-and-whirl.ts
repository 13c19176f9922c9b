import type { Metal } from '../../src/material/material.js';
import type { Engine } from './engine.js';
import { finding, type Held } from './run.js';
import { row, type Row } from './row.js';

const GREENHILL = 'Greenhill; Timoshenko and Gere, Theory of Elastic Stability, torsion with compression, from memory';
const STEEL = 'Steel tube 80 × 3 mm, 1.5 m, pinned: Euler and Timoshenko beam; computed from first principles';

interface Shaft {
  readonly outerDiameter: number;
  readonly wall: number;
  readonly L: number;
  readonly E: number;
}

interface Spinning extends Shaft {
  readonly G: number;
  readonly nu: number;
  readonly density: number;
}

const secondMoment = ({ outerDiameter: D, wall: t }: Shaft): number =>
  (Math.PI / 4) * ((D / 2) ** 4 - (D / 2 - t) ** 4);
const area = ({ outerDiameter: D, wall: t }: Shaft): number => Math.PI * ((D / 2) ** 2 - (D / 2 - t) ** 2);
const eulerLoad = (x: Shaft): number => (Math.PI ** 2 * x.E * secondMoment(x)) / x.L ** 2;
const eulerSpeed = (x: Spinning): number =>
  (Math.PI / x.L) ** 2 * Math.sqrt((x.E * secondMoment(x)) / (x.density * area(x)));

/**
 * First root of Timoshenko's frequency equation for a pinned beam, aω⁴ − bω² + ω_E² = 0 with a = ρI/(κGA) and
 * b = 1 + (π/L)²(I/A)(1 + E/(κG)): exact, where the engine leaves out a.
 */
export function timoshenko(x: Spinning): number {
  const kappa = (2 * (1 + x.nu)) / (4 + 3 * x.nu);
  const gyration = secondMoment(x) / area(x);
  const a = (x.density * gyration) / (kappa * x.G);
  const b = 1 + (Math.PI / x.L) ** 2 * gyration * (1 + x.E / (kappa * x.G));
  const c = eulerSpeed(x) ** 2;
  return Math.sqrt((2 * c) / (b + Math.sqrt(b * b - 4 * a * c)));
}

function metalOf(x: Spinning): Partial<Metal> {
  return { youngsModulus: x.E, shearModulus: x.G, poissonRatio: x.nu, density: x.density };
}

export function spinning(x: Spinning, load: Held['load'] = {}): Held {
  const { outerDiameter, wall, L } = x;
  return { outerDiameter, wall, tube: { length: L }, load: { torque: 0, ...load }, metal: metalOf(x), speed: 100 };
}

const speed = (x: Spinning, engine: Engine, load: Held['load'] = {}): number =>
  finding(engine, 'whirl', spinning(x, load)).capacity;

/** The engine's speed without its correction for shear and rotary inertia. */
function withoutShear(x: Spinning, engine: Engine): number {
  const kappa = (2 * (1 + x.nu)) / (4 + 3 * x.nu);
  const z = ((Math.PI / x.L) ** 2 * secondMoment(x) * (1 + x.E / (kappa * x.G))) / area(x);
  return speed(x, engine) * Math.sqrt(1 + z);
}

const steel = {
  outerDiameter: '80 mm',
  wall: '3 mm',
  L: '1.5 m',
  E: '207 GPa',
  G: '80 GPa',
  nu: 0.3,
  density: '7850 kg/m³',
} as const;

const held = ({ outerDiameter, wall, L, E }: Shaft, load: Held['load']): Held => ({
  outerDiameter,
  wall,
  tube: { length: L },
  load: { torque: 0, ...load },
  metal: { youngsModulus: E, compressiveYield: 1e15 },
});

const columns: readonly Row[] = [
  row({
    id: 'greenhill-torque',
    source: `${GREENHILL}: T_cr = 2πEI/l`,
    inputs: steel,
    expected: '467 kN·m',
    hand: (x) => (2 * Math.PI * x.E * secondMoment(x)) / x.L,
    code: (x, engine) => 1 / finding(engine, 'column', held(x, { torque: 1 })).utilisation,
  }),
  row({
    id: 'greenhill-torque-entry',
    source: `${GREENHILL}: T_cr = 2πEI/l, at that torque`,
    inputs: { ...steel, torque: '467 kN·m' },
    expected: '1.00',
    hand: (x) => x.torque / ((2 * Math.PI * x.E * secondMoment(x)) / x.L),
    code: (x, engine) => finding(engine, 'column', held(x, { torque: -x.torque })).utilisation,
  }),
  row({
    id: 'greenhill-thrust',
    source: `${GREENHILL}: P/(EI) + T²/(4E²I²) = π²/l² at T = 0`,
    inputs: steel,
    expected: '489 kN',
    hand: eulerLoad,
    code: (x, engine) => 1 / finding(engine, 'column', held(x, { axial: -1 })).utilisation,
  }),
  row({
    id: 'greenhill-together',
    source: `${GREENHILL}: ¾ of the thrust with half the torque`,
    inputs: { ...steel, thrustShare: 0.75, torqueShare: 0.5 },
    expected: '1.0000',
    hand: (x) => x.thrustShare + x.torqueShare ** 2,
    code: (x, engine) => {
      const torque = (x.torqueShare * 2 * Math.PI * x.E * secondMoment(x)) / x.L;
      return finding(engine, 'column', held(x, { axial: -x.thrustShare * eulerLoad(x), torque })).utilisation;
    },
  }),
];

/** A textbook's round-number shaft: 48 in long, 3 in outside, 1/8 in wall, pinned. */
const inch = { outerDiameter: '3 in', wall: '0.125 in', L: '48 in' } as const;
/** ρ in lb/in³ is the text's slug/in³ by 1 slug = 32.174 lb */
const inchSteel = { ...inch, E: '29 Msi', G: '11.2 Msi', nu: 0.3, slugs: 0.00883 } as const;
const inchAluminium = { ...inch, E: '10 Msi', G: '3.8 Msi', nu: 0.33, slugs: 0.00305 } as const;
const TEXTBOOK = 'Textbook exercise: 48 in shaft, 3 in outside, 1/8 in wall, pinned';
const inSlugs = <X extends { slugs: number }>(x: X): X & { density: number } => ({
  ...x,
  density: (x.slugs * 14.593902937206) / 0.0254 ** 3,
});
/** √(48EI/L³ over the whole mass) at midspan */
const lumped = (x: Spinning): number => Math.sqrt((48 * x.E * secondMoment(x)) / (x.L ** 4 * x.density * area(x)));

const trap: readonly Row[] = [
  row({
    id: 'textbook-steel-distributed',
    source: `${TEXTBOOK}, steel, with its mass where it is; computed from first principles`,
    inputs: inchSteel,
    expected: '8262 rpm',
    hand: (x) => eulerSpeed(inSlugs(x)),
    code: (x, engine) => withoutShear(inSlugs(x), engine),
  }),
  row({
    id: 'textbook-aluminium-distributed',
    source: `${TEXTBOOK}, aluminium, with its mass where it is; computed from first principles`,
    inputs: inchAluminium,
    expected: '8255 rpm',
    hand: (x) => eulerSpeed(inSlugs(x)),
    code: (x, engine) => withoutShear(inSlugs(x), engine),
  }),
  row({
    id: 'textbook-steel-lumped',
    source: `${TEXTBOOK}, steel, answer as printed: all mass at midspan`,
    inputs: inchSteel,
    expected: '5800 rpm',
    hand: (x) => lumped(inSlugs(x)),
    code: (x, engine) => withoutShear(inSlugs(x), engine),
  }),
  row({
    id: 'textbook-aluminium-lumped',
    source: `${TEXTBOOK}, aluminium, answer as printed: all mass at midspan`,
    inputs: inchAluminium,
    expected: '5795 rpm',
    hand: (x) => lumped(inSlugs(x)),
    code: (x, engine) => withoutShear(inSlugs(x), engine),
  }),
];

const SOUTHWELL = 'Southwell and Gough (1921), whirling under thrust and torque, from memory';
const COWPER = 'Cowper, J. Appl. Mech. 33 (1966), shear coefficient of a thin round tube, from memory';
const SHAFT =
  'Rangaswamy and Vijayarangan, Materials Science (Medžiagotyra) 11(2), 2005, steel drive shaft, data from memory';

const whirling: readonly Row[] = [
  row({
    id: 'whirl-euler',
    source: STEEL,
    inputs: steel,
    expected: '5860 rpm',
    hand: eulerSpeed,
    code: withoutShear,
  }),
  row({ id: 'whirl-timoshenko', source: STEEL, inputs: steel, expected: '5805 rpm', hand: timoshenko, code: speed }),
  row({
    id: 'whirl-timoshenko-entry',
    source: `${STEEL}: at three quarters of that speed with the usual margin of a quarter`,
    inputs: { ...steel, running: '4354 rpm' },
    expected: '0.938',
    hand: (x) => (1.25 * x.running) / timoshenko(x),
    code: (x, engine) => finding(engine, 'whirl', { ...spinning(x), speed: x.running, margin: 1.25 }).utilisation,
  }),
  row({
    id: 'whirl-drive-shaft',
    source: `${SHAFT}, Euler speed recomputed`,
    inputs: { ...steel, outerDiameter: '90 mm', wall: '3.318 mm', L: '1250 mm', density: '7600 kg/m³' },
    expected: '9655 rpm',
    hand: eulerSpeed,
    code: withoutShear,
  }),
  row({
    id: 'whirl-thrust',
    source: `${SOUTHWELL}: (ω/ω₁)² = 1 − P/P_E`,
    inputs: { ...steel, share: 0.64 },
    expected: '0.6000',
    hand: (x) => Math.sqrt(1 - x.share),
    code: (x, engine) => speed(x, engine, { axial: -x.share * eulerLoad(x) }) / speed(x, engine),
  }),
  row({
    id: 'whirl-torque',
    source: `${SOUTHWELL}: (ω/ω₁)² = 1 − (T/T_cr)², approximate, unsure`,
    inputs: { ...steel, share: 0.6 },
    expected: '0.8000',
    hand: (x) => Math.sqrt(1 - x.share ** 2),
    code: (x, engine) => {
      const torque = (x.share * 2 * Math.PI * x.E * secondMoment(x)) / x.L;
      return speed(x, engine, { torque }) / speed(x, engine);
    },
  }),
  ...(
    [
      [0.3, '0.531'],
      [0.33, '0.533'],
    ] as const
  ).map(([nu, expected]) =>
    row({
      id: `cowper-${nu}`,
      source: COWPER,
      inputs: { ...steel, L: '0.2 m', nu },
      expected,
      hand: (x) => (2 * (1 + x.nu)) / (4 + 3 * x.nu),
      // κ from the speed: (ω_E/ω)² = 1 + x(1 + E/(κG))
      code: (x, engine) => {
        const slender = ((Math.PI / x.L) ** 2 * secondMoment(x)) / area(x);
        return x.E / x.G / (((eulerSpeed(x) / speed(x, engine)) ** 2 - 1) / slender - 1);
      },
    }),
  ),
];

export const columnAndWhirl: readonly Row[] = [...columns, ...trap, ...whirling];
