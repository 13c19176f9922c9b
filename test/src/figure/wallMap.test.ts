import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { CircleShape, Figure, Label } from '../../../src/figure/figure.js';
import { labelBox } from '../../../src/figure/label.js';
import { mapAxes } from '../../../src/figure/mapAxes.js';
import type { MapDesign } from '../../../src/figure/mapDrafting.js';
import { curveName } from '../../../src/figure/mapNames.js';
import { piecesOf } from '../../../src/figure/mapCurves.js';
import { MapSheet } from '../../../src/figure/mapSheet.js';
import type { Point } from '../../../src/figure/point.js';
import { wallMapFigure, type WallMap } from '../../../src/figure/wallMap.js';
import type { UnitSystem } from '../../../src/quantity/register.js';
import { limitLabel } from '../../../src/report/words.js';
import { checkDesign, sizeMaterial } from '../../../src/sizing/candidate.js';
import { designMap } from '../../../src/sizing/map.js';
import { mapPoints } from '../../../src/sizing/mapPoints.js';
import { job, load, metal } from '../fixtures.js';
import { real, tasks as all, type Task } from '../sizing/jobs.js';

interface Drawn {
  readonly content: WallMap;
  readonly sheet: MapSheet;
  readonly figure: Figure;
}

interface How {
  readonly width?: number;
  readonly height?: number;
  readonly system?: UnitSystem;
  readonly log?: boolean;
  readonly isPick?: boolean;
  readonly held?: readonly (readonly [number, number])[];
}

function drawn({ job: own, metal: its }: Task, how: How = {}): Drawn {
  const { width = 712, height = 276, system = 'SI', log = false, isPick = true } = how;
  const points = mapPoints(own, its, sizeMaterial({ job: own, units: {} }, its));
  const held = (how.held ?? []).map(([outerDiameter, wall], i): MapDesign => {
    const fits = checkDesign(own, its, outerDiameter, wall).feasible;
    return { name: `held ${String(i)}`, outerDiameter, wall, fits, picked: false };
  });
  const axes = mapAxes(points, own.tube, held, system, log);
  const map = designMap(own, its, axes.window);
  const notes =
    points.optimum === null ? ['nothing fits: two limits stand against each other', 'it fits with another'] : [];
  const content = { map, points, metal: { metal: its, length: own.tube.length }, held, isPick, notes };
  const sheet = new MapSheet(axes, width, height);
  return { content, sheet, figure: wallMapFigure(content, sheet, system) };
}

/** A shaft whose lightest tube is as wide as may be, and twists as much as it may. */
const shaft: Task = {
  metal: metal({
    density: 2800,
    youngsModulus: 72e9,
    shearModulus: 27e9,
    tensileYield: 290e6,
    shearYield: 167e6,
    compressiveYield: 290e6,
  }),
  job: job({
    tube: { ...job().tube, length: 1.4, supportSpacing: 1.4, outerDiameterMax: 0.09, boreMin: 0.02 },
    loads: [load({ torque: 900, twistMax: (3 * Math.PI) / 180 })],
  }),
};

const tasks = all.filter(({ job: { tube } }) => (tube.outerDiameterMin ?? 0) < (tube.outerDiameterMax ?? Infinity));

/** Whether two rectangles overlap, by the theorem of separating axes. */
function overlap(a: readonly Point[], b: readonly Point[]): boolean {
  const axes = [a, b].flatMap(([p, q, , s]) => [
    { x: q!.x - p!.x, y: q!.y - p!.y },
    { x: s!.x - p!.x, y: s!.y - p!.y },
  ]);
  return axes.every((axis) => {
    const along = (box: readonly Point[]) => box.map(({ x, y }) => x * axis.x + y * axis.y);
    const [one, other] = [along(a), along(b)];
    return Math.min(...one) < Math.max(...other) && Math.min(...other) < Math.max(...one);
  });
}

function overlapping(labels: readonly Label[]): string[] {
  return labels.flatMap((a, i) =>
    labels.slice(i + 1).flatMap((b) => (overlap(labelBox(a), labelBox(b)) ? [`${a.text} / ${b.text}`] : [])),
  );
}

function texts({ labels }: Figure): string[] {
  return labels.map(({ text }) => text);
}

function circles({ shapes }: Figure): CircleShape[] {
  return shapes.filter((shape) => shape.kind === 'circle');
}

