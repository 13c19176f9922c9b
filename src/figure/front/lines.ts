import { shownUnit } from '../../quantity/register.js';
import type { FrontPoint } from '../../report/report.js';
import { marksOf } from '../marker.js';
import { type Curve, markedPoints } from './curve.js';
import { END_SIZE } from './labels.js';
import type { OwnLimit } from './limit.js';
import type { FrontInput } from './model.js';
import type { TextWidth } from './textWidth.js';
import { axesFor, type Sheet, type Shown, shownPoint, shownValue, xOf, yOf } from './sheet.js';

/** Size of the names of axes, px. */
export const NAME_SIZE = 11;

const MARGIN = { left: 40, right: 20, top: 8, bottom: 26 };

/** Height of a step on the axis of mass, about, px. */
const STEP_HEIGHT = 42;
/** Gap from a line's end to its name, and the least part of the width that is left to the lines. */
const NAME_GAP = 12;
const LEAST_PLOT = 0.6;

/** A point with its values in shown units. */
type ShownPoint = Shown & { readonly point: FrontPoint };

/** One material's points, from tight to loose. */
interface Line {
  readonly material: string;
  readonly points: readonly ShownPoint[];
}

/** Every material's line in the order of the job; points without a price are left out where cost is traded. */
export function linesOf({ job, points, against, system }: FrontInput): readonly Line[] {
  const lines = new Map<string, ShownPoint[]>(job.materials.map(({ id }) => [id, []]));
  for (const point of points) {
    const shown = shownPoint(point, against, system);
    if (shown !== null) lines.get(point.material)?.push({ point, ...shown });
  }
  return Array.from(lines, ([material, own]) => ({ material, points: own.sort((a, b) => a.value - b.value) }));
}

/** What the lower axis measures, and its unit. */
export function axisName({ against, system, job }: FrontInput): string {
  const names = {
    twist: `twist, ${shownUnit('angle', system)}`,
    outerDiameter: `outer diameter, ${shownUnit('length', system)}`,
    cost: job.currency === null ? 'cost' : `cost, ${job.currency}`,
  };
  return names[against];
}

/** The axes, and a plot as wide as the names at the lines' ends let it be. */
export function sheetOf(input: FrontInput, lines: readonly Line[], own: OwnLimit | null, width: TextWidth): Sheet {
  const { against, system, kind } = input;
  const pick = input.pick === null ? null : shownPoint(input.pick.design, against, system);
  const limit = own === null ? null : shownValue(own.value, against, system);
  const held = { lines: lines.map(({ points }) => points), pick, limit };
  const axes = axesFor(
    held,
    against === 'twist' ? kind : 'linear',
    (input.height - MARGIN.top - MARGIN.bottom) / STEP_HEIGHT,
  );
  const top = MARGIN.top;
  const right = input.width - MARGIN.right - width(axisName(input), NAME_SIZE, 'sans', 400);
  const plot = { left: MARGIN.left, right, top, bottom: input.height - MARGIN.bottom };
  const sheet = { ...axes, plot };
  const names = lines.map(({ material, points }) => ({
    part: partAcross(sheet, points.at(-1)),
    breadth: width(input.names.get(material) ?? material, END_SIZE, 'sans', 600) + NAME_GAP,
  }));
  return { ...axes, plot: { ...plot, right: plot.left + plotBreadth(input.width, right - plot.left, names) } };
}

function partAcross(sheet: Sheet, end: Shown | undefined): number {
  return end === undefined ? 0 : (xOf(sheet, end.value) - sheet.plot.left) / (sheet.plot.right - sheet.plot.left);
}

/** The widest plot at which every name finds room to the right of its line's end. */
function plotBreadth(
  width: number,
  all: number,
  names: readonly { readonly part: number; readonly breadth: number }[],
): number {
  const room = names.map(({ part, breadth }) => (part === 0 ? all : (width - MARGIN.left - breadth) / part));
  return Math.max(Math.min(all, ...room), LEAST_PLOT * all);
}

/** Every material's line on the drawing. */
export function curvesOf(input: FrontInput, lines: readonly Line[], sheet: Sheet): readonly Curve[] {
  const marks = marksOf(input.job.materials);
  return lines.flatMap(({ material, points }) => {
    const mark = marks.get(material);
    if (mark === undefined || points.length === 0) return [];
    const drawn = points.map((point) => ({ ...point, x: xOf(sheet, point.value), y: yOf(sheet, point.mass) }));
    const name = input.names.get(material) ?? material;
    return [{ material, name, mark, points: drawn, marked: markedPoints(drawn, lines.length), folded: false }];
  });
}
