import { expect, it } from 'vitest';
import { frontData, frontOptions } from '../../../renderer/front/chart.js';
import { canvasColours } from '../../../renderer/front/colours.js';
import { frontFigure } from '../../../src/figure/front.js';
import { inputOf, measure, reportOf } from '../../src/figure/front/fronts.js';

const figure = frontFigure(inputOf(reportOf(6, 'twist')), measure);
const colours = canvasColours('paper');

it('has a line of each material in shown units, and none of a folded one', () => {
  const { datasets } = frontData(figure, colours);
  expect(datasets.map(({ label }) => label)).toEqual(figure.curves.map(({ material }) => material));
  expect(datasets[0]?.data[0]).toEqual({ x: figure.curves[0]?.points[0]?.value, y: figure.curves[0]?.points[0]?.mass });
  const folded = frontFigure(inputOf(reportOf(6, 'twist'), { folded: true }), measure);
  expect(frontData(folded, colours).datasets).toHaveLength(4);
});

it('leaves the plot to the lines alone, on the axes of the figure', () => {
  const { layout, plugins, animation, scales } = frontOptions(figure);
  expect(layout?.padding).toMatchObject({ left: figure.plot.left, right: figure.width - figure.plot.right });
  expect(plugins).toMatchObject({ legend: { display: false }, tooltip: { enabled: false } });
  expect(animation).toBe(false);
  expect(scales?.['x']).toMatchObject({ type: 'logarithmic', min: figure.x.from, max: figure.x.to, display: false });
  expect(scales?.['y']).toMatchObject({ type: 'linear', min: figure.y.from, max: figure.y.to });
});
