import { spinning, timoshenko } from './column-and-whirl.js';
import { ELASTIC, finding } from './run.js';
import { row, type Row } from './row.js';
import { long } from './wall.js';

const SHAFT =
  'Rangaswamy and Vijayarangan, Materials Science (Medžiagotyra) 11(2), 2005, steel drive shaft, data from memory';
const shaft = {
  E: '207 GPa',
  nu: 0.3,
  outerDiameter: '90 mm',
  wall: '3.318 mm',
  L: '1250 mm',
  density: '7600 kg/m³',
} as const;
const ring = (D: number, t: number): number => 2 * Math.PI * (D / 2 - t / 2) ** 2 * t;

export const driveShaft: readonly Row[] = [
  row({
    id: 'shaft-mass',
    source: `${SHAFT}, mass recomputed`,
    inputs: shaft,
    expected: '8.58 kg',
    hand: ({ outerDiameter: D, wall: t, L, density }) => (Math.PI / 4) * (D ** 2 - (D - 2 * t) ** 2) * density * L,
    code: ({ outerDiameter, wall, L, density }, { Mass }) => new Mass(density, L).of(outerDiameter, wall),
  }),
  row({
    id: 'shaft-long',
    source: `${SHAFT}, critical torque recomputed by the long form`,
    inputs: shaft,
    expected: '43.44 kN·m',
    hand: ({ E, outerDiameter: D, wall: t }) =>
      ((ring(D, t) * E) / (3 * Math.SQRT2 * 0.91 ** 0.75)) * (t / (D / 2 - t / 2)) ** 1.5,
    code: ({ E, nu, outerDiameter: D, wall: t, L }, engine) => {
      const r = D / 2 - t / 2;
      return ring(D, t) * long({ E, nu, r, t, L }, engine);
    },
  }),
  row({
    id: 'shaft-moderate',
    source: `${SHAFT}, critical torque recomputed by SP-8007’s explicit form 0.747`,
    inputs: shaft,
    expected: '45.4 kN·m',
    offset: '0.993',
    hand: ({ E, outerDiameter: D, wall: t, L }) => {
      const r = D / 2 - t / 2;
      return ring(D, t) * 0.747 * E * (t / r) ** 1.25 * (r / L) ** 0.5;
    },
    code: ({ E, nu, outerDiameter, wall, L }, engine) =>
      finding(engine, 'wall-buckling', {
        outerDiameter,
        wall,
        tube: { length: L },
        metal: { ...ELASTIC, youngsModulus: E, poissonRatio: nu },
      }).capacity,
  }),
  row({
    id: 'shaft-running-speed',
    source: `${SHAFT}, at its 6500 rpm, first bending speed recomputed`,
    inputs: { ...shaft, G: '80 GPa', running: '6500 rpm' },
    expected: '0.685',
    hand: (x) => x.running / timoshenko(x),
    code: (x, engine) => finding(engine, 'whirl', { ...spinning(x), speed: x.running }).utilisation,
  }),
];
