import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LimitId } from '../../../src/report/report.js';
import { sizeMaterial } from '../../../src/sizing/candidate.js';
import { designMap, type DesignMap, type MapCurve } from '../../../src/sizing/map.js';
import { mapPoints } from '../../../src/sizing/mapPoints.js';
import { type MapPoint, MapScale, type MapWindow } from '../../../src/sizing/mapScale.js';
import { fullest, utilisations } from '../../reference/limits.js';
import { job, load, metal } from '../fixtures.js';
import { real, tasks as all, type Task } from './jobs.js';

/** What is promised, as a share of the axis. */
const TRACED = 1e-3;

/** A job whose least diameter is over its greatest is refused before it comes here. */
const tasks = all.filter(({ job: { tube } }) => (tube.outerDiameterMin ?? 0) < (tube.outerDiameterMax ?? Infinity));

interface Place {
  readonly x: number;
  readonly y: number;
}

/** A window about the size at which a wall of a twentieth carries the torque. */
const windows = fc.record({ reach: real(0.8, 3), stout: real(0.03, 0.14), log: fc.boolean() });

function windowOf(
  { job: own, metal: its }: Task,
  { reach, stout, log }: { reach: number; stout: number; log: boolean },
): MapWindow {
  const torque = Math.max(...own.loads.map((one) => Math.abs(one.torque)));
  const outerHi = reach * Math.cbrt((torque * 60) / (Math.PI * its.shearYield));
  return { outerLo: outerHi / 3, outerHi, wallLo: log ? (stout * outerHi) / 40 : 0, wallHi: stout * outerHi, log };
}

/** How full a limit is, by formulas of their own, as the fullest over its loads; −∞ where the job has none. */
function fullness({ job: own, metal: its }: Task, limit: LimitId, { outerDiameter, wall }: MapPoint): number {
  const all = utilisations(own, its, outerDiameter, wall).filter((one) => one.limit === limit);
  return Math.max(...all.map(({ U }) => U));
}

function placesOf(points: readonly MapPoint[], scale: MapScale): Place[] {
  return points.map(({ outerDiameter, wall }) => ({ x: scale.outer.share(outerDiameter), y: scale.wall.share(wall) }));
}

function sizeAt(scale: MapScale, { x, y }: Place): MapPoint {
  return { outerDiameter: scale.outer.at(x), wall: scale.wall.at(y) };
}

/** Distance of a place from a chain of places. */
function distance({ x, y }: Place, line: readonly Place[]): number {
  return Math.min(
    ...line.slice(1).map((q, i) => {
      const p = line[i]!;
      const [dx, dy] = [q.x - p.x, q.y - p.y];
      const length = dx * dx + dy * dy;
      const s = length === 0 ? 0 : Math.min(Math.max(((x - p.x) * dx + (y - p.y) * dy) / length, 0), 1);
      return Math.hypot(x - p.x - s * dx, y - p.y - s * dy);
    }),
  );
}

function linesOf(branches: readonly { points: readonly MapPoint[]; closed: boolean }[], scale: MapScale): Place[][] {
  return branches.map(({ points, closed }) => {
    const line = placesOf(points, scale);
    return closed ? [...line, line[0]!] : line;
  });
}

/** Whether a place lies inside an odd number of rings. */
function inside({ x, y }: Place, rings: readonly (readonly Place[])[]): boolean {
  let odd = false;
  for (const ring of rings)
    ring.forEach((p, i) => {
      const q = ring[(i + 1) % ring.length]!;
      if (p.y > y !== q.y > y && x < p.x + ((y - p.y) / (q.y - p.y)) * (q.x - p.x)) odd = !odd;
    });
  return odd;
}

/** Numbers that are the same every time. */
function numbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

const isTube = ({ outerDiameter, wall }: MapPoint): boolean => wall > 0 && outerDiameter > 2.03 * wall;

function points(map: DesignMap): readonly { curve: MapCurve; point: MapPoint }[] {
  return map.curves.flatMap((curve) =>
    curve.branches.flatMap((branch) => branch.points.map((point) => ({ curve, point }))),
  );
}