describe('the labels of a wall map', () => {
  it('never overlap and never leave the sheet, whatever the job', { timeout: 60_000 }, () => {
    const sizes = fc.record({
      width: real(320, 1100),
      height: real(240, 620),
      log: fc.boolean(),
      system: fc.constantFrom<UnitSystem>('SI', 'US'),
      isPick: fc.boolean(),
    });
    let seen = 0;
    const clear = fc.property(tasks, sizes, real(0.5, 1.2), (task, how, share) => {
      const held = [[0.05 * share, 0.002]] as const;
      const { figure, sheet } = drawn(task, { ...how, held });
      seen += figure.labels.length;
      expect(overlapping(figure.labels)).toEqual([]);
      for (const corner of figure.labels.flatMap(labelBox)) {
        expect(corner.x).toBeGreaterThan(-8);
        expect(corner.x).toBeLessThan(sheet.width + 1);
        expect(corner.y).toBeGreaterThan(-6);
        expect(corner.y).toBeLessThan(sheet.height + 2);
      }
    });
    fc.assert(clear, { numRuns: 150, seed: 51, endOnFailure: true });
    expect(seen).toBeGreaterThan(2000);
  });

  it('name every limit that is seen, with what it demands', () => {
    const { figure, content, sheet } = drawn(shaft);
    for (const curve of content.map.curves) {
      const longest = Math.max(0, ...piecesOf(curve, sheet).map(({ length }) => length));
      if (longest > 60) expect(texts(figure)).toContain(curveName(curve, 'SI'));
    }
    expect(texts(figure)).toContain('twist 3 deg');
    expect(texts(figure)).toContain('outer diameter 90');
    expect(texts(figure)).toContain('every limit');
  });
});

describe('the cross-hair', () => {
  it('stands at the optimum, in copper for the pick and in ink for any other', () => {
    for (const isPick of [true, false]) {
      const { figure, content, sheet } = drawn(shaft, { isPick });
      const ring = circles(figure).at(-1)!;
      const { x, y } = sheet.at(content.points.optimum!);
      expect(ring).toMatchObject({ x, y, line: isPick ? 'copper' : 'ink' });
      const copper = [...figure.shapes.map(({ line }) => line), ...figure.labels.map(({ tone }) => tone)].filter(
        (tone) => tone === 'copper',
      );
      expect(copper.length > 0).toBe(isPick);
    }
  });

  it('stands on the boundary of exactly the limits that are full', () => {
    let seen = 0;
    const on = fc.property(tasks, (task) => {
      const { content, sheet } = drawn(task);
      const { optimum, full } = content.points;
      if (optimum === null) return;
      const { x, y } = sheet.at(optimum);
      const { limits } = checkDesign(task.job, task.metal, optimum.outerDiameter, optimum.wall);
      for (const curve of content.map.curves) {
        const U = Math.max(
          ...limits.filter(({ limit }) => limit === curve.limit).map(({ utilisation }) => utilisation),
        );
        const away = Math.min(
          Infinity,
          ...piecesOf(curve, sheet).flatMap(({ points }) => points.slice(1).map((q, i) => off(x, y, points[i]!, q))),
        );
        if (!full.includes(curve.limit)) expect(away, curve.limit).toBeGreaterThan(0.01);
        if (U > 1 - 1e-7 && away < 0.7) seen++;
      }
      for (const limit of full) {
        const U = Math.max(...limits.filter((one) => one.limit === limit).map(({ utilisation }) => utilisation));
        if (U < 1 - 1e-7) continue;
        const its = content.map.curves
          .filter((curve) => curve.limit === limit)
          .flatMap((curve) => piecesOf(curve, sheet));
        const away = Math.min(...its.flatMap(({ points }) => points.slice(1).map((q, i) => off(x, y, points[i]!, q))));
        expect(away, limit).toBeLessThan(0.7);
      }
    });
    fc.assert(on, { numRuns: 60, seed: 52, endOnFailure: true });
    expect(seen).toBeGreaterThan(50);
  });

  it('has its two figures in place of the marks beside them', () => {
    const { figure, sheet } = drawn(shaft);
    const strong = figure.labels.filter(({ tone }) => tone === 'copper');
    expect(strong.map(({ text }) => text)).toContain('90.0');
    const level = figure.labels.filter(({ y }) => Math.abs(y - (sheet.plot.bottom + 15)) < 1).map(({ text }) => text);
    expect(level).not.toContain('90');
    expect(level).toContain('70');
  });
});

