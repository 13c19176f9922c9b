import { textWidth } from '../../../../src/figure/label.js';
import type { FrontInput } from '../../../../src/figure/front/model.js';
import type { TextWidth } from '../../../../src/figure/front/textWidth.js';
import type { FrontAxis, Job } from '../../../../src/job/job.js';
import { readJob } from '../../../../src/job/read.js';
import type { Report } from '../../../../src/report/report.js';
import { sizeJob } from '../../../../src/sizing/size.js';

const FAMILIES = ['aluminium', 'steel', 'titanium', 'nickel', 'carbon/epoxy'];

/** Made-up metals that differ in every way that shapes a front. */
export function metals(count: number, stiffer = 1): readonly Readonly<Record<string, unknown>>[] {
  return Array.from({ length: count }, (_, i) => ({
    id: `metal-${String(i)}`,
    kind: 'metal',
    name: `Metal number ${String(i)}, tube`,
    family: FAMILIES[i % FAMILIES.length],
    density: `${String(1800 + 170 * i)} kg/m³`,
    youngsModulus: `${String((45 + 4 * i) * stiffer)} GPa`,
    shearModulus: `${String((17 + 1.5 * i) * stiffer)} GPa`,
    poissonRatio: 0.3,
    tensileYield: `${String(180 + 20 * i)} MPa`,
    tensileUltimate: `${String(260 + 22 * i)} MPa`,
    shearUltimate: `${String(150 + 13 * i)} MPa`,
    wallMin: '0.7 mm',
    wallTolerance: 0.1,
    pricePerKilogram: 3 + i,
    source: 'made up for a test',
  }));
}

/** A sound job, that changes may be laid over. */
export function jobOf(changes: Readonly<Record<string, unknown>> = {}): Job {
  return briefOf(changes).job;
}

function briefOf(changes: Readonly<Record<string, unknown>>) {
  const document = {
    format: 'wringwall-job',
    version: 1,
    title: 'fronts',
    tube: { length: '1.4 m', outerDiameterMax: '90 mm' },
    loads: [{ name: 'jam', torque: '900 N·m', twistMax: '3 deg' }],
    materials: metals(5),
    ...changes,
  };
  const read = readJob(document, new Map(), new Map());
  if (!read.ok) throw new Error(read.problems[0]?.message);
  return read.brief;
}

const reports = new Map<string, Report>();

/** The report of a job of so many metals. */
export function reportOf(count: number, against: FrontAxis): Report {
  const key = `${String(count)} ${against}`;
  const found = reports.get(key) ?? sizeJob(briefOf({ materials: metals(count), front: { against } }));
  reports.set(key, found);
  return found;
}

/** What a report's front is drawn from, its lightest the pick. */
export function inputOf(report: Report, more: Partial<FrontInput> = {}): FrontInput {
  const lightest = report.candidates.find(({ feasible }) => feasible);
  const pick = lightest?.design ? { material: lightest.material, design: lightest.design } : null;
  return {
    job: report.job,
    against: report.front.against,
    points: report.front.points,
    pick,
    names: new Map(report.job.materials.map(({ id, name }) => [id, name])),
    kind: 'log',
    folded: false,
    system: 'SI',
    width: 690,
    height: 250,
    taken: [],
    ...more,
  };
}

export const measure: TextWidth = (text, size, face) => textWidth(text, size, face);
