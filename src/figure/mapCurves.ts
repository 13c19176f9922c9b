import type { LimitId } from '../report/report.js';
import type { DesignMap, MapCurve } from '../sizing/map.js';
import type { MapPoints } from '../sizing/mapPoints.js';
import type { MapPoint } from '../sizing/mapScale.js';
import { forbiddenStrokes, Walked } from './along.js';
import { clipped } from './clip.js';
import { nameCurve } from './curveName.js';
import type { Label, Shape } from './figure.js';
import { curveName } from './mapNames.js';
import type { Area, MapSheet } from './mapSheet.js';
import type { Placing } from './placing.js';
import { type Point, polyline } from './point.js';
import type { Drafting, Part } from './mapDrafting.js';

/** Curves shorter than this go without a name, px. */
const NAMELESS = 20;
/** Distance of the places that other labels avoid, px. */
const MARKS = 5;

/** Weight of lines, px: limits that close the region, and all others. */
const WIDTH = { closing: 1.6, other: 1 } as const;

/** What a limit with two sides holds. */
const SIDED: ReadonlyMap<LimitId, (size: MapPoint) => number> = new Map<LimitId, (size: MapPoint) => number>([
  ['outer-diameter', ({ outerDiameter }) => outerDiameter],
  ['diameter-to-wall', ({ outerDiameter, wall }) => outerDiameter / wall],
]);

/** The limits' curves as drawn, with what is needed to name them. */
export interface DrawnCurves {
  readonly shapes: readonly Shape[];
  /** places on the curves */
  readonly marks: readonly Point[];
  readonly names: (placing: Placing) => Part;
}

interface OnSheet {
  readonly curve: MapCurve;
  readonly pieces: readonly Walked[];
  readonly closing: boolean;
}

/** A limit's boundary on the sheet, in the pieces that are seen of it. */
export function piecesOf({ branches }: MapCurve, sheet: MapSheet): readonly Walked[] {
  return branches.flatMap(({ points, closed }) => {
    const line = points.map((size) => sheet.at(size));
    const ends = closed ? [...line, ...line.slice(0, 1)] : line;
    return clipped(ends, sheet.plot).map((piece) => new Walked(piece));
  });
}

/** Every limit's boundary, with strokes on the side that is not allowed; those that close the region, or stand against each other, strong. */
export function drawnCurves(map: DesignMap, points: MapPoints, { sheet, system }: Drafting): DrawnCurves {
  const curves = map.curves
    .map((curve): OnSheet => ({
      curve,
      pieces: piecesOf(curve, sheet),
      closing: curve.closing || inConflict(curve, points),
    }))
    .sort((a, b) => Number(a.closing) - Number(b.closing));
  return {
    shapes: curves.flatMap(curveShapes),
    marks: curves.flatMap(({ pieces }) => pieces.flatMap((piece) => piece.every(MARKS))),
    names: (placing) => namesOf(curves, (curve) => curveName(curve, system), placing, sheet.plot),
  };
}

/** Whether a curve is one of those that stand against each other; of a limit with two sides, the side that is in the way. */
function inConflict({ limit, demand, atLeast }: MapCurve, { conflict, instead }: MapPoints): boolean {
  if (!conflict.includes(limit)) return false;
  const measure = SIDED.get(limit);
  if (measure === undefined || demand === null) return true;
  return instead.some((size) => (atLeast ? measure(size) < demand : measure(size) > demand));
}

function curveShapes({ pieces, closing }: OnSheet): readonly Shape[] {
  if (pieces.length === 0) return [];
  const tone = closing ? 'ink' : 'ink2';
  const strokes = pieces.flatMap((piece) => forbiddenStrokes(piece).map((stroke) => polyline(stroke)));
  return [
    { kind: 'path', d: strokes.join(''), line: tone, width: closing ? 0.8 : 0.6 },
    {
      kind: 'path',
      d: pieces.map(({ points }) => polyline(points)).join(''),
      line: tone,
      width: closing ? WIDTH.closing : WIDTH.other,
    },
  ];
}

/** Those first that close the region, then the shortest, which have least choice. */
function namesOf(curves: readonly OnSheet[], textOf: (curve: MapCurve) => string, placing: Placing, area: Area): Part {
  const length = ({ pieces }: OnSheet): number => Math.max(0, ...pieces.map((piece) => piece.length));
  const order = curves
    .filter((curve) => length(curve) > NAMELESS)
    .sort((a, b) => Number(b.closing) - Number(a.closing) || length(a) - length(b));
  const shapes: Shape[] = [];
  const labels: Label[] = [];
  for (const { curve, pieces, closing } of order) {
    const name = nameCurve(textOf(curve), pieces, { tone: 'ink', weight: closing ? 500 : 400 }, placing, area);
    if (name === null) continue;
    placing.take(name.labels);
    labels.push(...name.labels);
    if (name.leader !== null) shapes.push({ kind: 'path', d: polyline(name.leader), line: 'ink2', width: 0.8 });
  }
  return { shapes, labels };
}
