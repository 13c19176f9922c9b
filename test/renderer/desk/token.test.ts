// @vitest-environment happy-dom
import { beforeEach, expect, it } from 'vitest';
import { takeToken } from '../../../renderer/desk/token.js';

beforeEach(() => {
  window.sessionStorage.clear();
  window.history.replaceState(null, '', '/page?x=1');
});

it('takes the token out of the address, and finds it again after a reload', () => {
  window.location.hash = '#abc';
  expect(takeToken(window)).toBe('abc');
  expect(window.location.href).not.toContain('abc');
  expect(window.location.search).toBe('?x=1');
  expect(takeToken(window)).toBe('abc');
});

it('has none where none was given', () => {
  expect(takeToken(window)).toBe('');
});
