import type { LimitId } from '../../src/report/report.js';
import { ELASTIC, finding, type Held } from './run.js';
import { row, type Row } from './row.js';

const gauges: readonly Row[] = [
  row({
    id: 'gauge-4130',
    source: 'Minimum gauge of 4130 tube 0.028 in, from memory, unsure; 0.035 in is the next of the aircraft list',
    inputs: { least: '0.028 in', wall: '0.035 in' },
    expected: '0.800',
    hand: ({ least, wall }) => least / wall,
    code: ({ least, wall }, engine) =>
      finding(engine, 'wall-min', { outerDiameter: 0.025, wall, metal: { wallMin: least } }).utilisation,
  }),
  row({
    id: 'gauge-cold-drawn',
    source: 'EN 10305-1 preferred walls from 0.5 mm, from memory; 0.8 mm is the next',
    inputs: { least: '0.5 mm', wall: '0.8 mm' },
    expected: '0.625',
    hand: ({ least, wall }) => least / wall,
    code: ({ least, wall }, engine) =>
      finding(engine, 'wall-min', { outerDiameter: 0.03, wall, metal: { wallMin: least } }).utilisation,
  }),
  row({
    id: 'gauge-of-the-job',
    source: 'Birmingham gauge (BWG) 22 asked for where the process gives 25; three agreeing tables',
    inputs: { bwg22: '0.028 in', bwg25: '0.020 in' },
    expected: '0.711 mm',
    hand: ({ bwg22 }) => bwg22,
    code: ({ bwg22, bwg25 }, engine) => {
      const held = { outerDiameter: 0.025, wall: 1e-3, tube: { wallMin: bwg22 }, metal: { wallMin: bwg25 } };
      return finding(engine, 'wall-min', held).demand;
    },
  }),
];

/** How full a geometric limit is: [id, source, inputs, U, by hand] */
const envelopes: readonly Row[] = [
  row({
    id: 'envelope-driveshaft',
    source:
      'Rangaswamy and Vijayarangan, Materials Science (Medžiagotyra) 11(2), 2005: outer diameter 90 mm is all there is',
    inputs: { D: '90 mm', t: '3.318 mm', most: '90 mm' },
    expected: '1.0000',
    hand: ({ D, most }) => D / most,
    code: ({ D, t, most }, engine) => full(engine, 'outer-diameter', D, t, { outerDiameterMax: most }),
  }),
  row({
    id: 'envelope-en10305',
    source: 'EN 10305-1, scope: outer diameter up to 380 mm',
    inputs: { D: '190 mm', t: '5 mm', most: '380 mm' },
    expected: '0.5000',
    hand: ({ D, most }) => D / most,
    code: ({ D, t, most }, engine) => full(engine, 'outer-diameter', D, t, { outerDiameterMax: most }),
  }),
  row({
    id: 'envelope-mil-t-6845',
    source: 'MIL-T-6845: outer diameter 1/4 in or more',
    inputs: { D: '0.375 in', t: '0.028 in', least: '0.25 in' },
    expected: '0.667',
    hand: ({ D, least }) => least / D,
    code: ({ D, t, least }, engine) => full(engine, 'outer-diameter', D, t, { outerDiameterMin: least }),
  }),
  row({
    id: 'bore-hibbeler-5.1',
    source: 'Hibbeler, Mechanics of Materials, 10th edition in SI units, example 5.1: inner radius 75 mm',
    inputs: { D: '200 mm', t: '25 mm', radius: '75 mm' },
    expected: '1.0000',
    hand: ({ D, t, radius }) => (2 * radius) / (D - 2 * t),
    code: ({ D, t, radius }, engine) => full(engine, 'bore', D, t, { boreMin: 2 * radius }),
  }),
  row({
    id: 'bore-beer-3.01',
    source: 'Beer and Johnston, Mechanics of Materials, example 3.01, from memory: inner radius 20 mm',
    inputs: { D: '60 mm', t: '10 mm' },
    expected: '40 mm',
    hand: ({ D, t }) => D - 2 * t,
    code: ({ D, t }, engine) =>
      finding(engine, 'bore', { outerDiameter: D, wall: t, tube: { boreMin: 0.02 } }).capacity,
  }),
  row({
    id: 'bore-mil-t-6845',
    source: 'MIL-T-6845: inner diameter over four times the wall',
    inputs: { D: '0.375 in', t: '0.0625 in' },
    expected: '1.0000',
    hand: ({ D, t }) => (4 * t) / (D - 2 * t),
    code: ({ D, t }, engine) => full(engine, 'bore', D, t, { boreMin: 4 * t }),
  }),
  row({
    id: 'slimness-mil-t-6845',
    source: 'MIL-T-6845: inner diameter over four times the wall, so D/t over 6',
    inputs: { D: '0.375 in', t: '0.0625 in' },
    expected: '1.0000',
    hand: ({ D, t }) => 6 / (D / t),
    code: ({ D, t }, engine) => full(engine, 'diameter-to-wall', D, t, { diameterToWallMin: 6 }),
  }),
  row({
    id: 'slimness-en10305',
    source: 'EN 10305-1: wider tolerances after heat treatment where t/D is under 1/20, from memory; 60 × 2 mm',
    inputs: { D: '60 mm', t: '2 mm' },
    expected: '1.5000',
    hand: ({ D, t }) => D / t / 20,
    code: ({ D, t }, engine) => full(engine, 'diameter-to-wall', D, t, { diameterToWallMax: 20 }),
  }),
];

