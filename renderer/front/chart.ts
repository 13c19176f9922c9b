import {
  Chart,
  LinearScale,
  LineElement,
  LogarithmicScale,
  PointElement,
  type ChartData,
  type ChartOptions,
  type Plugin,
  type ScriptableLineSegmentContext,
} from 'chart.js';
import type { Axis } from '../../src/figure/front/axis.js';
import { isStrong, type Curve } from '../../src/figure/front/curve.js';
import type { FrontFigure } from '../../src/figure/front/model.js';
import { faint, type CanvasColours } from './colours.js';
import { paintAxes, paintGrid } from './paint/axes.js';
import { DASHES, inPlot, paintBands, paintMarks, REST, WIDTHS } from './paint/lines.js';
import { paintEnds, paintLimit, paintPick } from './paint/notes.js';

// only what the front is made of
Chart.register(LinearScale, LogarithmicScale, LineElement, PointElement);

interface Place {
  readonly x: number;
  readonly y: number;
}

export type FrontData = ChartData<'line', Place[]>;
export type FrontOptions = ChartOptions<'line'>;

function lineOf(curve: Curve, colours: CanvasColours): FrontData['datasets'][number] {
  const full = colours.family(curve.mark.family);
  const weak = faint(full, REST);
  const strong = ({ p0DataIndex }: ScriptableLineSegmentContext): boolean => isStrong(curve, p0DataIndex);
  return {
    label: curve.material,
    data: curve.points.map(({ value, mass }) => ({ x: value, y: mass })),
    borderColor: weak,
    borderWidth: WIDTHS.rest,
    borderJoinStyle: 'round',
    borderDash: [...DASHES[curve.mark.line]],
    segment: {
      borderColor: (at) => (strong(at) ? full : weak),
      borderWidth: (at) => (strong(at) ? WIDTHS.strong : WIDTHS.rest),
      borderDash: (at) => (strong(at) ? [] : [...DASHES[curve.mark.line]]),
    },
  };
}

/** The lines of a front; families folded into bands have none. */
export function frontData({ curves }: FrontFigure, colours: CanvasColours): FrontData {
  return { datasets: curves.filter(({ folded }) => !folded).map((curve) => lineOf(curve, colours)) };
}

function scaleOf({ kind, from, to }: Axis) {
  const type = kind === 'log' ? ('logarithmic' as const) : ('linear' as const);
  return { type, min: from, max: to, display: false, bounds: 'data' as const };
}

/** Nothing but lines in the plot: the rest of the drawing is the plugin's. */
export function frontOptions({ plot, x, y, width, height }: FrontFigure): FrontOptions {
  return {
    responsive: false,
    maintainAspectRatio: false,
    animation: false,
    events: [],
    parsing: false,
    normalized: true,
    layout: {
      autoPadding: false,
      padding: { left: plot.left, right: width - plot.right, top: plot.top, bottom: height - plot.bottom },
    },
    plugins: { legend: { display: false }, tooltip: { enabled: false } },
    elements: { point: { radius: 0, hitRadius: 0, hoverRadius: 0 } },
    scales: { x: scaleOf(x), y: scaleOf(y) },
  };
}

/** What the plugin paints when the chart is drawn. */
export interface Drawing {
  readonly figure: FrontFigure;
  readonly colours: CanvasColours;
}

/**
 * The drawing round and over the lines, painted from the figure as it stands when the chart is drawn.
 * @param isHeld whether the chart is not to be drawn now, since it will be in a moment
 */
export function frontPlugin(drawing: () => Drawing, isHeld: () => boolean): Plugin<'line'> {
  return {
    id: 'front',
    beforeDraw: () => !isHeld(),
    beforeDatasetsDraw: ({ ctx }) => {
      const { figure, colours } = drawing();
      ctx.save();
      paintGrid(ctx, figure, colours);
      inPlot(ctx, figure, () => {
        paintBands(ctx, figure, colours);
      });
      ctx.restore();
    },
    afterDatasetsDraw: ({ ctx }) => {
      const { figure, colours } = drawing();
      ctx.save();
      inPlot(ctx, figure, () => {
        for (const curve of figure.curves) if (!curve.folded) paintMarks(ctx, curve, colours, false);
      });
      paintAxes(ctx, figure, colours);
      paintLimit(ctx, figure, colours);
      paintEnds(ctx, figure.ends, colours);
      paintPick(ctx, figure, colours);
      ctx.restore();
    },
  };
}
