import { TICK_SIZE } from '../../../src/figure/front.js';
import { NAME_SIZE } from '../../../src/figure/front/lines.js';
import type { FrontFigure } from '../../../src/figure/front/model.js';
import type { CanvasColours } from '../colours.js';
import { write } from '../text.js';

const TICK = 4;

function stroke(context: CanvasRenderingContext2D, colour: string, width: number, path: () => void): void {
  context.strokeStyle = colour;
  context.lineWidth = width;
  context.setLineDash([]);
  context.beginPath();
  path();
  context.stroke();
}

/** A whole pixel's middle, so that a hairline is one pixel wide. */
const crisp = (value: number): number => Math.round(value) + 0.5;

/** Hairlines at the masses that the axis names. */
export function paintGrid(context: CanvasRenderingContext2D, figure: FrontFigure, colours: CanvasColours): void {
  const { plot, yTicks } = figure;
  stroke(context, colours.hair, 1, () => {
    for (const { at } of yTicks)
      if (at < plot.bottom - 1) {
        context.moveTo(plot.left, crisp(at));
        context.lineTo(plot.right, crisp(at));
      }
  });
}

/** Axes left and below with outward ticks, their figures, and what they measure. */
export function paintAxes(context: CanvasRenderingContext2D, figure: FrontFigure, colours: CanvasColours): void {
  const { plot, xTicks, yTicks, limit } = figure;
  stroke(context, colours.ink, 1, () => {
    context.moveTo(crisp(plot.left), plot.top);
    context.lineTo(crisp(plot.left), crisp(plot.bottom));
    context.lineTo(plot.right, crisp(plot.bottom));
    for (const { at } of yTicks) {
      context.moveTo(crisp(plot.left), crisp(at));
      context.lineTo(crisp(plot.left) - TICK, crisp(at));
    }
    for (const at of [...xTicks.map((tick) => tick.at), ...(limit === null ? [] : [limit.x])]) {
      context.moveTo(crisp(at), crisp(plot.bottom));
      context.lineTo(crisp(at), crisp(plot.bottom) + TICK);
    }
  });
  paintFigures(context, figure, colours);
}

function paintFigures(context: CanvasRenderingContext2D, figure: FrontFigure, colours: CanvasColours): void {
  const { plot, xTicks, yTicks, xName, yName, limit, width } = figure;
  const tick = { size: TICK_SIZE, face: 'mono', weight: 400, colour: colours.ink2 } as const;
  const name = { size: NAME_SIZE, face: 'sans', weight: 400, colour: colours.ink2 } as const;
  const below = plot.bottom + 13;
  // the unit takes the place of the topmost figure, where that is in its way
  for (const { at, text } of yTicks)
    if (at > plot.top + 14) write(context, text, plot.left - 8, at, { ...tick, align: 'right' });
  for (const { at, text } of xTicks) write(context, text, at, below, { ...tick, align: 'center' });
  if (limit !== null)
    write(context, limit.text, limit.x, below, { ...tick, weight: 500, colour: colours.ink, align: 'center' });
  write(context, yName, plot.left - 8, plot.top + 4, { ...name, align: 'right' });
  write(context, xName, width - 2, below, { ...name, align: 'right' });
}