describe('the boundary of each limit', () => {
  it('is exactly full at every point', () => {
    let seen = 0;
    const full = fc.property(tasks, windows, (task, about) => {
      for (const { curve, point } of points(designMap(task.job, task.metal, windowOf(task, about)))) {
        seen++;
        const most = Math.max(
          ...[...utilisations(task.job, task.metal, point.outerDiameter, point.wall)]
            .filter((one) => one.limit === curve.limit)
            .map(({ U }) => (Math.abs(U - 1) < 1e-4 ? 1 : 0)),
        );
        expect(most, curve.limit).toBe(1);
      }
    });
    fc.assert(full, { numRuns: 150, seed: 31, endOnFailure: true });
    expect(seen).toBeGreaterThan(50_000);
  });

  it('is nowhere a thousandth of the axis from where the limit turns full', { timeout: 120_000 }, () => {
    let seen = 0;
    const near = fc.property(tasks, windows, fc.nat(), (task, about, seed) => {
      const window = windowOf(task, about);
      const scale = new MapScale(window);
      const next = numbers(seed);
      const map = designMap(task.job, task.metal, window);
      const lines = new Map<LimitId, Place[][]>();
      for (const { limit, branches } of map.curves)
        lines.set(limit, [...(lines.get(limit) ?? []), ...linesOf(branches, scale)]);
      for (let i = 0; i < 400; i++) {
        const a = { x: next(), y: next() };
        const angle = 2 * Math.PI * next();
        const b = { x: a.x + 0.02 * Math.cos(angle), y: a.y + 0.02 * Math.sin(angle) };
        if (!isTube(sizeAt(scale, a)) || !isTube(sizeAt(scale, b))) continue;
        if (Math.min(a.x, a.y, b.x, b.y) < 0.001 || Math.max(b.x, b.y) > 1) continue;
        for (const [limit, its] of lines) {
          const at = (s: number): number =>
            Math.log(fullness(task, limit, sizeAt(scale, { x: a.x + s * (b.x - a.x), y: a.y + s * (b.y - a.y) })));
          let [low, high] = [0, 1];
          if (at(0) > 0 === at(1) > 0) continue;
          const rising = at(1) > 0;
          while (high - low > 1e-6) {
            const s = (low + high) / 2;
            if (at(s) > 0 === rising) high = s;
            else low = s;
          }
          seen++;
          const root = { x: a.x + low * (b.x - a.x), y: a.y + low * (b.y - a.y) };
          expect(Math.min(Infinity, ...its.map((line) => distance(root, line))), limit).toBeLessThan(TRACED);
        }
      }
    });
    fc.assert(near, { numRuns: 60, seed: 32, endOnFailure: true });
    expect(seen).toBeGreaterThan(1000);
  });

  it('has what is forbidden on its left', () => {
    let seen = 0;
    const left = fc.property(tasks, windows, (task, about) => {
      const window = windowOf(task, about);
      const scale = new MapScale(window);
      const map = designMap(task.job, task.metal, window);
      for (const { limit, branches } of map.curves) {
        // the two sides of one limit may cross each other's strokes
        if (map.curves.filter((one) => one.limit === limit).length > 1) continue;
        for (const line of linesOf(branches, scale))
          line.slice(1).forEach((q, i) => {
            const p = line[i]!;
            const length = Math.hypot(q.x - p.x, q.y - p.y);
            if (length < 0.004 || Math.min(p.y, q.y) < 0.001) return;
            const off = (side: number): number => {
              const [x, y] = [
                (p.x + q.x) / 2 - (side * (q.y - p.y)) / length,
                (p.y + q.y) / 2 + (side * (q.x - p.x)) / length,
              ];
              return fullness(task, limit, sizeAt(scale, { x, y }));
            };
            seen++;
            expect(off(4e-4), limit).toBeGreaterThan(off(-4e-4));
          });
      }
    });
    fc.assert(left, { numRuns: 100, seed: 33, endOnFailure: true });
    expect(seen).toBeGreaterThan(3000);
  });

  it('bends back where a whirl limit does', () => {
    const shaft = job({
      tube: { ...job().tube, length: 1, supportSpacing: 1 },
      loads: [load({ torque: 100, axial: -40e3 })],
      speed: { max: 700, margin: 1.25 },
    });
    const map = designMap(shaft, metal(), { outerLo: 0.02, outerHi: 0.06, wallLo: 0, wallHi: 0.006, log: false });
    const [line] = map.curves.find(({ limit }) => limit === 'whirl')!.branches;
    const steps = line!.points.slice(1).map((q, i) => Math.sign(q.outerDiameter - line!.points[i]!.outerDiameter));
    expect(new Set(steps.filter((step) => step !== 0)).size).toBe(2);
  });

  it('has its corners solved for, where one load takes over from another', () => {
    const loads = [
      load({ torque: 1000, twistMax: null }),
      load({ name: 'bent', torque: 10, bending: 500, axial: 60e3 }),
    ];
    const map = designMap(job({ loads }), metal(), {
      outerLo: 0.02,
      outerHi: 0.09,
      wallLo: 0,
      wallHi: 0.006,
      log: false,
    });
    const curve = map.curves.find(({ limit }) => limit === 'shear-ultimate')!;
    const shared = curve.branches
      .flatMap((branch) => branch.points)
      .filter(({ outerDiameter, wall }) => {
        const both = utilisations(job({ loads }), metal(), outerDiameter, wall).filter(
          ({ limit }) => limit === 'shear-ultimate',
        );
        return both.length === 2 && both.every(({ U }) => Math.abs(U - 1) < 1e-8);
      });
    expect(shared.length).toBe(1);
  });

  it('says what it demands where that is one number', () => {
    const tube = { ...job().tube, outerDiameterMax: 0.09, outerDiameterMin: 0.03, boreMin: 0.02, wallMin: 0.7e-3 };
    const loads = [load({ twistMax: 0.05 }), load({ name: 'two', torque: 2000, twistMax: 0.05, shearStressMax: 1e8 })];
    const { curves } = designMap(job({ tube, loads }), metal(), {
      outerLo: 0.02,
      outerHi: 0.1,
      wallLo: 0,
      wallHi: 0.005,
      log: false,
    });
    const said = curves.map(({ limit, demand, atLeast }) => [limit, demand, atLeast]);
    expect(said).toContainEqual(['twist', 0.05, false]);
    expect(said).toContainEqual(['outer-diameter', 0.09, false]);
    expect(said).toContainEqual(['outer-diameter', 0.03, true]);
    expect(said).toContainEqual(['bore', 0.02, true]);
    expect(said).toContainEqual(['wall-min', 0.7e-3, true]);
    expect(said).toContainEqual(['wall-buckling', null, false]);
  });
});

