import type { Theme } from '../stores/settings.js';
import { TOKENS, type Colours } from '../theme/tokens.js';

/** The colours of a theme as a canvas takes them. */
export interface CanvasColours extends Colours {
  /** a family's own colour; ink2 for one that nobody foresaw */
  readonly family: (name: string) => string;
}

/** The tokens of a theme: a canvas keeps no style sheet, so that they are read anew with each theme. */
export function canvasColours(theme: Theme): CanvasColours {
  const colours = TOKENS[theme];
  return {
    ...colours,
    family: (name) => (Object.hasOwn(TOKENS.families, name) ? TOKENS.families[name]?.[theme] : null) ?? colours.ink2,
  };
}

/** A colour of six hexadecimal figures, so much of it left. */
export function faint(colour: string, part: number): string {
  return `${colour}${Math.round(part * 255)
    .toString(16)
    .padStart(2, '0')}`;
}
