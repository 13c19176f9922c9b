import type { Colours } from '../theme/tokens.js';
import { TOKENS } from '../theme/tokens.js';

/** A token as the style sheets name it: faintFill is --faint-fill. */
export function tokenColour(token: keyof Colours): string {
  return `var(--${token.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`)})`;
}

/** A family's colour: "carbon/epoxy" is --family-carbon-epoxy; one that has none takes ink2. */
export function familyColour(family: string): string {
  const known = Object.hasOwn(TOKENS.families, family);
  return known ? `var(--family-${family.replaceAll('/', '-')})` : tokenColour('ink2');
}
