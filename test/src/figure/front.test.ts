import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { frontFigure } from '../../../src/figure/front.js';
import { holds, overlaps, type Box } from '../../../src/figure/front/box.js';
import { isStrong } from '../../../src/figure/front/curve.js';
import type { FrontFigure } from '../../../src/figure/front/model.js';
import type { FrontAxis } from '../../../src/job/job.js';
import type { FrontPoint } from '../../../src/report/report.js';
import { withDominance } from '../../../src/sizing/dominance.js';
import { inputOf, jobOf, measure, metals, reportOf } from './front/fronts.js';

const drawn = (count: number, against: FrontAxis, more = {}) =>
  frontFigure(inputOf(reportOf(count, against), more), measure);

function boxesOf({ ends, pick, limit }: FrontFigure): readonly Box[] {
  return [...ends.map(({ box }) => box), ...(pick === null ? [] : [pick.box]), ...(limit?.box ? [limit.box] : [])];
}

function expectSound(figure: FrontFigure): void {
  const { plot, width, curves, ring, limit } = figure;
  const boxes = boxesOf(figure);
  for (const [index, box] of boxes.entries()) {
    expect(holds({ left: plot.left, right: width, top: plot.top, bottom: plot.bottom }, box)).toBe(true);
    for (const other of boxes.slice(index + 1)) expect(overlaps(box, other)).toBe(false);
  }
  const ends = curves.flatMap(({ points }) => points.at(-1) ?? []);
  for (const { x, y } of [...ends, ...(ring === null ? [] : [ring])]) {
    expect(x).toBeGreaterThanOrEqual(plot.left - 1e-6);
    expect(x).toBeLessThanOrEqual(plot.right + 1e-6);
    expect(y).toBeGreaterThanOrEqual(plot.top - 1e-6);
    expect(y).toBeLessThanOrEqual(plot.bottom + 1e-6);
  }
  if (limit !== null) expect(limit.x).toBeLessThanOrEqual(plot.right + 1e-6);
}

describe('the front of a few materials', () => {
  it.each([
    ['twist', 'log'],
    ['twist', 'linear'],
    ['outerDiameter', 'log'],
    ['cost', 'log'],
  ] as const)('against %s on a %s axis holds pick, limit and line ends, and no labels overlap', (against, kind) => {
    const figure = drawn(5, against, { kind });
    expect(figure.curves).toHaveLength(5);
    expect(figure.ends).toHaveLength(5);
    expect(figure.pick).not.toBeNull();
    expect(figure.x.kind).toBe(against === 'twist' ? kind : 'linear');
    expectSound(figure);
  });

  it('draws every point where the axes have it, and holds all that lie under its top', () => {
    const { curves, plot, x, y } = drawn(5, 'twist');
    const points = curves.flatMap((curve) => curve.points);
    expect(points).toHaveLength(reportOf(5, 'twist').front.points.length);
    for (const point of points) {
      expect(point.value).toBeCloseTo((point.point.twist * 180) / Math.PI, 10);
      const part = Math.log(point.value / x.from) / Math.log(x.to / x.from);
      expect(point.x).toBeCloseTo(plot.left + part * (plot.right - plot.left), 6);
      expect(point.y).toBeCloseTo(
        plot.bottom - ((point.mass - y.from) / (y.to - y.from)) * (plot.bottom - plot.top),
        6,
      );
      if (point.y >= plot.top) expect(point.x).toBeGreaterThanOrEqual(plot.left - 1e-6);
    }
  });

  it('is strong exactly between points that no other beats', () => {
    for (const curve of drawn(5, 'twist').curves)
      for (const [index, { point }] of curve.points.entries()) {
        const next = curve.points[index + 1]?.point;
        expect(isStrong(curve, index)).toBe(next !== undefined && !point.dominated && !next.dominated);
      }
  });

  it('rings the pick at its own place, and says what it is', () => {
    const figure = drawn(5, 'twist');
    const { pick } = inputOf(reportOf(5, 'twist'));
    expect(figure.pick?.texts[0]).toBe(`pick ${(pick?.design.mass ?? 0).toFixed(3)} kg`);
    expect(figure.pick?.texts[1]).toMatch(/^Ø \d+\.\d+ × \d\.\d+$/);
    expect(figure.ring?.x).toBeCloseTo(figure.limit?.x ?? 0, 3);
    expect(figure.ends.filter(({ strong }) => strong).map(({ key }) => key)).toEqual([pick?.material]);
  });

  it('names the limit in words and on the axis, where no other figure is near', () => {
    const { limit, xTicks } = drawn(5, 'twist');
    expect(limit).toMatchObject({ text: '3', words: 'twist at most 3 deg' });
    for (const { at } of xTicks) expect(Math.abs(at - (limit?.x ?? 0))).toBeGreaterThan(5);
  });

  it('folds families into bands, which hold their members', () => {
    const figure = drawn(12, 'twist', { folded: true });
    expect(figure.bands.map(({ family, count }) => `${family} ${String(count)}`)).toEqual([
      'aluminium 3',
      'steel 3',
      'titanium 2',
      'nickel 2',
      'carbon/epoxy 2',
    ]);
    expect(figure.curves.every(({ folded }) => folded)).toBe(true);
    expect(figure.ends.every(({ key }) => key.startsWith('family '))).toBe(true);
    expectSound(figure);
  });

  it('leaves a family of one unfolded', () => {
    const figure = drawn(6, 'twist', { folded: true });
    expect(figure.bands.map(({ family }) => family)).toEqual(['aluminium']);
    expect(figure.curves.filter(({ folded }) => !folded)).toHaveLength(4);
  });

  it('says its axes in the units that are shown', () => {
    expect(drawn(5, 'outerDiameter', { system: 'US' })).toMatchObject({ xName: 'outer diameter, in', yName: 'lb' });
  });

  it('has axes without figures where there is no point yet', () => {
    const figure = frontFigure({ ...inputOf(reportOf(5, 'twist')), points: [], pick: null }, measure);
    expect(figure).toMatchObject({ curves: [], ends: [], xTicks: [], yTicks: [], ring: null });
  });
});

