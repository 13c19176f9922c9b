import { shownUnit, type UnitSystem } from '../quantity/register.js';
import type { Design } from '../report/report.js';
import { fixed, sizeTexts } from './decimals.js';
import { bandsOf } from './front/bands.js';
import { type Box, holds, overlaps } from './front/box.js';
import { crowdOf } from './front/crowd.js';
import { placeEnds, placePick, type Room, RING } from './front/labels.js';
import { BEYOND_LIMIT, LIMIT_SIZE, LIMIT_SIZE_BELOW, type OwnLimit, ownLimit } from './front/limit.js';
import { axisName, curvesOf, linesOf, NAME_SIZE, sheetOf } from './front/lines.js';
import type { DrawnLimit, FrontFigure, FrontInput } from './front/model.js';
import type { TextWidth } from './front/textWidth.js';
import { type Sheet, shownPoint, shownValue, xOf, yOf } from './front/sheet.js';
import type { Point } from './point.js';
import { ticksOf, without } from './front/ticks.js';

/** Size of the figures of axes, px. */
export const TICK_SIZE = 10.5;

/** Height of a limit's two lines of words, and how far they move down, px. */
const LIMIT_HEIGHT = 30;
const LIMIT_LOWER = 20;

/** The drawing of a front: axes, lines, limit, note on the pick, and names that do not overlap. */
export function frontFigure(input: FrontInput, width: TextWidth): FrontFigure {
  const { job, against, system } = input;
  const own = ownLimit(job, against, system);
  const lines = linesOf(input);
  const sheet = sheetOf(input, lines, own, width);
  const curves = curvesOf(input, lines, sheet);
  const bands = input.folded ? bandsOf(curves) : [];
  const foldedFamilies = new Set(bands.map(({ family }) => family));
  const shownCurves = curves.map((curve) => ({ ...curve, folded: foldedFamilies.has(curve.mark.family) }));
  const limit = own === null ? null : limitOf(own, input, sheet, width);
  const ring = ringOf(input, sheet);
  const strokes = [...curves.map(({ points }) => points), ...(limit === null ? [] : [upright(limit.x, sheet)])];
  const room = roomOf(input, sheet, strokes, limit, ring);
  const pick =
    ring === null || input.pick === null ? null : placePick(ring, pickTexts(input.pick.design, system), room, width);
  const taken = pick === null ? room.taken : [...room.taken, pick.box];
  const ends = placeEnds(shownCurves, bands, input.pick?.material ?? null, { ...room, taken }, width);
  return {
    ...sheet,
    ...scaleTicks(input, sheet, limit, curves.length === 0, width),
    ...sizes(input),
    curves: shownCurves,
    bands,
    limit,
    pick,
    ring,
    ends,
  };
}

function sizes(input: FrontInput) {
  const { width, height, against, system } = input;
  return { width, height, against, xName: axisName(input), yName: shownUnit('mass', system) };
}

function upright(x: number, { plot }: Sheet) {
  return [
    { x, y: plot.top },
    { x, y: plot.bottom },
  ];
}

function limitOf(own: OwnLimit, input: FrontInput, sheet: Sheet, width: TextWidth): DrawnLimit {
  const value = shownValue(own.value, input.against, input.system);
  const x = xOf(sheet, value);
  const breadth = Math.max(
    width(own.words, LIMIT_SIZE, 'sans', 500),
    width(BEYOND_LIMIT, LIMIT_SIZE_BELOW, 'sans', 400),
  );
  const within = { ...sheet.plot, right: input.width };
  const box =
    limitPlaces(x, sheet.plot.top, breadth).find(
      (place) => holds(within, place) && !input.taken.some((other) => overlaps(other, place)),
    ) ?? null;
  return { x, value, text: String(Number(value.toPrecision(4))), words: own.words, box };
}

/** Where the words of a limit may stand: beside it at the top, to its right first, lower where something is there. */
function limitPlaces(x: number, top: number, breadth: number): readonly Box[] {
  return [top, top + LIMIT_LOWER].flatMap((y) => [
    { left: x + 12, right: x + 12 + breadth, top: y, bottom: y + LIMIT_HEIGHT },
    { left: x - 10 - breadth, right: x - 10, top: y, bottom: y + LIMIT_HEIGHT },
  ]);
}

function ringOf({ pick, against, system }: FrontInput, sheet: Sheet): FrontFigure['ring'] {
  const shown = pick === null ? null : shownPoint(pick.design, against, system);
  return shown === null ? null : { x: xOf(sheet, shown.value), y: yOf(sheet, shown.mass) };
}

function roomOf(
  { width, taken }: FrontInput,
  { plot }: Sheet,
  strokes: readonly (readonly Point[])[],
  limit: DrawnLimit | null,
  ring: FrontFigure['ring'],
): Room {
  const reach = RING + 2;
  const about =
    ring === null ? [] : [{ left: ring.x - reach, right: ring.x + reach, top: ring.y - reach, bottom: ring.y + reach }];
  const within = { left: plot.left + 2, right: width - 2, top: plot.top, bottom: plot.bottom - 2 };
  return { within, taken: [...taken, ...about, ...(limit?.box ? [limit.box] : [])], crowd: crowdOf(strokes, within) };
}

function pickTexts(design: Design, system: UnitSystem): readonly [string, string] {
  const shown = shownPoint(design, 'twist', system);
  const unit = shownUnit('mass', system);
  const [outer = ''] = sizeTexts([design.outerDiameter], 'outerDiameter', system);
  const [wall = ''] = sizeTexts([design.wall], 'wall', system);
  return [`pick ${fixed(shown?.mass ?? 0, 3)} ${unit}`, `Ø ${outer} × ${wall}`];
}

/** The figures of both axes: none at all where nothing is drawn, none where the limit's own stands, nor where the name of the axis does. */
function scaleTicks(input: FrontInput, sheet: Sheet, limit: DrawnLimit | null, isEmpty: boolean, width: TextWidth) {
  const nameFrom = input.width - width(axisName(input), NAME_SIZE, 'sans', 400) - 6;
  if (isEmpty) return { xTicks: [], yTicks: [] };
  const breadth = ({ text }: { readonly text: string }): number => width(text, TICK_SIZE, 'mono', 400);
  const all = ticksOf(sheet.x, sheet.plot.left, sheet.plot.right, breadth);
  const free = limit === null ? all : without(all, limit.x, breadth(limit), breadth);
  const xTicks = free.filter((tick) => tick.at + breadth(tick) / 2 < nameFrom);
  return { xTicks, yTicks: ticksOf(sheet.y, sheet.plot.bottom, sheet.plot.top, () => TICK_SIZE) };
}
