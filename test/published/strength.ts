import { readFileSync } from 'node:fs';
import { readMetal } from '../../src/material/metal.js';
import type { Metal } from '../../src/material/material.js';
import type { LimitId } from '../../src/report/report.js';
import type { Engine } from './engine.js';
import { finding } from './run.js';
import { row, type Row } from './row.js';

const HANDBOOK = 'MIL-HDBK-5J, room temperature allowables, from memory';
const MISES = 'von Mises, Fsy = Fty/√3';

/** A shipped record. */
function record(id: string): Metal {
  const file = new URL(`../../assets/materials/${id}.json`, import.meta.url);
  const result = readMetal(JSON.parse(readFileSync(file, 'utf8')), '');
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join('; '));
  return result.metal;
}

/** Torque at which a tube of the shipped record, its wall not thinned, is full of a shear limit, as a stress at ro. */
function stressWhenFull(engine: Engine, limit: LimitId, id: string): number {
  const metal = { ...record(id), wallTolerance: 0, jointFactor: 1 };
  const held = { outerDiameter: 0.05, wall: 0.002, metal, load: { torque: 1 } };
  const torque = 1 / finding(engine, limit, held).utilisation;
  return (torque * 0.025) / ((Math.PI / 2) * (0.025 ** 4 - 0.023 ** 4));
}

/** [record, source, Fty as printed, Fty/√3 in the same unit] */
const YIELD: readonly (readonly [string, string, string, string])[] = [
  ['al-6061-t6', `${HANDBOOK}; ${MISES}`, '35 ksi', '20.2 ksi'],
  ['steel-4130-n', `${HANDBOOK}; ${MISES}`, '75 ksi', '43.3 ksi'],
  ['steel-e355-n', `EN 10305-1, E355+N; ${MISES}`, '355 MPa', '205 MPa'],
  ['steel-42crmo4-qt', `EN 10083 and ISO 683-2, 42CrMo4+QT to 8 mm; ${MISES}`, '900 MPa', '520 MPa'],
];

const yields: readonly Row[] = YIELD.map(([id, source, Fty, expected]) =>
  row({
    id: `yield-${id}`,
    source,
    inputs: { Fty },
    expected,
    hand: (x) => x.Fty / Math.sqrt(3),
    code: (_, engine) => stressWhenFull(engine, 'shear-yield', id),
  }),
);

/** [record, Fsu as printed, Ftu, Fsu/Ftu] */
const ULTIMATE: readonly (readonly [string, string, string, number])[] = [
  ['al-2024-t3', '39 ksi', '64 ksi', 0.61],
  ['al-6061-t6', '27 ksi', '42 ksi', 0.64],
  ['al-7075-t6', '46 ksi', '77 ksi', 0.6],
  ['steel-4130-n', '57 ksi', '95 ksi', 0.6],
  ['ti-6al-4v-annealed', '80 ksi', '130 ksi', 0.615],
];

const ultimates: readonly Row[] = ULTIMATE.map(([id, Fsu, Ftu, share]) =>
  row({
    id: `ultimate-${id}`,
    source: `${HANDBOOK}; Fsu is 0.6 to 0.65 of Ftu, from memory`,
    inputs: { Ftu, share },
    expected: Fsu,
    hand: (x) => x.share * x.Ftu,
    code: (_, engine) => stressWhenFull(engine, 'shear-ultimate', id),
  }),
);

const CIRCLE = 'Circular interaction of shear with direct stress, MIL-HDBK-5 §1.5.3 style, from memory';
const bar = { outerDiameter: '60 mm', wall: '3 mm', Ft: '600 MPa', Fs: '350 MPa' } as const;

interface Bar {
  readonly outerDiameter: number;
  readonly wall: number;
  readonly Ft: number;
  readonly Fs: number;
}

