import { galerkin } from './galerkin.js';
import { row, type Row } from './row.js';
import { long, moderate, oneTube, plate, type Wall } from './wall.js';

/** The same tube by other formulas: [id, source, stress, how the engine stands to it, formula] */
const OTHERS: readonly (readonly [string, string, string, string, (x: Wall) => number])[] = [
  [
    'printed',
    'NASA SP-8007 explicit form, at ν = 0.33',
    '90.96 MPa',
    '1.0058',
    (x) => 0.747 * x.E * (x.t / x.r) ** 1.25 * (x.r / x.L) ** 0.5,
  ],
  ['donnell-hinged', 'Donnell, NACA Report 479, hinged', '92.29 MPa', '0.9913', (x) => donnell(2.8, 2.6, 1.4, 2, x)],
  [
    'donnell-clamped',
    'Donnell, NACA Report 479, clamped',
    '100.93 MPa',
    '0.9064',
    (x) => donnell(4.6, 7.8, 1.67, 2, x),
  ],
  ['roark-hinged', 'Roark, table 15.2, hinged', '89.43 MPa', '1.0230', (x) => donnell(1.27, 9.64, 0.466, 1, x)],
  [
    'roark-clamped',
    'Roark, table 15.2, clamped (constant −2.39)',
    '101.59 MPa',
    '0.9005',
    (x) => donnell(-2.39, 96.9, 0.605, 1, x),
  ],
  [
    'en1993',
    'EN 1993-1-6 Annex D, shear, medium length',
    '91.32 MPa',
    '1.0018',
    (x) => (0.75 * x.E * Math.sqrt(Math.sqrt(x.r * x.t) / x.L) * x.t) / x.r,
  ],
];

/** E/(1 − ν²)·(t/L)²·[a + √(b + c·H^1.5)], H = √(1 − ν²)·L²/(t·d): on the diameter for Donnell, on the radius for Roark. */
function donnell(a: number, b: number, c: number, radii: number, { E, nu, r, t, L }: Wall): number {
  const H = (Math.sqrt(1 - nu ** 2) * L ** 2) / (t * radii * r);
  return (E / (1 - nu ** 2)) * (t / L) ** 2 * (a + Math.sqrt(b + c * H ** 1.5));
}

const others: readonly Row[] = OTHERS.map(([id, source, expected, offset, hand]) =>
  row({ id: `set-${id}`, source: `${source}, from memory`, inputs: oneTube, expected, offset, hand, code: moderate }),
);

/** Z, k/Z^(3/4) and how 0.85 stands to it */
const GALERKIN: readonly (readonly [number, string, string])[] = [
  [50, '0.916', '0.93'],
  [100, '0.870', '0.98'],
  [300, '0.8465', '1.004'],
  [500, '0.8443', '1.007'],
  [1000, '0.8444', '1.007'],
  [3000, '0.8471', '1.003'],
  [1e4, '0.8499', '1.000'],
  [1e5, '0.8529', '0.997'],
  [1e6, '0.8539', '0.995'],
];

const europeanLong: Row = row({
  id: 'en1993-long',
  source: 'EN 1993-1-6 Annex D, shear, long: C_τ = (1/3)√(w·t/r), w = l/√(r·t), from memory',
  inputs: { w: 1e4, slenderness: 100 },
  expected: '0.25',
  offset: '1.012',
  hand: ({ w, slenderness }) => (0.75 / 3) * Math.sqrt(w / slenderness) * Math.sqrt(1 / w) * Math.sqrt(slenderness),
  code: (_, engine) => long({ E: 1, nu: 0.3, r: 1, t: 1, L: 1 }, engine),
});

const donnellEquation: readonly Row[] = [
  ...GALERKIN.map(([Z, expected, offset]) =>
    row({
      id: `galerkin-${Z}`,
      source: 'Donnell’s equation by Galerkin’s method, simply supported (Batdorf, NACA Report 887); computed',
      inputs: { Z },
      expected,
      offset,
      hand: (x) => galerkin(x.Z) / x.Z ** 0.75,
      code: (x, engine) => {
        const wall = { E: 1, nu: 0, r: 1, t: 1e-3, L: Math.sqrt(x.Z * 1e-3) };
        return moderate(wall, engine) / plate(x.Z ** 0.75, wall);
      },
    }),
  ),
  row({
    id: 'galerkin-short',
    source: 'Donnell’s equation by Galerkin’s method at Z = 30: the moderate form is on the safe side; computed',
    inputs: { Z: 30 },
    expected: '12.61',
    offset: '0.86',
    hand: (x) => galerkin(x.Z),
    code: (x, engine) => {
      const wall = { E: 1, nu: 0, r: 1, t: 1e-3, L: Math.sqrt(x.Z * 1e-3) };
      return moderate(wall, engine) / plate(1, wall);
    },
  }),
];

export const otherFormulas: readonly Row[] = [...others, europeanLong, ...donnellEquation];
