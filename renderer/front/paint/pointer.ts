import { END_SIZE } from '../../../src/figure/front/labels.js';
import { TICK_SIZE } from '../../../src/figure/front.js';
import type { Curve, DrawnPoint } from '../../../src/figure/front/curve.js';
import type { FrontFigure } from '../../../src/figure/front/model.js';
import type { CanvasColours } from '../colours.js';
import { fontOf, write } from '../text.js';
import { inPlot, paintFocusLine, paintMarks } from './lines.js';
import { paintEnd, paintPick } from './notes.js';

/** What lies over the chart: the line in focus, and what is pointed at. */
export interface Over {
  readonly focus: Curve | null;
  readonly pointed: DrawnPoint | null;
  /** "84.8 × 1.75, twist governs" */
  readonly words: string;
  /** values of the point, for the axes */
  readonly figures: readonly [x: string, y: string];
}

/** Paints what changes under the pointer on a sheet of its own, so that the lines need not be drawn again. */
export function paintOver(
  context: CanvasRenderingContext2D,
  figure: FrontFigure,
  over: Over,
  colours: CanvasColours,
): void {
  context.clearRect(0, 0, figure.width, figure.height);
  if (over.focus !== null) paintFocus(context, figure, over.focus, colours);
  if (over.pointed !== null) paintPointed(context, figure, over, over.pointed, colours);
}

function paintFocus(
  context: CanvasRenderingContext2D,
  figure: FrontFigure,
  curve: Curve,
  colours: CanvasColours,
): void {
  inPlot(context, figure, () => {
    paintFocusLine(context, curve, colours);
    paintMarks(context, curve, colours, true);
  });
  const label = figure.ends.find(({ key }) => key === curve.material);
  if (label !== undefined) paintEnd(context, label, colours);
  paintPick(context, figure, colours);
}

function paintPointed(
  context: CanvasRenderingContext2D,
  { plot, width }: FrontFigure,
  { words, figures }: Over,
  { x, y }: DrawnPoint,
  colours: CanvasColours,
): void {
  context.strokeStyle = colours.ink2;
  context.lineWidth = 0.8;
  context.setLineDash([]);
  context.beginPath();
  context.moveTo(plot.left, y);
  context.lineTo(x, y);
  context.lineTo(x, plot.bottom);
  context.stroke();
  context.strokeStyle = colours.ink;
  context.lineWidth = 1.4;
  context.beginPath();
  context.arc(x, y, 5.5, 0, 2 * Math.PI);
  context.stroke();
  const halo = colours.paper;
  const figure = { size: TICK_SIZE, face: 'mono', weight: 500, colour: colours.ink } as const;
  writeOn(context, figures[0], x, plot.bottom + 13, 'center', figure, halo);
  writeOn(context, figures[1], plot.left - 8, y, 'right', figure, halo);
  context.font = fontOf(END_SIZE, 'sans', 500);
  const breadth = context.measureText(words).width;
  const right = x + 12 + breadth < width - 2;
  const level = y - 14 > plot.top + 6 ? y - 14 : y + 16;
  const note = { size: END_SIZE, face: 'sans', weight: 500, colour: colours.ink, halo } as const;
  write(context, words, right ? x + 10 : x - 10, level, { ...note, align: right ? 'left' : 'right' });
}

/** A figure over whatever the axis says there: on a patch of paper. */
function writeOn(
  context: CanvasRenderingContext2D,
  text: string,
  x: number,
  y: number,
  align: 'center' | 'right',
  writing: { readonly size: number; readonly face: 'mono'; readonly weight: 500; readonly colour: string },
  paper: string,
): void {
  context.font = fontOf(writing.size, writing.face, writing.weight);
  const breadth = context.measureText(text).width;
  const left = align === 'center' ? x - breadth / 2 : x - breadth;
  context.fillStyle = paper;
  const margin = align === 'center' ? 16 : 3;
  context.fillRect(left - margin, y - 7, breadth + 2 * margin, 14);
  write(context, text, x, y, { ...writing, align });
}
