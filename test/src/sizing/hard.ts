import { utilisations } from '../../reference/limits.js';
import { job, load, metal } from '../fixtures.js';
import type { Task } from './jobs.js';

const tube = job().tube;

/** Whirl decides the diameter, at the least gauge, a ten-thousandth over the least diameter that the job allows. */
function tangentWhirl(): Task {
  const metalOf = metal({ wallMin: 1.5e-3 });
  const at = (outerDiameterMin: number | null): Task['job'] =>
    job({
      loads: [load({ torque: 100 })],
      speed: { max: 500, margin: 1.25 },
      tube: { ...tube, length: 1.5, supportSpacing: 1.5, outerDiameterMin },
    });
  const free = at(null);
  const whirls = (D: number): boolean =>
    utilisations(free, metalOf, D, 1.5e-3).some(({ limit, U }) => limit === 'whirl' && U > 1);
  let lo = 0.02;
  let hi = 0.5;
  while (hi > lo * (1 + 1e-12)) {
    const middle = (lo + hi) / 2;
    if (whirls(middle)) lo = middle;
    else hi = middle;
  }
  return { metal: metalOf, job: at(hi / 1.0001) };
}

/** Jobs at which a search or its proof might stumble, by what is hard in them. */
export const HARD: Readonly<Record<string, Task>> = {
  'wall buckling alone, a smooth optimum': {
    metal: metal({ wallMin: 1e-6 }),
    job: job({ loads: [load({ torque: 3000 })], tube: { ...tube, length: 2, diameterToWallMax: 5000 } }),
  },
  'wall buckling alone, a long tube': {
    metal: metal({ wallMin: 1e-6 }),
    job: job({ loads: [load({ torque: 200 })], tube: { ...tube, length: 40, supportSpacing: 1 } }),
  },
  'one diameter only': {
    metal: metal(),
    job: job({ tube: { ...tube, outerDiameterMin: 0.06, outerDiameterMax: 0.06 } }),
  },
  'one diameter only, under thrust and bending, on a wall with a tolerance': {
    metal: metal({ wallTolerance: 0.1 }),
    job: job({
      loads: [load({ bending: 300, axial: -5000 })],
      tube: { ...tube, outerDiameterMin: 0.05, outerDiameterMax: 0.05 },
    }),
  },
  'whirl just over the least diameter': tangentWhirl(),
  'no limit on diameter, and thrust': {
    metal: metal({ wallMin: 1e-4 }),
    job: job({ loads: [load({ torque: 100, axial: -40_000, bending: 50 })] }),
  },
  'light sizes near Euler’s load, where bending is amplified without end': {
    metal: metal(),
    job: job({ loads: [load({ torque: 10, axial: -2000, bending: 1 })], tube: { ...tube, supportSpacing: 8 } }),
  },
  'tension but for a trace of torque, where all sizes of one area are alike': {
    metal: metal(),
    job: job({ loads: [load({ torque: 1, axial: 50_000 })], tube: { ...tube, outerDiameterMax: 0.03 } }),
  },
  'a torque of a thousandth': { metal: metal({ wallMin: 1e-5 }), job: job({ loads: [load({ torque: 1e-3 })] }) },
  'a torque of a hundred million': {
    metal: metal(),
    job: job({ loads: [load({ torque: 1e8, twistMax: 0.1 })], tube: { ...tube, length: 30, supportSpacing: 30 } }),
  },
  'no gauge, and next to no torque: the thinnest foil that is searched': {
    metal: metal({ wallMin: 0 }),
    job: job({ loads: [load({ torque: 1e-9 })] }),
  },
  'half the wall missing': { metal: metal({ wallTolerance: 0.5 }), job: job({ loads: [load({ twistMax: 0.02 })] }) },
  'the two ends of D/t a millionth apart': {
    metal: metal({ wallMin: 1e-6 }),
    job: job({ tube: { ...tube, diameterToWallMin: 20, diameterToWallMax: 20 * (1 + 1e-6) } }),
  },
  'nothing fits: envelope against twist': {
    metal: metal(),
    job: job({ loads: [load({ twistMax: 0.001 })], tube: { ...tube, outerDiameterMax: 0.05 } }),
  },
  'nothing fits: faster than any diameter can run': {
    metal: metal(),
    job: job({ speed: { max: 1e5, margin: 1.25 }, tube: { ...tube, length: 2, supportSpacing: 2 } }),
  },
  'nothing fits: a trace of torque, a long span and a high speed': {
    metal: metal({ wallMin: 1e-6 }),
    job: job({
      loads: [load({ torque: 2.6e-5 })],
      speed: { max: 67_658, margin: 8 },
      tube: { ...tube, length: 600, supportSpacing: 84 },
    }),
  },
  'nothing fits: bore against envelope': {
    metal: metal(),
    job: job({ tube: { ...tube, outerDiameterMax: 0.05, boreMin: 0.049 } }),
  },
};
