import { isStrong, type Curve } from '../../../src/figure/front/curve.js';
import type { FrontFigure } from '../../../src/figure/front/model.js';
import { markerPaths } from '../../../src/figure/markerPaths.js';
import type { LineStyle } from '../../../src/figure/marker.js';
import { faint, type CanvasColours } from '../colours.js';

/** Width of a line where nothing beats it, of the one in focus, and of the rest; and how much of the rest is left. */
export const WIDTHS = { strong: 2.4, focus: 1.4, rest: 1 } as const;
export const REST = 0.5;

export const DASHES: Readonly<Record<LineStyle, readonly number[]>> = {
  solid: [],
  dashed: [5, 3],
  dotted: [1.5, 2.5],
};

/** Keeps what is painted inside the plot. */
export function inPlot(context: CanvasRenderingContext2D, { plot }: FrontFigure, paint: () => void): void {
  context.save();
  context.beginPath();
  context.rect(plot.left, plot.top, plot.right - plot.left + 8, plot.bottom - plot.top + 1);
  context.clip();
  paint();
  context.restore();
}

/** Marks of a line: its end and some on the way; weak where another material beats it, unless it is in focus. */
export function paintMarks(
  context: CanvasRenderingContext2D,
  { points, marked, mark }: Curve,
  colours: CanvasColours,
  focus: boolean,
): void {
  const { outline, filled, strokeWidth } = markerPaths(mark);
  const [line, inside] = [new Path2D(outline), new Path2D(filled)];
  const colour = colours.family(mark.family);
  for (const [place, index] of marked.entries()) {
    const drawn = points[index];
    if (drawn === undefined) continue;
    const scale = place === 0 ? 0.92 : 0.78;
    const own = focus || place === 0 || !drawn.point.dominated ? colour : faint(colour, REST);
    context.save();
    context.translate(drawn.x, drawn.y);
    context.scale(scale, scale);
    context.fillStyle = colours.paper;
    context.fill(line);
    context.fillStyle = context.strokeStyle = own;
    context.lineWidth = strokeWidth;
    context.stroke(line);
    if (filled !== '') context.fill(inside);
    context.restore();
  }
}

/** A line by hand, as the material in focus has it. */
export function paintFocusLine(context: CanvasRenderingContext2D, curve: Curve, colours: CanvasColours): void {
  context.strokeStyle = colours.family(curve.mark.family);
  context.lineJoin = 'round';
  for (const [index, { x, y }] of curve.points.entries()) {
    const next = curve.points[index + 1];
    if (next === undefined) break;
    const strong = isStrong(curve, index);
    context.lineWidth = strong ? WIDTHS.strong : WIDTHS.focus;
    context.setLineDash(strong ? [] : [...DASHES[curve.mark.line]]);
    context.lineDashOffset = 0;
    context.beginPath();
    context.moveTo(x, y);
    context.lineTo(next.x, next.y);
    context.stroke();
  }
  context.setLineDash([]);
}

/** Families folded into bands: the fill, and the lightest as a line. */
export function paintBands(context: CanvasRenderingContext2D, { bands }: FrontFigure, colours: CanvasColours): void {
  for (const { family, lightest, heaviest } of bands) {
    const colour = colours.family(family);
    context.fillStyle = faint(colour, 0.14);
    context.beginPath();
    for (const { x, y } of lightest) context.lineTo(x, y);
    for (const { x, y } of heaviest.toReversed()) context.lineTo(x, y);
    context.closePath();
    context.fill();
    context.strokeStyle = colour;
    context.lineWidth = WIDTHS.focus;
    context.setLineDash([]);
    context.beginPath();
    for (const { x, y } of lightest) context.lineTo(x, y);
    context.stroke();
  }
}
