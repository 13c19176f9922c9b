import { describe, expect, it } from 'vitest';
import { familyColour, tokenColour } from '../../../renderer/figure/colour.js';

describe('colours as style sheets name them', () => {
  it('are tokens in small letters, joined by hyphens', () => {
    expect(tokenColour('ink2')).toBe('var(--ink2)');
    expect(tokenColour('faintFill')).toBe('var(--faint-fill)');
  });

  it('are families, or ink2 for one that nobody foresaw', () => {
    expect(familyColour('carbon/epoxy')).toBe('var(--family-carbon-epoxy)');
    expect(familyColour('magnesium')).toBe('var(--ink2)');
    expect(familyColour('constructor')).toBe('var(--ink2)');
  });
});
