import type { Material, Sizes } from '../material/material.js';
import { joinPath } from '../material/problem.js';
import type { QuantityName } from '../quantity/register.js';
import type { Brief, LoadCase } from './job.js';
import { writeQuantity, writeTwist } from './writeQuantity.js';

/** The quantity of a key, and the unit for a value whose unit is not known. */
type Rule = readonly [QuantityName, string];

const LENGTH: Rule = ['length', 'mm'];
const MODULUS: Rule = ['stress', 'GPa'];
const STRENGTH: Rule = ['stress', 'MPa'];

/** Every key of a job file that holds a physical value, but `twistMax`; a key means the same wherever it stands. */
const RULES: ReadonlyMap<string, Rule> = new Map<string, Rule>([
  ['length', ['length', 'm']],
  ['supportSpacing', ['length', 'm']],
  ['outerDiameterMax', LENGTH],
  ['outerDiameterMin', LENGTH],
  ['outerDiameter', LENGTH],
  ['boreMin', LENGTH],
  ['bore', LENGTH],
  ['wallMin', LENGTH],
  ['wallMax', LENGTH],
  ['wall', LENGTH],
  ['torque', ['torque', 'N·m']],
  ['bending', ['torque', 'N·m']],
  ['axial', ['force', 'N']],
  ['shearStressMax', STRENGTH],
  ['max', ['rotationalSpeed', 'rpm']],
  ['density', ['density', 'kg/m³']],
  ['youngsModulus', MODULUS],
  ['shearModulus', MODULUS],
  ['tensileYield', STRENGTH],
  ['tensileUltimate', STRENGTH],
  ['shearYield', STRENGTH],
  ['shearUltimate', STRENGTH],
  ['compressiveYield', STRENGTH],
]);

type Units = Brief['units'];
type Written = Readonly<Record<string, unknown>>;

function writeValue(key: string, value: unknown, unit: string | undefined): unknown {
  const rule = RULES.get(key);
  return rule !== undefined && typeof value === 'number' ? writeQuantity(value, rule[0], unit ?? rule[1]) : value;
}

/** The keys of one object, physical values as texts; what the job leaves out (null) is left out. */
function writeObject(source: object, path: string, units: Units): Written {
  const entries: readonly (readonly [string, unknown])[] = Object.entries(source);
  const said = entries.filter(([, value]) => value !== null);
  return Object.fromEntries(said.map(([key, value]) => [key, writeValue(key, value, units[joinPath(path, key)])]));
}

function writeLoad(load: LoadCase, path: string, units: Units, length: number): Written {
  const written = writeObject(load, path, units);
  const unit = units[joinPath(path, 'twistMax')] ?? 'deg';
  return load.twistMax === null ? written : { ...written, twistMax: writeTwist(load.twistMax, unit, length) };
}

function writeSizes(sizes: Sizes, path: string, units: Units): unknown {
  if (sizes === 'any') return sizes;
  const list = joinPath(path, 'stock');
  return { stock: sizes.stock.map((row, index) => writeObject(row, joinPath(list, index), units)) };
}

function writeMaterial(material: Material, path: string, units: Units): Written {
  const { sizes, ...record } = material;
  const written = writeObject(record, path, units);
  return sizes === null ? written : { ...written, sizes: writeSizes(sizes, joinPath(path, 'sizes'), units) };
}

/**
 * A job as the document of a job file: every default, material record and stock row written out, each value in the unit
 * in which it was entered. Read again it gives the same job to the last bit, and so the same digest.
 */
export function writeJob({ job, units }: Brief): Written {
  const { tube, loads, speed, materials, sizes, hold } = job;
  const own = {
    // a span that was left out is the length, and reads best in its unit
    tube: writeObject(tube, 'tube', { 'tube.supportSpacing': units['tube.length'] ?? 'm', ...units }),
    loads: loads.map((load, index) => writeLoad(load, joinPath('loads', index), units, tube.length)),
    speed: speed === null ? null : writeObject(speed, 'speed', units),
    materials: materials.map((material, index) => writeMaterial(material, joinPath('materials', index), units)),
    sizes: writeSizes(sizes, 'sizes', units),
    hold: hold.map((held, index) => writeObject(held, joinPath('hold', index), units)),
  };
  return writeObject({ ...job, ...own }, '', units);
}

/** `writeJob` as the text of a job file. */
export function writeJobText(brief: Brief): string {
  return `${JSON.stringify(writeJob(brief), null, 2)}\n`;
}
