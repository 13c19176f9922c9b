import { describe, expect, it } from 'vitest';
import { DETAIL_WALL } from '../../../src/figure/detail.js';
import type { CircleShape, Figure } from '../../../src/figure/figure.js';
import { labelBox } from '../../../src/figure/label.js';
import type { Point } from '../../../src/figure/point.js';
import { sectionFigure } from '../../../src/figure/section.js';
import { type DrawnTube, SHEETS, type SheetSize } from '../../../src/figure/sectionSheet.js';
import type { UnitSystem } from '../../../src/quantity/register.js';

const SIZES: readonly SheetSize[] = ['small', 'large'];
const SYSTEMS: readonly UnitSystem[] = ['SI', 'US'];

/** Tubes from stout to thin, small to large, with and without a bore that must stay free. */
const TUBES: readonly DrawnTube[] = [6, 9, 14, 30, 55.9, 120, 600].flatMap((slimness) =>
  [0.0127, 0.0901234, 0.6].flatMap((outerDiameter) => {
    const wall = outerDiameter / slimness;
    const bore = outerDiameter - 2 * wall;
    return [null, 0.3 * bore, bore].map((boreMin) => ({ outerDiameter, wall, boreMin }));
  }),
);

function texts(figure: Figure): string[] {
  return figure.labels.map(({ text }) => text);
}

function circles({ shapes }: Figure): CircleShape[] {
  return shapes.filter((shape) => shape.kind === 'circle');
}

/** Whether two convex boxes overlap, by the theorem of separating axes. */
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

const mock: DrawnTube = { outerDiameter: 0.09, wall: 0.00161, boreMin: 0.02 };

describe('the section', () => {
  it('is to scale: outer diameter, wall and the bore that must stay free', () => {
    for (const size of SIZES) {
      const { radius } = SHEETS[size];
      const [tube, free] = circles(sectionFigure(mock, 'SI', size));
      expect(tube).toMatchObject({ line: 'copper' });
      expect(tube!.r + tube!.width! / 2).toBeCloseTo(radius, 10);
      expect(tube!.width! / radius).toBeCloseTo(0.00161 / 0.045, 10);
      expect(free).toMatchObject({ stroke: 'dashed' });
      expect(free!.r / radius).toBeCloseTo(0.02 / 0.09, 10);
    }
  });

  it('draws no dashed circle where no bore must stay free', () => {
    const figure = sectionFigure({ ...mock, boreMin: null }, 'SI');
    expect(circles(figure).some(({ stroke }) => stroke === 'dashed')).toBe(false);
    expect(texts(figure).some((text) => text.includes('stays free'))).toBe(false);
  });

  it('says its sizes in millimetres or in inches', () => {
    expect(texts(sectionFigure(mock, 'SI', 'large'))).toEqual([
      'Ø 90.0',
      'Ø 86.78',
      '1.61',
      'wall, drawn 8 times as large',
      'dashed: Ø 20.0 stays free',
      'all in mm',
    ]);
    expect(texts(sectionFigure({ outerDiameter: 0.0635, wall: 0.0254 * 0.065, boreMin: null }, 'US', 'large'))).toEqual(
      ['Ø 2.500', 'Ø 2.370', '0.065', 'wall, drawn 5 times as large', 'all in inches'],
    );
  });

  it('says the bore in a caption where its figure has no room in the circle', () => {
    const figure = sectionFigure({ outerDiameter: 0.06, wall: 0.01, boreMin: null }, 'SI');
    expect(texts(figure)).toContain('bore Ø 40.0');
    expect(figure.labels.every(({ turn }) => turn === 0)).toBe(true);
  });

  it('is described for those who cannot see it', () => {
    expect(sectionFigure(mock, 'SI').description).toBe(
      'Section of the tube to scale: Ø 90.0 outside, Ø 86.78 bore, wall 1.61, in mm; wall, drawn 12 times as large',
    );
  });
});

describe.each(SIZES)('the %s sheet', (size) => {
  it.each(SYSTEMS)('keeps every label clear of the others and on the sheet, in %s units', (system) => {
    const { width } = SHEETS[size];
    for (const tube of TUBES) {
      const boxes = sectionFigure(tube, system, size).labels.map(labelBox);
      boxes.forEach((box, i) => {
        for (const { x } of box) expect(x).toSatisfy((at: number) => at >= 0 && at <= width);
        for (const other of boxes.slice(i + 1)) expect(overlap(box, other), JSON.stringify(tube)).toBe(false);
      });
    }
  });

  it('shows the wall 18 to 30 px thick under the glass, by the factor that it states', () => {
    for (const tube of TUBES) {
      const { labels } = sectionFigure(tube, 'SI', size);
      const caption = labels.find(({ text }) => text.startsWith('wall, '))?.text ?? '';
      const factor = caption === 'wall, same scale' ? 1 : Number(/drawn ([\d.]+) times/.exec(caption)?.[1]);
      const seen = ((factor * tube.wall) / tube.outerDiameter) * 2 * SHEETS[size].radius;
      expect(seen).toSatisfy((px: number) => px >= DETAIL_WALL.least && px <= DETAIL_WALL.most);
    }
  });

  it('keeps the captions and the wall’s figure off the outline', () => {
    const { middle, radius } = SHEETS[size];
    for (const tube of TUBES) {
      const outside = sectionFigure(tube, 'SI', size).labels.filter(({ turn }) => turn === 0);
      for (const { x, y } of outside.flatMap(labelBox))
        expect(Math.hypot(x - middle.x, y - middle.y)).toBeGreaterThan(radius + 2);
    }
  });

  it('starts its extension lines clear of the outline', () => {
    const { middle, radius } = SHEETS[size];
    const paths = sectionFigure(mock, 'SI', size).shapes.flatMap((shape) => (shape.kind === 'path' ? [shape.d] : []));
    const upright = paths
      .map((d) => /^M(-?[\d.]+) (-?[\d.]+)L(-?[\d.]+) (-?[\d.]+)$/.exec(d)?.slice(1).map(Number) ?? [])
      .filter(([x0, y0, x1, y1]) => x0 === x1 && y1! > y0!);
    expect(upright).toHaveLength(2);
    for (const [x = 0, y = 0] of upright)
      expect(Math.abs(x - middle.x) - Math.sqrt(radius ** 2 - (y - middle.y) ** 2)).toBeGreaterThan(2);
  });
});
