import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { FrontAxis, Job } from '../../../src/job/job.js';
import type { Metal, StockTube } from '../../../src/material/material.js';
import type { Design, FrontPoint } from '../../../src/report/report.js';
import { sizeMaterial } from '../../../src/sizing/candidate.js';
import { withDominance, type OwnPoint } from '../../../src/sizing/dominance.js';
import { frontOf } from '../../../src/sizing/front.js';
import { sizeJob } from '../../../src/sizing/size.js';
import { solve } from '../../../src/sizing/solve.js';
import { fullest } from '../../reference/limits.js';
import { job, load, metal } from '../fixtures.js';
import { real, tasks, type Task } from './jobs.js';

const SAME = 2e-6;

/** The job with one value for the traded quantity in place of its own limits on it, rewritten by hand. */
function rewritten({ job, metal }: Task, against: FrontAxis, most: number | null): Task {
  if (against === 'outerDiameter') return { metal, job: { ...job, tube: { ...job.tube, outerDiameterMax: most } } };
  const some = job.loads.some(({ twistMax }) => twistMax !== null);
  const loads = job.loads.map((load) => (some && load.twistMax === null ? load : { ...load, twistMax: most }));
  return { metal, job: { ...job, loads } };
}

const withFront = (job: Job, against: FrontAxis): Job => ({ ...job, front: { against } });

const designIn = (job: Job, metal: Metal): Design | null => sizeMaterial({ job, units: {} }, metal).design;

function frontOfTask({ job, metal }: Task, against: 'twist' | 'outerDiameter'): OwnPoint[] {
  const own = withFront(job, against);
  return frontOf(own, metal, designIn(own, metal));
}

describe.each(['twist', 'outerDiameter'] as const)('a front against %s', (against) => {
  it('holds the lightest tube for each of its rungs', { timeout: 60_000 }, () => {
    let checked = 0;
    const exact = fc.property(tasks, fc.nat(40), (task, which) => {
      const points = frontOfTask(task, against);
      const point = points[Math.min(which, points.length - 1)];
      if (point === undefined) return;
      checked++;
      const { job, metal } = rewritten(task, against, point[against] * (1 + 1e-9));
      expect(Math.abs(solve(job, metal).size!.mass / point.mass - 1)).toBeLessThan(SAME);
      expect(fullest(job, metal, point.outerDiameter, point.wall)).toBeLessThan(1 + 2e-9);
    });
    fc.assert(exact, { numRuns: 60, seed: 3, endOnFailure: true });
    expect(checked).toBeGreaterThan(40);
  });

  it(
    'begins with the lightest tube of all, ends where nothing fits, and only rises between',
    { timeout: 60_000 },
    () => {
      let ended = 0;
      const whole = fc.property(tasks, (task) => {
        const points = frontOfTask(task, against);
        const free = rewritten(task, against, null);
        const { size } = solve(free.job, free.metal);
        expect(points.length > 0).toBe(size !== null);
        if (size === null) return;
        expect(Math.abs(points[0]!.mass / size.mass - 1)).toBeLessThan(SAME);
        const last = points.at(-1)!;
        const traded = points.map((point) => point[against]);
        for (let i = 1; i < points.length; i++) {
          expect(traded[i]!).toBeLessThan(traded[i - 1]!);
          expect(points[i]!.mass).toBeGreaterThanOrEqual(points[i - 1]!.mass * (1 - SAME));
        }
        const beyond = rewritten(task, against, last[against] * (1 - 2e-4));
        if (solve(beyond.job, beyond.metal).size === null) ended++;
        // a front that no envelope ends stops at a twentieth of its beginning
        else expect(last[against] / traded[0]!).toBeLessThan(1 / 19.9);
      });
      fc.assert(whole, { numRuns: 40, seed: 4, endOnFailure: true });
      expect(ended).toBeGreaterThan(0);
    },
  );

  it('has forty rungs or more wherever there is anything to trade, in geometric steps', () => {
    const task = {
      metal: metal(),
      job: job({ loads: [load({ twistMax: 0.05 })], tube: { ...job().tube, outerDiameterMax: 0.2 } }),
    };
    const points = frontOfTask(task, against);
    expect(points.length).toBeGreaterThanOrEqual(40);
    const ratios = points.slice(1).map((point, i) => point[against] / points[i]![against]);
    expect(Math.max(...ratios) / Math.min(...ratios)).toBeLessThan(1 + 1e-6);
    expect(points.some(({ meetsJob }) => meetsJob)).toBe(true);
  });

  it('says of each point whether it meets the job as it stands', () => {
    const said = fc.property(tasks, (task) => {
      for (const { outerDiameter, wall, meetsJob } of frontOfTask(task, against)) {
        expect(fullest(task.job, task.metal, outerDiameter, wall) <= 1 + 1e-9).toBe(meetsJob);
      }
    });
    fc.assert(said, { numRuns: 30, seed: 5, endOnFailure: true });
  });
});

