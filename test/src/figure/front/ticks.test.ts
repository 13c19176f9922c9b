import { expect, it } from 'vitest';
import { logAxis } from '../../../../src/figure/front/axis.js';
import { ticksOf, without } from '../../../../src/figure/front/ticks.js';

const axis = logAxis(1.2, 20);
const breadth = ({ text }: { readonly text: string }): number => 6.3 * text.length;

it.each([900, 400, 200, 90, 40])('figures of an axis %d px long do not touch', (length) => {
  const ticks = ticksOf(axis, 40, 40 + length, breadth);
  expect(ticks.length).toBeGreaterThan(0);
  for (const [index, tick] of ticks.entries()) {
    const next = ticks[index + 1];
    if (next !== undefined) expect(next.at - tick.at).toBeGreaterThanOrEqual((breadth(tick) + breadth(next)) / 2 + 10);
  }
});

it('names more on a longer axis', () => {
  expect(ticksOf(axis, 0, 900, breadth).length).toBeGreaterThan(ticksOf(axis, 0, 150, breadth).length);
});

it('leaves room for a figure of its own', () => {
  const ticks = ticksOf(axis, 0, 600, breadth);
  const three = ticks.find(({ text }) => text === '3');
  const left = without(ticks, (three?.at ?? 0) + 4, 12, breadth);
  expect(left.length).toBe(ticks.length - 1);
  expect(left).not.toContain(three);
});
