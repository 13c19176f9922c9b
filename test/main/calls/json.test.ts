import { describe, expect, it } from 'vitest';
import { isJson, jsonText } from '../../../main/calls/json.js';
import { Refused } from '../../../main/calls/refused.js';

const nested = (levels: number): unknown => (levels === 0 ? 1 : { in: nested(levels - 1) });

describe('a JSON value', () => {
  it.each([[null], [true], [0], ['é'], [[1, [2]]], [{ a: { b: [] } }], [nested(64)], [Object.create(null)]])(
    'is %j',
    (value) => {
      expect(isJson(value)).toBe(true);
    },
  );

  it.each([
    ['undefined', undefined],
    ['a number that JSON has not', NaN],
    ['an infinity', [Infinity]],
    ['a big integer', 1n],
    ['a date', { at: new Date(0) }],
    ['a map', new Map()],
    ['bytes', new Uint8Array(1)],
    ['a function', { f: () => 1 }],
    ['too deep', nested(65)],
  ])('is not %s', (_name, value) => {
    expect(isJson(value)).toBe(false);
  });

  it('that goes round in itself is refused, not followed', () => {
    const round: Record<string, unknown> = {};
    round['round'] = round;
    expect(() => jsonText(round, 'The state')).toThrow('The state is not a JSON value of at most 64 levels.');
  });
});

describe('its text', () => {
  it('may hold 4 MB in UTF-8 and no more', () => {
    expect(jsonText('é'.repeat(1_999_999), 'The state')).toHaveLength(2_000_001);
    expect(() => jsonText('é'.repeat(2_000_000), 'The state')).toThrow(Refused);
  });
});
