// @vitest-environment happy-dom
import { expect, it } from 'vitest';
import { applyTheme } from '../../../renderer/theme/apply.js';
import { TOKENS } from '../../../renderer/theme/tokens.js';

it.each([
  ['paper', 'light'],
  ['blueprint', 'dark'],
] as const)('gives the style sheets every colour of %s', (theme, scheme) => {
  const root = document.createElement('html');
  applyTheme(root, theme);
  const names = Object.keys(TOKENS[theme]).map((name) => `--${name.replace(/[A-Z]/g, (c) => `-${c.toLowerCase()}`)}`);
  expect(names.map((name) => root.style.getPropertyValue(name))).toEqual(Object.values(TOKENS[theme]));
  for (const [name, family] of Object.entries(TOKENS.families))
    expect(root.style.getPropertyValue(`--family-${name.replace('/', '-')}`)).toBe(family[theme]);
  expect(root.style.colorScheme).toBe(scheme);
  expect(root.dataset['theme']).toBe(theme);
});
