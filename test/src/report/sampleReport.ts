import type { Brief } from '../../../src/job/job.js';
import type { Candidate, Design, LimitEntry, Report } from '../../../src/report/report.js';

/** A design with invented numbers. */
export function sampleDesign(changes: Partial<Design> = {}): Design {
  return {
    outerDiameter: 0.063214,
    wall: 0.0011834,
    bore: 0.0608472,
    meanRadius: 0.0310153,
    mass: 0.83217,
    twist: 0.04893,
    torsionalStiffness: 18400,
    strainEnergy: 22,
    cost: 5.4,
    layup: null,
    ...changes,
  };
}

/** One entry of a limit under the load "jam torque". */
export function sampleLimit(changes: Partial<LimitEntry> = {}): LimitEntry {
  const entry: LimitEntry = {
    limit: 'shear-ultimate',
    load: 'jam torque',
    demand: 1.1e8,
    capacity: 1.86e8,
    unit: 'Pa',
    utilisation: 0.59,
    margin: 0.6949,
    governs: false,
  };
  return { ...entry, ...changes };
}

/** A material that fits, with the twist full. */
export function fitting(material: string, changes: Partial<Candidate> = {}): Candidate {
  return {
    material,
    feasible: true,
    design: sampleDesign(),
    limits: [sampleLimit(), sampleLimit({ limit: 'twist', unit: 'rad', utilisation: 1, margin: 0, governs: true })],
    relief: [],
    optimality: { method: 'invented', lowerBoundMass: 0.8321, gap: 1e-7, evaluations: 1 },
    flags: [],
    noFit: null,
    ...changes,
  };
}

/** A material that does not fit. */
export function failing(material: string): Candidate {
  const noFit = {
    conflict: ['twist', 'outer-diameter'] as const,
    ease: [
      { path: 'tube.outerDiameterMax', from: '90 mm', to: '97.9 mm' },
      { path: 'loads.0.twistMax', from: '3 deg', to: '3.92 deg' },
    ],
    torqueFactor: null,
  };
  return { ...fitting(material), feasible: false, design: null, limits: [], noFit };
}

/** A report on a job with invented answers: as many materials as the job has, the last of them failing on request. */
export function sampleReport({ job }: Brief, fits: (index: number) => boolean = () => true): Report {
  const candidates = job.materials.map(({ id }, index) => (fits(index) ? fitting(id) : failing(id)));
  const first = candidates.find(({ feasible }) => feasible);
  return {
    format: 'wringwall-report',
    version: 1,
    engine: '0.0.0',
    jobDigest: 'sha256:0',
    units: 'SI: m, kg, s, N, Pa, rad',
    candidates,
    job,
    held: [],
    pick: first === undefined ? null : { material: first.material },
    front: { against: job.front.against, points: [] },
  };
}
