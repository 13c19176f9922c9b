import { describe, expect, it } from 'vitest';
import { captionLabel, dimensionLabel, labelBox, textWidth } from '../../../src/figure/label.js';

describe('textWidth', () => {
  it('counts characters, not code units, at 0.6 em in the monospaced face', () => {
    expect(textWidth('Ø 90.0', 10, 'mono')).toBeCloseTo(36, 10);
    expect(textWidth('𝑥', 10, 'mono')).toBeCloseTo(6, 10);
  });
});

describe('labelBox', () => {
  const x = (label: Parameters<typeof labelBox>[0]): number[] => labelBox(label).map((corner) => corner.x);

  it('lies about, after or before the anchor', () => {
    const width = textWidth('1.61', 11, 'mono');
    expect(Math.min(...x(dimensionLabel('1.61', 100, 50)))).toBeCloseTo(100 - width / 2, 10);
    expect(Math.min(...x(dimensionLabel('1.61', 100, 50, { anchor: 'start' })))).toBeCloseTo(100, 10);
    expect(Math.max(...x(dimensionLabel('1.61', 100, 50, { anchor: 'end' })))).toBeCloseTo(100, 10);
  });

  it('stands upright where the label is turned by a right angle', () => {
    const label = captionLabel('a caption', 100, 50, { turn: 90 });
    const across = Math.max(...x(label)) - Math.min(...x(label));
    expect(across).toBeCloseTo(0.96 * label.size, 10);
  });
});