function off(x: number, y: number, p: Point, q: Point): number {
  const [dx, dy] = [q.x - p.x, q.y - p.y];
  const length = dx * dx + dy * dy;
  const s = length === 0 ? 0 : Math.min(Math.max(((x - p.x) * dx + (y - p.y) * dy) / length, 0), 1);
  return Math.hypot(x - p.x - s * dx, y - p.y - s * dy);
}

describe('the wall map', () => {
  it('shows where the optimum would lie without the outer diameter', () => {
    const { figure, content, sheet } = drawn(shaft);
    const { size, limit } = content.points.without!;
    expect(limit).toBe('outer-diameter');
    const { x, y } = sheet.at(size);
    expect(circles(figure)).toContainEqual(expect.objectContaining({ x, y, fill: 'paper' }));
    expect(texts(figure)).toContain('without this limit');
  });

  it('has curves of equal mass at round values, rising up the right edge', () => {
    const { figure, sheet } = drawn(shaft);
    const ends = figure.labels.filter(({ x, anchor }) => anchor === 'start' && Math.abs(x - sheet.plot.right - 7) < 1);
    const masses = ends.map(({ text }) => Number(text.replace(' kg', '')));
    expect(masses.length).toBeGreaterThan(4);
    expect(ends.filter(({ text }) => text.endsWith(' kg')).length).toBe(1);
    const step = masses[0]!;
    masses.forEach((mass, i) => {
      expect(mass).toBeCloseTo((i + 1) * step, 9);
      const { outerDiameter, wall } = sheet.tubeAt({ x: sheet.plot.right, y: ends[i]!.y - 3.7 });
      expect(2800 * Math.PI * wall * (outerDiameter - wall) * 1.4).toBeCloseTo(mass, 6);
    });
  });

  it('has axes of round steps that stay when a design that is seen is taken in hand', () => {
    const before = drawn(shaft).sheet.axes;
    const after = drawn(shaft, { held: [[0.1, 0.003]] }).sheet.axes;
    expect(after).toEqual(before);
    expect(drawn(shaft, { held: [[0.13, 0.003]] }).sheet.axes.outer.hi).toBeGreaterThanOrEqual(0.13);
    expect(before.outer.ticks.map(({ text }) => text)).toContain('60');
    expect(drawn(shaft, { system: 'US' }).sheet.axes.outer.ticks.map(({ text }) => text)).toContain('3.0');
  });

  it('shows designs in hand, hollow where they do not pass', () => {
    const { figure } = drawn(shaft, {
      held: [
        [0.09, 0.004],
        [0.07, 0.001],
      ],
    });
    const marks = figure.shapes.filter(
      ({ kind, fill, width }) => kind === 'path' && fill !== undefined && width === 1.2,
    );
    expect(marks.map(({ fill }) => fill)).toEqual(['ink', 'paper']);
    expect(texts(figure)).toContain('held 0');
  });

  it('shows listed sizes as points, hollow where they do not pass', () => {
    const sizes = [0.06, 0.07, 0.08, 0.09].flatMap((outerDiameter) =>
      [0.002, 0.003].map((wall) => ({ outerDiameter, wall, pricePerMetre: null })),
    );
    const { figure, content } = drawn({ ...shaft, job: { ...shaft.job, sizes: { stock: sizes } } });
    const dots = circles(figure).filter(({ r }) => r < 3);
    expect(dots.length).toBe(8);
    expect(dots.filter(({ fill }) => fill === 'ink2').length).toBe(
      content.map.stock!.filter(({ fits }) => fits).length,
    );
    expect(dots.some(({ fill }) => fill === 'paper')).toBe(true);
  });

  it('has no region where nothing fits, and the limits in conflict strong', () => {
    const { figure, content } = drawn({
      ...shaft,
      job: { ...shaft.job, tube: { ...shaft.job.tube, outerDiameterMax: 0.03 } },
    });
    expect(content.points.optimum).toBeNull();
    expect(content.map.region).toEqual([]);
    expect(figure.shapes.some(({ fill }) => fill === 'faintFill')).toBe(false);
    expect(figure.shapes.filter(({ width }) => width === 1.6).length).toBe(content.points.conflict.length);
    expect(texts(figure).some((text) => text.startsWith('nothing fits'))).toBe(true);
    for (const limit of content.points.conflict) expect(figure.description).toContain(limitLabel(limit));
  });

  it('says in words what it shows', () => {
    expect(drawn(shaft).figure.description).toContain('where twist and outer diameter are full');
  });
});