describe('the region', () => {
  it('is where all limits pass, on 10 000 sizes', { timeout: 60_000 }, () => {
    let held = 0;
    let looked = 0;
    const same = fc.property(tasks, windows, fc.nat(), (task, about, seed) => {
      const window = windowOf(task, about);
      const scale = new MapScale(window);
      const rings = linesOf(
        designMap(task.job, task.metal, window).region.map((ring) => ({ ...ring, closed: false })),
        scale,
      );
      const next = numbers(seed);
      for (let i = 0; i < 10_000 / 50; i++) {
        const place = { x: next(), y: 1e-3 + 0.999 * next() };
        const size = sizeAt(scale, place);
        const passes = fullest(task.job, task.metal, size.outerDiameter, size.wall) <= 1;
        if (passes === inside(place, rings)) {
          looked++;
          if (passes) held++;
        } else {
          const closed = rings.map((ring) => [...ring, ring[0]!]);
          expect(Math.min(Infinity, ...closed.map((ring) => distance(place, ring)))).toBeLessThan(TRACED);
        }
      }
    });
    fc.assert(same, { numRuns: 150, seed: 34, endOnFailure: true });
    expect(looked).toBeGreaterThan(29_900);
    expect(held).toBeGreaterThan(1500);
  });

  it('is closed by the limits that are full there', () => {
    const near = fc.property(tasks, windows, (task, about) => {
      for (const { points: ring, limits } of designMap(task.job, task.metal, windowOf(task, about)).region)
        ring.forEach((point, i) => {
          const limit = limits[i] ?? null;
          if (limit !== null) expect(Math.abs(fullness(task, limit, point) - 1), limit).toBeLessThan(1e-4);
        });
    });
    fc.assert(near, { numRuns: 150, seed: 35, endOnFailure: true });
  });
});

