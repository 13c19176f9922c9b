// @vitest-environment happy-dom
import { mount } from '@vue/test-utils';
import { describe, expect, it } from 'vitest';
import FigureSvg from '../../../renderer/figure/FigureSvg.vue';
import MaterialMark from '../../../renderer/figure/MaterialMark.vue';
import type { Figure } from '../../../src/figure/figure.js';
import { captionLabel } from '../../../src/figure/label.js';
import { markAt } from '../../../src/figure/marker.js';

describe('FigureSvg', () => {
  const figure: Figure = {
    width: 100,
    height: 50,
    description: 'a drawing',
    shapes: [
      { kind: 'circle', x: 10, y: 20, r: 5, line: 'copper', width: 2 },
      { kind: 'path', d: 'M0 0L1 1', fill: 'ink' },
      { kind: 'path', d: 'M0 0L9 9', line: 'ink2', width: 0.7, stroke: 'centre' },
    ],
    labels: [captionLabel('a caption', 30, 40, { turn: -38 })],
  };

  it('paints every shape in its tone, and says what it shows', () => {
    const svg = mount(FigureSvg, { props: { figure } });
    expect(svg.attributes()).toMatchObject({ role: 'img', 'aria-label': 'a drawing', viewBox: '0 0 100 50' });
    const circle = svg.get('circle');
    expect(circle.attributes()).toMatchObject({ cx: '10', cy: '20', r: '5', 'stroke-width': '2' });
    expect(circle.attributes('style')).toContain('var(--copper)');
    const [filled, dashed] = svg.findAll('path');
    expect(filled?.attributes('style')).toMatch(/fill: var\(--ink\)/);
    expect(filled?.attributes('stroke-dasharray')).toBeUndefined();
    expect(dashed?.attributes('stroke-dasharray')).toBe('9 2.5 2 2.5');
  });

  it('sets labels in place, turned about their anchor', () => {
    const label = mount(FigureSvg, { props: { figure } }).get('text');
    expect(label.text()).toBe('a caption');
    expect(label.attributes()).toMatchObject({ transform: 'translate(30 40) rotate(-38)', 'text-anchor': 'middle' });
  });
});

describe('MaterialMark', () => {
  it('is of the family’s colour, filled by the member’s place, and silent', () => {
    const full = mount(MaterialMark, { props: { mark: markAt('steel', 0) } });
    expect(full.attributes('style')).toContain('var(--family-steel)');
    expect(full.attributes('aria-hidden')).toBe('true');
    expect(full.findAll('path')).toHaveLength(2);
    expect(mount(MaterialMark, { props: { mark: markAt('steel', 1) } }).findAll('path')).toHaveLength(1);
  });
});
