import { describe, expect, it } from 'vitest';
import { markerShape } from '../../../src/figure/marker.js';
import { TOKENS } from '../../../renderer/theme/tokens.js';

/** Relative luminance of #RRGGBB (WCAG 2.2, definition of relative luminance). */
function luminance(colour: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5]
    .map((at) => Number.parseInt(colour.slice(at, at + 2), 16) / 255)
    .map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4));
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

/** Contrast ratio of two colours, 1 to 21 (WCAG 2.2, definition of contrast ratio). */
function contrast(one: string, other: string): number {
  const [light = 0, dark = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (light + 0.05) / (dark + 0.05);
}

const THEMES = ['paper', 'blueprint'] as const;
const TEXT = ['ink', 'ink2', 'copper', 'pencil'] as const;
const FAMILIES = Object.entries(TOKENS.families);

describe('contrast', () => {
  it('is 21 for black on white and 4.48 for #777777 on white', () => {
    expect(contrast('#000000', '#FFFFFF')).toBeCloseTo(21, 10);
    expect(contrast('#777777', '#FFFFFF')).toBeCloseTo(4.48, 2);
  });
});

describe.each(THEMES)('the %s theme', (theme) => {
  const colours = TOKENS[theme];

  it.each(TEXT)('shows text in %s at 4.5 to 1 or better on the sheet and on the desk', (token) => {
    expect(contrast(colours[token], colours.paper)).toBeGreaterThanOrEqual(4.5);
    expect(contrast(colours[token], colours.sheet)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(FAMILIES)('shows %s at 4.5 to 1 or better on the sheet', (_name, family) => {
    expect(contrast(family[theme], colours.paper)).toBeGreaterThanOrEqual(4.5);
  });

  it('writes every colour as #RRGGBB or #RRGGBBAA', () => {
    for (const colour of Object.values(colours)) expect(colour).toMatch(/^#[0-9A-F]{6}(?:[0-9A-F]{2})?$/);
  });
});

describe('the families', () => {
  it('have a shape each, and none takes the plus of an unforeseen one', () => {
    const markers = FAMILIES.map(([name]) => markerShape(name));
    expect(new Set(markers).size).toBe(FAMILIES.length);
    expect(markers).not.toContain('plus');
  });

  it('cannot be changed while the window runs', () => {
    expect(Object.isFrozen(TOKENS.families)).toBe(true);
    for (const [, family] of FAMILIES) expect(Object.isFrozen(family)).toBe(true);
    for (const theme of THEMES) expect(Object.isFrozen(TOKENS[theme])).toBe(true);
  });
});