describe('the front of forty materials', () => {
  const made = fc.record({
    end: fc.double({ min: 0.2, max: 30, noNaN: true }),
    mass: fc.double({ min: 0.5, max: 9, noNaN: true }),
    steep: fc.double({ min: 0.2, max: 3, noNaN: true }),
  });
  const job = jobOf({ materials: metals(40) });

  function pointsOf(shapes: readonly { end: number; mass: number; steep: number }[]): readonly FrontPoint[] {
    const own = shapes.flatMap(({ end, mass, steep }, i) =>
      Array.from({ length: 12 }, (_, rung) => {
        const twist = ((end * Math.PI) / 180) * 0.75 ** rung;
        const heavier = mass * (1 + steep * rung * rung * 0.05);
        const material = `metal-${String(i)}`;
        const size = { outerDiameter: 0.08, wall: 0.002, layup: null, cost: heavier * 9, governs: 'twist' } as const;
        return { material, mass: heavier, twist, ...size, meetsJob: false };
      }),
    );
    return withDominance(own, 'twist');
  }

  it('overlaps no label and holds every line’s end, whatever the fronts are', () => {
    fc.assert(
      fc.property(
        fc.array(made, { minLength: 1, maxLength: 40 }),
        fc.integer({ min: 420, max: 1400 }),
        fc.integer({ min: 170, max: 620 }),
        fc.boolean(),
        (shapes, width, height, folded) => {
          const input = { ...inputOf(reportOf(5, 'twist')), job, points: pointsOf(shapes), width, height, folded };
          expectSound(frontFigure(input, measure));
        },
      ),
      { numRuns: 40 },
    );
  });

  it('still names most of them on a large sheet', () => {
    const shapes = Array.from({ length: 40 }, (_, i) => ({
      end: 2 + i * 0.4,
      mass: 1 + ((i * 7) % 40) * 0.15,
      steep: 1,
    }));
    const input = { ...inputOf(reportOf(5, 'twist')), job, points: pointsOf(shapes), width: 1000, height: 520 };
    expect(frontFigure(input, measure).ends.length).toBeGreaterThan(30);
  });
});