function full(engine: Parameters<typeof finding>[0], limit: LimitId, D: number, t: number, tube: Held['tube']): number {
  return finding(engine, limit, { outerDiameter: D, wall: t, ...(tube === undefined ? {} : { tube }) }).utilisation;
}

/** U of the wall at its tolerance over U at its nominal size; the tube is slim, so that the radius hardly moves. */
function thinned(
  engine: Parameters<typeof finding>[0],
  limit: LimitId,
  tolerance: number,
  held: Partial<Held>,
): number {
  const at = (wallTolerance: number): number => {
    const metal = { ...held.metal, wallTolerance };
    return finding(engine, limit, { outerDiameter: 0.2, wall: 0.0001, ...held, metal }).utilisation;
  };
  return at(tolerance) / at(0);
}

const tolerances: readonly Row[] = [
  row({
    id: 'tolerance-moderate',
    source: 'Wall 10 % under nominal: buckling torque as t^2.25 where moderately long; computed',
    inputs: { under: 0.1 },
    expected: '0.789',
    hand: ({ under }) => (1 - under) ** 2.25,
    code: ({ under }, engine) => 1 / thinned(engine, 'wall-buckling', under, { metal: ELASTIC }),
  }),
  row({
    id: 'tolerance-long',
    source: 'Wall 10 % under nominal: buckling torque as t^2.5 where long; computed',
    inputs: { under: 0.1, length: '1 km' },
    expected: '0.768',
    hand: ({ under }) => (1 - under) ** 2.5,
    code: ({ under, length }, engine) =>
      1 / thinned(engine, 'wall-buckling', under, { metal: ELASTIC, tube: { length } }),
  }),
  row({
    id: 'tolerance-en10305',
    source: 'EN 10305-1, seamless cold drawn: wall ±10 %; stress as 1/t',
    inputs: { under: 0.1 },
    expected: '1.111',
    hand: ({ under }) => 1 / (1 - under),
    code: ({ under }, engine) => thinned(engine, 'shear-yield', under, {}),
  }),
  row({
    id: 'tolerance-iso1129',
    source: 'ISO 1129 and EN 10297-1, to 219.1 mm: wall ±12.5 %; twist as 1/t',
    inputs: { under: 0.125 },
    expected: '1.143',
    hand: ({ under }) => 1 / (1 - under),
    code: ({ under }, engine) => thinned(engine, 'twist', under, { load: { twistMax: 1 } }),
  }),
  row({
    id: 'tolerance-mass',
    source: 'Strength at the least wall, mass at the nominal one; common practice, no source',
    inputs: { D: '50 mm', t: '2 mm', density: '7850 kg/m³' },
    expected: '2.37 kg/m',
    hand: ({ D, t, density }) => (density * Math.PI * (D ** 2 - (D - 2 * t) ** 2)) / 4,
    code: ({ D, t, density }, { Mass }) => new Mass(density, 1).of(D, t),
  }),
];

export const tolerancesAndSizes: readonly Row[] = [...gauges, ...envelopes, ...tolerances];
