import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { demoJob, rootFolder } from '../../main/files/assets.js';

/** A job as its file holds it. */
export type JobDocument = Readonly<Record<string, unknown>>;

function readJson(file: string): JobDocument {
  return JSON.parse(readFileSync(file, 'utf8')) as JobDocument;
}

/** A demo job by the name of its file. */
export const demo = (name: string): JobDocument => readJson(demoJob(`${name}.wring.json`));

const FOLDER = path.join(rootFolder(), 'assets', 'materials');
const RECORDS = readdirSync(FOLDER)
  .sort()
  .map((name) => readJson(path.join(FOLDER, name)));

const text = (value: unknown): string => (typeof value === 'string' ? value : '');

/** Records for a job, more of them than the library holds: those of the library in turn, each under an id of its own. */
function records(count: number): readonly JobDocument[] {
  return Array.from({ length: count }, (_, i) => {
    const record = RECORDS[i % RECORDS.length] ?? {};
    return { ...record, id: `made-of-${i}`, name: `${text(record['name'])} ${i}` };
  });
}

function loads(count: number): readonly JobDocument[] {
  return Array.from({ length: count }, (_, i) => ({
    name: `case ${i + 1}`,
    torque: `${600 + 13 * i} N·m`,
    bending: `${20 * (i % 7)} N·m`,
    axial: `${(i % 5) - 2} kN`,
    twistMax: '2 deg/m',
  }));
}

const BASE: JobDocument = {
  format: 'wringwall-job',
  version: 1,
  title: 'Shaft of the test bench',
  tube: { length: '1.8 m', outerDiameterMax: '140 mm' },
  loads: [{ name: 'start', torque: '900 N·m', twistMax: '3 deg' }],
  materials: ['al-6061-t6', 'steel-4130-n', 'ti-6al-4v-annealed'],
};

/** Three materials under one load, in which torque governs. */
export const PLAIN = BASE;
/** Twelve metals, each with a front of its own. */
export const TWELVE_METALS: JobDocument = { ...BASE, materials: RECORDS.slice(0, 12).map(({ id }) => id) };
export const THIRTY_LOADS: JobDocument = { ...BASE, loads: loads(30) };
export const FORTY_MATERIALS: JobDocument = { ...BASE, materials: records(40) };
/** So much that it takes a second or two. */
export const HEAVY: JobDocument = { ...BASE, loads: loads(25), materials: records(40) };
/** So much that it takes many seconds. */
export const LONG: JobDocument = { ...BASE, loads: loads(150), materials: records(40) };
/** An envelope too small for the torque: each of its materials fits with a single change. */
export const NOTHING_FITS: JobDocument = {
  ...BASE,
  tube: { length: '1.8 m', outerDiameterMax: '45 mm' },
  loads: [{ name: 'start', torque: '900 N·m', twistMax: '3 deg' }],
  materials: ['al-6061-t6', 'steel-4130-n'],
};