/** Whether q beats p: no heavier and no worse in the traded quantity, and better in one. */
function beats(q: OwnPoint, p: OwnPoint, against: FrontAxis): boolean {
  const traded = ({ [against]: value }: OwnPoint): number => value ?? Infinity;
  if (q.mass > p.mass || traded(q) > traded(p)) return false;
  return q.mass < p.mass || traded(q) < traded(p);
}

/** Few distinct values, so that ties come up. */
const points: fc.Arbitrary<OwnPoint[]> = fc.array(
  fc.record({
    material: fc.constantFrom('a', 'b'),
    mass: fc.integer({ min: 1, max: 12 }),
    twist: fc.integer({ min: 1, max: 12 }),
    outerDiameter: fc.integer({ min: 1, max: 12 }),
    wall: fc.constant(1),
    layup: fc.constant(null),
    cost: fc.option(fc.integer({ min: 1, max: 12 })),
    governs: fc.constant('twist' as const),
    meetsJob: fc.boolean(),
  }),
  { maxLength: 30 },
);

describe('dominance', () => {
  it('is what its definition says, pair by pair', () => {
    const defined = fc.property(
      points,
      fc.constantFrom('twist', 'outerDiameter', 'cost'),
      (own, against: FrontAxis) => {
        const marked = withDominance(own, against);
        expect(marked).toMatchObject(own);
        expect(marked.map(({ dominated }) => dominated)).toEqual(own.map((p) => own.some((q) => beats(q, p, against))));
      },
    );
    fc.assert(defined, { numRuns: 500, seed: 3, endOnFailure: true });
  });

  it('is reckoned over all materials of a report', () => {
    const heavy = metal({ id: 'heavy', density: 9000 });
    const { front } = sizeJob({ job: job({ materials: [heavy, metal()] }), units: {} });
    const of = (id: string): FrontPoint[] => front.points.filter(({ material }) => material === id);
    expect(of('heavy').length).toBeGreaterThanOrEqual(40);
    expect(of('heavy').every(({ dominated }) => dominated)).toBe(true);
    expect(of('a-steel').some(({ dominated }) => dominated)).toBe(false);
  });
});

const stockTubes: fc.Arbitrary<StockTube[]> = fc.array(
  fc.record({
    outerDiameter: real(0.02, 0.2),
    wall: real(5e-4, 3e-3),
    pricePerMetre: fc.option(real(1, 50)),
  }),
  { minLength: 1, maxLength: 40 },
);

describe('a front over listed sizes', () => {
  it.each(['twist', 'outerDiameter', 'cost'] as const)('against %s is every size that no other beats', (against) => {
    let seen = 0;
    const unbeaten = fc.property(tasks, stockTubes, (task, stock) => {
      const { metal } = task;
      const listed = withFront({ ...task.job, sizes: { stock } }, against);
      const own = frontOf(listed, metal, designIn(listed, metal));
      const free = against === 'cost' ? task : rewritten(task, against, null);
      const passing = stock.filter(
        ({ outerDiameter, wall }) => fullest(free.job, metal, outerDiameter, wall) <= 1 + 1e-9,
      );
      if (against === 'cost' && !passing.some(({ pricePerMetre }) => pricePerMetre !== null)) return;
      seen += own.length;
      if (passing.length > 0) expect(own.length).toBeGreaterThan(0);
      for (const { outerDiameter, wall } of own) {
        expect(passing.some((row) => row.outerDiameter === outerDiameter && row.wall === wall)).toBe(true);
      }
      expect(own.some((p) => own.some((q) => beats(q, p, against)))).toBe(false);
      const lightest = Math.min(...own.map(({ mass }) => mass));
      if (against !== 'cost' && passing.length > 0) {
        const free = listed.loads.every(({ twistMax }) => twistMax === null) && listed.tube.outerDiameterMax === null;
        if (free) expect(lightest).toBe(solve(listed, metal).size!.mass);
      }
    });
    fc.assert(unbeaten, { numRuns: 80, seed: 3, endOnFailure: true });
    expect(seen).toBeGreaterThan(20);
  });
});
