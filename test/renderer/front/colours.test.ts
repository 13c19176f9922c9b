import { expect, it } from 'vitest';
import { canvasColours, faint } from '../../../renderer/front/colours.js';
import { TOKENS } from '../../../renderer/theme/tokens.js';

it.each(['paper', 'blueprint'] as const)('a canvas takes the tokens of %s', (theme) => {
  const colours = canvasColours(theme);
  expect(colours.copper).toBe(TOKENS[theme].copper);
  expect(colours.family('steel')).toBe(TOKENS.families['steel']?.[theme]);
  expect(colours.family('unheard of')).toBe(TOKENS[theme].ink2);
  expect(colours.family('constructor')).toBe(TOKENS[theme].ink2);
});

it('a colour keeps a part of itself', () => {
  expect(faint('#14284B', 0.5)).toBe('#14284B80');
  expect(faint('#14284B', 0)).toBe('#14284B00');
});
