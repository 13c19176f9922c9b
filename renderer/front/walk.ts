import type { Curve, DrawnPoint } from '../../src/figure/front/curve.js';
import type { FrontFigure } from '../../src/figure/front/model.js';

/** A point of a front: its material and its place on the line, the tightest first. */
export interface Rung {
  readonly material: string;
  readonly index: number;
}

/** How far from a point the pointer may be to mean it, px. */
const REACH = 36;

/** A point above the plot's top, beside a limit of its own, cannot be seen and is not walked to. */
function isSeen({ y }: DrawnPoint, { plot }: FrontFigure): boolean {
  return y >= plot.top - 1;
}

/** The rung that the pointer means: the nearest within reach; null where there is none. */
export function rungAt(figure: FrontFigure, x: number, y: number): Rung | null {
  let nearest: Rung | null = null;
  let least = REACH;
  for (const { material, points } of figure.curves)
    for (const [index, point] of points.entries()) {
      const distance = Math.hypot(point.x - x, point.y - y);
      if (distance >= least || !isSeen(point, figure)) continue;
      nearest = { material, index };
      least = distance;
    }
  return nearest;
}

/** The curve and the drawn point of a rung; null where the front no longer has it. */
export function drawnAt(
  { curves }: FrontFigure,
  rung: Rung | null,
): { readonly curve: Curve; readonly point: DrawnPoint } | null {
  const curve = curves.find(({ material }) => material === rung?.material);
  const point = curve?.points[rung?.index ?? 0];
  return curve === undefined || point === undefined ? null : { curve, point };
}

function nearestTo(curve: Curve, x: number, figure: FrontFigure): DrawnPoint | null {
  const seen = curve.points.filter((point) => isSeen(point, figure));
  return seen.reduce<DrawnPoint | null>(
    (best, point) => (best === null || Math.abs(point.x - x) < Math.abs(best.x - x) ? point : best),
    null,
  );
}

/** Where the keyboard begins: on a material's line at the job's limit, or at its loose end. */
export function firstRung(figure: FrontFigure, material: string | null): Rung | null {
  const curve = figure.curves.find((one) => one.material === material) ?? figure.curves[0];
  if (curve === undefined) return null;
  const point = nearestTo(curve, figure.ring?.x ?? figure.limit?.x ?? figure.plot.right, figure);
  return point === null ? null : { material: curve.material, index: curve.points.indexOf(point) };
}

function alongLine(figure: FrontFigure, { material, index }: Rung, step: 1 | -1): Rung | null {
  const point = figure.curves.find((curve) => curve.material === material)?.points[index + step];
  return point !== undefined && isSeen(point, figure) ? { material, index: index + step } : null;
}

/** From line to line at about the same place, by mass. */
function acrossLines(figure: FrontFigure, rung: Rung, step: 1 | -1): Rung | null {
  const here = drawnAt(figure, rung);
  if (here === null) return null;
  const order = figure.curves
    .flatMap((curve) => {
      const point = curve === here.curve ? here.point : nearestTo(curve, here.point.x, figure);
      return point === null ? [] : [{ curve, point }];
    })
    .sort((a, b) => a.point.mass - b.point.mass);
  const next = order[order.findIndex(({ curve }) => curve === here.curve) + step];
  return next === undefined ? null : { material: next.curve.material, index: next.curve.points.indexOf(next.point) };
}

/** Where a key leads from a rung; the rung itself where the way ends; null where it is no key of the front. */
export function walked(figure: FrontFigure, rung: Rung, key: string): Rung | null {
  switch (key) {
    case 'ArrowLeft':
      return alongLine(figure, rung, -1) ?? rung;
    case 'ArrowRight':
      return alongLine(figure, rung, 1) ?? rung;
    case 'ArrowUp':
      return acrossLines(figure, rung, 1) ?? rung;
    case 'ArrowDown':
      return acrossLines(figure, rung, -1) ?? rung;
    default:
      return null;
  }
}
