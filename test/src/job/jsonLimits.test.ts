import fc from 'fast-check';
import { expect, it } from 'vitest';
import { utf8Length } from '../../../src/job/jsonLimits.js';

it('utf8Length counts the bytes of UTF-8', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'binary' }), (text) => {
      expect(utf8Length(text)).toBe(new TextEncoder().encode(text).length);
    }),
  );
  expect(utf8Length('aé€😀')).toBe(1 + 2 + 3 + 4);
});
