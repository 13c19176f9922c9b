import { describe, expect, it } from 'vitest';
import { hasField, newReading, openFields, refuse } from '../../../src/material/reading.js';

function open(value: unknown, known: readonly string[] = ['wall', 'bore']): readonly string[] {
  const reading = newReading();
  openFields(value, 'a', 'a thing', known, reading);
  return reading.problems.map(({ message }) => message);
}

describe('opening an object', () => {
  it('takes known keys only', () => {
    expect(open({ wall: 1 })).toEqual([]);
    expect(open({ wal: 1, zzzzzz: 2 })).toEqual([
      'a.wal: "wal" is not a key of a thing; expected "wall"',
      'a.zzzzzz: "zzzzzz" is not a key of a thing; expected one of wall, bore',
    ]);
  });

  it.each(['__proto__', 'constructor', 'toString', 'hasOwnProperty'])('refuses the key %s like any other', (key) => {
    expect(open(JSON.parse(`{ "${key}": 1 }`))).toEqual([
      `a.${key}: "${key}" is not a key of a thing; expected one of wall, bore`,
    ]);
  });

  it('does not see inherited keys', () => {
    const fields = openFields(Object.create({ wall: 1 }), '', 'a thing', ['wall'], newReading());
    expect(fields !== null && hasField(fields, 'wall')).toBe(false);
  });

  it.each([
    [undefined, 'a: is missing; expected a thing'],
    [null, 'a: null is not an object; expected a thing'],
    [[], 'a: a list is not an object; expected a thing'],
    ['x', 'a: "x" is not an object; expected a thing'],
  ])('refuses %j', (value, message) => {
    expect(open(value)).toEqual([message]);
  });

  it('tells a flood of unknown keys by twenty of them', () => {
    const messages = open(Object.fromEntries(Array.from({ length: 500 }, (_, i) => [`key number ${i}`, i])));
    expect(messages).toHaveLength(21);
    expect(messages[20]).toBe('a: an object has 480 more unknown keys; expected a thing');
  });

  it('refuses a value by its key', () => {
    const reading = newReading();
    const fields = openFields({ wall: 1 }, 'a', 'a thing', ['wall', 'bore'], reading);
    if (fields === null) throw new Error('not opened');
    refuse(fields, 'wall', 'is thin', 'a thick one');
    refuse(fields, 'bore', 'is thin', 'a thick one');
    expect(reading.problems.map(({ message }) => message)).toEqual([
      'a.wall: 1 is thin; expected a thick one',
      'a.bore: is missing; expected a thick one',
    ]);
  });
});