function stressed(
  limit: LimitId,
  x: Bar,
  sigma: number,
  tau: number,
  of: 'tension' | 'bending',
  engine: Engine,
): number {
  const { outerDiameter: D, wall: t } = x;
  const A = (Math.PI / 4) * (D ** 2 - (D - 2 * t) ** 2);
  const J = (Math.PI / 32) * (D ** 4 - (D - 2 * t) ** 4);
  const torque = (tau * J) / (D / 2);
  const load = of === 'tension' ? { torque, axial: sigma * A } : { torque, bending: (sigma * J) / 2 / (D / 2) };
  const metal = { tensileYield: x.Ft, tensileUltimate: x.Ft, shearYield: x.Fs, shearUltimate: x.Fs };
  return finding(engine, limit, { outerDiameter: D, wall: t, load, metal }).utilisation;
}

const circle: readonly Row[] = (
  [
    ['shear-yield', 'tension', 0.6, 0.8, '1.0000'],
    ['shear-yield', 'bending', 0.8, 0.6, '1.0000'],
    ['shear-ultimate', 'tension', 0.28, 0.96, '1.0000'],
    ['shear-ultimate', 'bending', 0.3, 0.4, '0.5000'],
  ] as const
).map(([limit, of, direct, shear, expected]) =>
  row({
    id: `circle-${limit}-${of}`,
    source: CIRCLE,
    inputs: { ...bar, direct, shear },
    expected,
    hand: (x) => Math.hypot(x.direct, x.shear),
    code: (x, engine) => stressed(limit, x, x.direct * x.Ft, x.shear * x.Fs, of, engine),
  }),
);

const factors: readonly Row[] = [
  row({
    id: 'ultimate-factor-aircraft',
    source: '14 CFR 25.303: factor of safety 1.5 on limit load',
    inputs: { ...bar, torque: '1 kN·m', factor: 1.5 },
    expected: '102.8 MPa',
    hand: ({ outerDiameter: D, wall: t, torque, factor }) =>
      (factor * torque * (D / 2)) / ((Math.PI / 2) * ((D / 2) ** 4 - (D / 2 - t) ** 4)),
    code: ({ outerDiameter, wall, torque, factor }, engine) => {
      const load = { torque, ultimateFactor: factor };
      return finding(engine, 'shear-ultimate', { outerDiameter, wall, load }).demand;
    },
  }),
  row({
    id: 'joint-factor-welded-6061',
    source: 'AWS B2.1 and D1.2: 6061-T6 as welded keeps 24 of 42 ksi',
    inputs: { welded: '24 ksi', parent: '42 ksi' },
    expected: '0.571',
    hand: ({ welded, parent }) => welded / parent,
    code: ({ welded, parent }, engine) => {
      const sound = { outerDiameter: 0.05, wall: 0.002, load: { torque: 100 } };
      const joined = { ...sound, metal: { jointFactor: welded / parent } };
      const limit = 'shear-ultimate';
      return finding(engine, limit, sound).utilisation / finding(engine, limit, joined).utilisation;
    },
  }),
  row({
    id: 'plateau-soft-304',
    source:
      'Plateau min(Fsu, 1.2·Fsy) for annealed 304, Fty 30 and Fsu 50 ksi (from memory); the bound is the engine’s own',
    inputs: { Fty: '30 ksi', Fsu: '50 ksi' },
    expected: '20.8 ksi',
    hand: ({ Fty, Fsu }) => Math.min(Fsu, (1.2 * Fty) / Math.sqrt(3)),
    // a stout wall of a very stiff metal stands its plateau
    code: ({ Fty, Fsu }, engine) => {
      const metal = { youngsModulus: 1e18, shearYield: Fty / Math.sqrt(3), shearUltimate: Fsu };
      const held = { outerDiameter: 0.06, wall: 0.005, load: { torque: 1 }, metal };
      return finding(engine, 'wall-buckling', held).capacity / (2 * Math.PI * 0.0275 ** 2 * 0.005);
    },
  }),
];

export const strength: readonly Row[] = [...yields, ...ultimates, ...circle, ...factors];
