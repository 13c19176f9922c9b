import { describe, expect, it } from 'vitest';
import { drawnAt, firstRung, rungAt, walked, type Rung } from '../../../renderer/front/walk.js';
import { frontFigure } from '../../../src/figure/front.js';
import { inputOf, measure, reportOf } from '../../src/figure/front/fronts.js';

const figure = frontFigure(inputOf(reportOf(5, 'twist')), measure);
const first = firstRung(figure, 'metal-2') as Rung;

function massAt(rung: Rung): number {
  return drawnAt(figure, rung)?.point.mass ?? NaN;
}

describe('walking a front', () => {
  it('begins on the material in focus, near the pick', () => {
    expect(first.material).toBe('metal-2');
    expect(Math.abs((drawnAt(figure, first)?.point.x ?? 0) - (figure.ring?.x ?? 0))).toBeLessThan(30);
    expect(firstRung(figure, 'nothing')?.material).toBe('metal-0');
    expect(firstRung({ ...figure, curves: [] }, null)).toBeNull();
  });

  it('goes along a line, and stays at its ends', () => {
    const right = walked(figure, first, 'ArrowRight') as Rung;
    expect(right).toEqual({ material: 'metal-2', index: first.index + 1 });
    expect(walked(figure, right, 'ArrowLeft')).toEqual(first);
    let at = first;
    for (let step = 0; step < 60; step += 1) at = walked(figure, at, 'ArrowRight') as Rung;
    expect(at.index).toBe((figure.curves.find(({ material }) => material === 'metal-2')?.points.length ?? 0) - 1);
    for (let step = 0; step < 60; step += 1) at = walked(figure, at, 'ArrowLeft') as Rung;
    expect(drawnAt(figure, at)?.point.y).toBeGreaterThanOrEqual(figure.plot.top - 1);
  });

  it('goes from line to line by mass, up to the heavier', () => {
    const up = walked(figure, first, 'ArrowUp') as Rung;
    const down = walked(figure, first, 'ArrowDown') as Rung;
    expect(up.material === first.material || massAt(up) >= massAt(first)).toBe(true);
    expect(down.material === first.material || massAt(down) <= massAt(first)).toBe(true);
    expect(new Set([up.material, down.material, first.material]).size).toBeGreaterThan(1);
    expect(walked(figure, first, 'x')).toBeNull();
  });

  it('finds the point that the pointer means', () => {
    const point = drawnAt(figure, first)?.point ?? { x: 0, y: 0 };
    expect(rungAt(figure, point.x, point.y)).toEqual(first);
    expect(rungAt(figure, figure.plot.right, figure.plot.top + 60)).toBeNull();
  });

  it('knows a rung that is gone', () => {
    expect(drawnAt(figure, { material: 'metal-2', index: 400 })).toBeNull();
    expect(drawnAt(figure, null)).toBeNull();
  });
});
