import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { clipped, shownValue, SHOWN_MAX } from '../../../src/quantity/shown.js';

describe('clipped', () => {
  it('leaves a short text as it is', () => {
    expect(clipped('900 N·m, 3°, 0.9 µm')).toBe('900 N·m, 3°, 0.9 µm');
    expect(clipped('x'.repeat(SHOWN_MAX))).toBe('x'.repeat(SHOWN_MAX));
  });

  it('cuts a long one and says so', () => {
    expect(clipped('x'.repeat(SHOWN_MAX + 1))).toBe(`${'x'.repeat(SHOWN_MAX - 1)}…`);
  });

  it('escapes what cannot be seen', () => {
    expect(clipped('a\u0000b\n\u001b[31m\u202e\ud800\u2028')).toBe(
      'a\\u{0}b\\u{a}\\u{1b}[31m\\u{202e}\\u{d800}\\u{2028}',
    );
  });

  it('is never longer than it may be and never holds a hidden character', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 200 }), (text) => {
        expect(clipped(text).length).toBeLessThanOrEqual(SHOWN_MAX);
        expect(clipped(text)).not.toMatch(/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}]/u);
      }),
    );
  });
});

describe('shownValue', () => {
  it.each([
    ['900', '"900"'],
    [900, '900'],
    [NaN, 'NaN'],
    [true, 'true'],
    [null, 'null'],
    [undefined, 'nothing'],
    [[1], 'a list'],
    [{}, 'an object'],
  ])('%j: %s', (value, expected) => {
    expect(shownValue(value)).toBe(expected);
  });
});