describe('the sizes that a map is drawn about', () => {
  const about = ({ job: own, metal: its }: Task) => mapPoints(own, its, sizeMaterial({ job: own, units: {} }, its));

  it('have the optimum on the boundaries of exactly the limits that are full', () => {
    let seen = 0;
    const on = fc.property(tasks, (task) => {
      const { optimum, full } = about(task);
      if (optimum === null) return;
      const { outerDiameter: d, wall: t } = optimum;
      const window = { outerLo: d * 0.5, outerHi: d * 1.3, wallLo: 0, wallHi: 2.2 * t, log: false };
      const scale = new MapScale(window);
      const [place] = placesOf([optimum], scale);
      for (const { limit, branches } of designMap(task.job, task.metal, window).curves) {
        const away = Math.min(Infinity, ...linesOf(branches, scale).map((line) => distance(place!, line)));
        const U = fullness(task, limit, optimum);
        if (U > 0.999 && full.includes(limit) && U > 1 - 1e-6 && away < TRACED) seen++;
        if (!full.includes(limit)) expect(away, limit).toBeGreaterThan(0);
      }
      for (const limit of full) {
        if (fullness(task, limit, optimum) < 1 - 1e-6) continue;
        const its = designMap(task.job, task.metal, window).curves.filter((curve) => curve.limit === limit);
        expect(
          Math.min(...its.flatMap(({ branches }) => linesOf(branches, scale).map((line) => distance(place!, line)))),
        ).toBeLessThan(TRACED);
      }
    });
    fc.assert(on, { numRuns: 60, seed: 36, endOnFailure: true });
    expect(seen).toBeGreaterThan(60);
  });

  it('have a lighter one without a full limit of the envelope, that breaks it alone', () => {
    let seen = 0;
    const without = fc.property(tasks, (task) => {
      const { optimum, full, without: next } = about(task);
      if (optimum === null || next === null) return;
      seen++;
      expect(full).toContain(next.limit);
      expect(next.size.mass).toBeLessThan(optimum.mass);
      const { outerDiameter, wall } = next.size;
      expect(fullest(task.job, task.metal, outerDiameter, wall)).toBeGreaterThan(1);
      expect(fullest(task.job, task.metal, outerDiameter, wall, new Set([next.limit]))).toBeLessThan(1 + 1e-8);
    });
    fc.assert(without, { numRuns: 80, seed: 37, endOnFailure: true });
    expect(seen).toBeGreaterThan(10);
  });

  it('are, where nothing fits, the lightest that meet all but one of the limits in conflict', () => {
    const task = {
      job: job({ tube: { ...job().tube, outerDiameterMax: 0.03 }, loads: [load({ torque: 4000, twistMax: 0.01 })] }),
      metal: metal(),
    };
    const { optimum, conflict, instead } = about(task);
    expect(optimum).toBeNull();
    expect(conflict.length).toBeGreaterThan(1);
    expect(instead.length).toBeGreaterThan(0);
    for (const { outerDiameter, wall } of instead) {
      const broken = new Set(
        utilisations(task.job, task.metal, outerDiameter, wall)
          .filter(({ U }) => U > 1 + 1e-8)
          .map(({ limit }) => limit),
      );
      expect(broken.size).toBe(1);
    }
  });
});

describe('a listed size', () => {
  it('is a point in the window, and says whether it passes', () => {
    const sizes = [0.02, 0.04, 0.05, 0.06].map((outerDiameter) => ({
      outerDiameter,
      wall: 0.003,
      pricePerMetre: null,
    }));
    const own = job({ sizes: { stock: sizes } });
    const { stock } = designMap(own, metal(), { outerLo: 0.03, outerHi: 0.055, wallLo: 0, wallHi: 0.005, log: false });
    expect(stock?.map(({ outerDiameter }) => outerDiameter)).toEqual([0.04, 0.05]);
    expect(stock?.map(({ fits }) => fits)).toEqual(
      [0.04, 0.05].map((outerDiameter) => fullest(own, metal(), outerDiameter, 0.003) <= 1 + 1e-9),
    );
  });
});
