import { describe, expect, it } from 'vitest';
import * as field from '../../../src/material/field.js';
import { newReading, openFields, type Fields } from '../../../src/material/reading.js';

/** Reads key `k` of an object that holds it (or not), and gives the value and the messages. */
function read<T>(value: unknown, reader: (fields: Fields) => T): { value: T; messages: string[]; units: object } {
  const reading = newReading();
  const fields = openFields(value === undefined ? {} : { k: value }, 'a', 'a thing', ['k'], reading);
  if (fields === null) throw new Error('not opened');
  return { value: reader(fields), messages: reading.problems.map(({ message }) => message), units: reading.units };
}

const WALL = field.quantitySpec({ quantity: 'length', what: 'a wall', above: '0 mm', atMost: '1 m', example: '2 mm' });

describe('a quantity field', () => {
  it('reads into SI and keeps the unit by its key path', () => {
    const { value, messages, units } = read('2 mm', (fields) => field.quantityField(fields, 'k', WALL));
    expect({ value, messages, units }).toEqual({ value: 0.002, messages: [], units: { 'a.k': 'mm' } });
  });

  it.each([
    [undefined, 'a.k: is missing; expected a wall above 0 mm and at most 1 m, such as "2 mm"'],
    ['0 mm', 'a.k: "0 mm" is out of range; expected a wall above 0 mm and at most 1 m, such as "2 mm"'],
    ['2 km', 'a.k: "2 km" is out of range; expected a wall above 0 mm and at most 1 m, such as "2 mm"'],
    ['2 kg', 'a.k: "2 kg" is a mass; expected a length such as "1.4 m"'],
    [2, 'a.k: 2 has no unit; expected a length such as "1.4 m"'],
  ])('refuses %j', (given, message) => {
    const { value, messages, units } = read(given, (fields) => field.quantityField(fields, 'k', WALL));
    expect({ value, messages, units }).toEqual({ value: NaN, messages: [message], units: {} });
  });

  it('may be left out', () => {
    expect(read(undefined, (fields) => field.optionalQuantity(fields, 'k', WALL)).value).toBeNull();
    expect(read('1 mm', (fields) => field.optionalQuantity(fields, 'k', WALL)).value).toBe(0.001);
  });

  it('is a mistake in the code where its range is no value of its quantity', () => {
    const rule = { quantity: 'length', what: 'a wall', above: '0 kg', example: '2 mm' } as const;
    expect(() => field.quantitySpec(rule)).toThrow('a range ends wrongly: "0 kg" is a mass');
  });
});

describe('a number field', () => {
  const range = { above: 0, atMost: 1 };
  it.each([
    [undefined, 'a.k: is missing; expected a number above 0 and at most 1'],
    [0, 'a.k: 0 is out of range; expected a number above 0 and at most 1'],
    [Infinity, 'a.k: Infinity is out of range; expected a number above 0 and at most 1'],
    ['1', 'a.k: "1" is not a number; expected a number above 0 and at most 1'],
  ])('refuses %j', (given, message) => {
    const { value, messages } = read(given, (fields) => field.numberField(fields, 'k', range));
    expect({ value, messages }).toEqual({ value: NaN, messages: [message] });
  });

  it('reads what lies in its range, and may be left out', () => {
    expect(read(1, (fields) => field.numberField(fields, 'k', range))).toMatchObject({ value: 1, messages: [] });
    expect(read(undefined, (fields) => field.optionalNumber(fields, 'k', range))).toMatchObject({ value: null });
    expect(read('1', (fields) => field.numberField(fields, 'k', {})).messages).toEqual([
      'a.k: "1" is not a number; expected a number',
    ]);
  });
});

describe('a text field', () => {
  const spec = { expected: 'a name', longest: 5 };
  it.each([
    [undefined, 'a.k: is missing; expected a name of 1 to 5 characters'],
    [7, 'a.k: 7 is not text; expected a name of 1 to 5 characters'],
    [' ', 'a.k: " " is empty; expected a name of 1 to 5 characters'],
    ['abcdef', 'a.k: "abcdef" is too long; expected a name of 1 to 5 characters'],
    ['a\nb', 'a.k: "a\\u{a}b" holds characters that cannot be printed; expected a name of 1 to 5 characters'],
    ['\ud800', 'a.k: "\\u{d800}" holds characters that cannot be printed; expected a name of 1 to 5 characters'],
  ])('refuses %j', (given, message) => {
    const { value, messages } = read(given, (fields) => field.textField(fields, 'k', spec));
    expect({ value, messages }).toEqual({ value: '', messages: [message] });
  });

  it('reads text as it stands, with line breaks where it may have them', () => {
    expect(read('a b', (fields) => field.textField(fields, 'k', spec)).value).toBe('a b');
    expect(read('a\nb', (fields) => field.textField(fields, 'k', { ...spec, lines: true })).value).toBe('a\nb');
    expect(read(undefined, (fields) => field.optionalText(fields, 'k', spec)).value).toBeNull();
  });
});

describe('other fields', () => {
  it('read true, false or nothing', () => {
    expect(read(false, (fields) => field.optionalBoolean(fields, 'k')).value).toBe(false);
    expect(read(undefined, (fields) => field.optionalBoolean(fields, 'k'))).toMatchObject({
      value: null,
      messages: [],
    });
    expect(read('yes', (fields) => field.optionalBoolean(fields, 'k')).messages).toEqual([
      'a.k: "yes" is not true or false; expected true or false',
    ]);
  });

  it('read one of a few words', () => {
    expect(read('b', (fields) => field.choiceField(fields, 'k', ['a', 'b'])).value).toBe('b');
    expect(read('c', (fields) => field.choiceField(fields, 'k', ['a', 'b'])).messages).toEqual([
      'a.k: "c" is not known; expected "a" or "b"',
    ]);
  });

  it.each([
    [undefined, 'a.k: is missing; expected a list of loads'],
    [{}, 'a.k: an object is not a list; expected a list of loads'],
    [[], 'a.k: a list of 0 is out of range; expected 1 to 2 loads'],
    [[1, 2, 3], 'a.k: a list of 3 is out of range; expected 1 to 2 loads'],
  ])('refuse the list %j', (given, message) => {
    const { value, messages } = read(given, (fields) => field.listField(fields, 'k', 'loads', 1, 2));
    expect({ value, messages }).toEqual({ value: [], messages: [message] });
  });

  it('read a list of the right length', () => {
    expect(read([1], (fields) => field.listField(fields, 'k', 'loads', 1, 2)).value).toEqual([1]);
  });
});
