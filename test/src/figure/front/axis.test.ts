import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { linearAxis, logAxis, partOf, roundStep, type Axis } from '../../../../src/figure/front/axis.js';

const positive = fc.double({ min: 1e-4, max: 1e5, noNaN: true });
const texts = (axis: Axis, choice = 0): readonly string[] => axis.choices[choice]?.map(({ text }) => text) ?? [];

describe('a log axis', () => {
  it('runs from round to round and names round values', () => {
    const axis = logAxis(1.27, 18.6);
    expect([axis.from, axis.to]).toEqual([1.2, 20]);
    expect(texts(axis)).toEqual(
      ['1.5', '2.0', '2.5', '3', '4', '5', '6', '8', '10', '15', '20'].map((t) => String(Number(t))),
    );
    expect(texts(axis, 2)).toEqual(['2', '5', '10', '20']);
  });

  it('names even steps where it spans less than a few round values', () => {
    expect(texts(logAxis(2.02, 2.4)).length).toBeGreaterThan(2);
  });

  it('holds its range', () => {
    fc.assert(
      fc.property(positive, positive, (a, b) => {
        const axis = logAxis(Math.min(a, b), Math.max(a, b));
        expect(partOf(axis, Math.min(a, b))).toBeGreaterThanOrEqual(-1e-9);
        expect(partOf(axis, Math.max(a, b))).toBeLessThanOrEqual(1 + 1e-9);
      }),
    );
  });
});

describe('a linear axis', () => {
  it('runs from round to round', () => {
    const axis = linearAxis(0.63, 3.41, 6);
    expect([axis.from, axis.to]).toEqual([0.5, 3.5]);
    expect(texts(axis)).toEqual(['0.5', '1.0', '1.5', '2.0', '2.5', '3.0', '3.5']);
  });

  it('may end at half a step', () => {
    const { from, to } = linearAxis(0.63, 3.1, 3, 0.5);
    expect(from).toBe(0.5);
    expect(to).toBe(3.5);
  });

  it('holds its range, also one without breadth', () => {
    fc.assert(
      fc.property(positive, positive, (a, b) => {
        const axis = linearAxis(Math.min(a, b), Math.max(a, b), 7);
        expect(partOf(axis, Math.min(a, b))).toBeGreaterThanOrEqual(-1e-9);
        expect(partOf(axis, Math.max(a, b))).toBeLessThanOrEqual(1 + 1e-9);
      }),
    );
    const flat = linearAxis(4, 4, 5);
    expect(flat.from).toBeLessThan(4);
    expect(flat.to).toBeGreaterThan(4);
    expect(linearAxis(0, 0, 5)).toMatchObject({ from: 0, to: 1 });
  });

  it.each([
    [10, 5, 2],
    [1, 6, 0.2],
    [7, 3, 2.5],
    [0.9, 10, 0.1],
  ])('has a round step for a range of %d in about %d', (range, about, step) => {
    expect(roundStep(range, about)).toBeCloseTo(step, 12);
  });
});
