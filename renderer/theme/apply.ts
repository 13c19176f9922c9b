import { familyColour, tokenColour } from '../figure/colour.js';
import type { Theme } from '../stores/settings.js';
import { TOKENS, type Colours } from './tokens.js';

/** The custom property inside "var(--name)". */
function propertyOf(variable: string): string {
  return variable.slice('var('.length, -1);
}

/** Gives the style sheets the colours of a theme, as custom properties of the document's root. */
export function applyTheme(root: HTMLElement, theme: Theme): void {
  for (const [token, colour] of Object.entries(TOKENS[theme]) as [keyof Colours, string][])
    root.style.setProperty(propertyOf(tokenColour(token)), colour);
  for (const [name, family] of Object.entries(TOKENS.families))
    root.style.setProperty(propertyOf(familyColour(name)), family[theme]);
  root.style.colorScheme = theme === 'blueprint' ? 'dark' : 'light';
  root.dataset['theme'] = theme;
}
