import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { parseJson } from '../../../src/job/parseJson.js';

function messages(text: string): readonly string[] {
  const parsed = parseJson(text);
  return parsed.ok ? [] : parsed.problems.map((problem) => problem.message);
}

describe('parseJson reads', () => {
  it('what JSON.parse reads, to the same value', () => {
    fc.assert(
      fc.property(fc.jsonValue({ maxDepth: 6 }), fc.constantFrom(undefined, 1, '\t'), (value, indent) => {
        const text = JSON.stringify(value, null, indent);
        const expected: unknown = JSON.parse(text);
        expect(parseJson(text)).toEqual({ ok: true, value: expected });
      }),
    );
  });

  it('a document after a byte order mark', () => {
    expect(parseJson('\uFEFF{"a": 1}')).toEqual({ ok: true, value: { a: 1 } });
  });

  it('a key "__proto__" as a key like any other', () => {
    const parsed = parseJson('{"__proto__": {"polluted": true}}');
    const value = parsed.ok ? (parsed.value as object) : null;
    expect(Object.getPrototypeOf(value)).toBe(Object.prototype);
    expect(Object.keys(value ?? {})).toEqual(['__proto__']);
    expect(({} as Record<string, unknown>)['polluted']).toBeUndefined();
  });

  it('32 levels', () => {
    expect(parseJson('['.repeat(32) + ']'.repeat(32)).ok).toBe(true);
  });

  it('a text of nearly 2 MB in one string, quickly', () => {
    const long = 'x'.repeat(1_999_990);
    expect(parseJson(`["${long}"]`)).toEqual({ ok: true, value: [long] });
    expect(parseJson(`["${'\\n'.repeat(999_990)}"]`).ok).toBe(true);
  });
});

const REFUSED: readonly (readonly [string, string, readonly string[]])[] = [
  ['empty', '', ['the file is empty; expected a JSON document']],
  ['blank', ' \r\n\t ', ['the file is empty; expected a JSON document']],
  ['a byte order mark alone', '\uFEFF', ['the file is empty; expected a JSON document']],
  ['binary', 'PK\u0003\u0004\u0000\u0000', ['this is a binary file; expected JSON text in UTF-8']],
  ['too long', `["${'x'.repeat(2_000_000)}"]`, ['the text is longer than 2 MB; expected at most 2 MB']],
  ['too long in bytes', `["${'é'.repeat(1_000_000)}"]`, ['the text is longer than 2 MB; expected at most 2 MB']],
  [
    '33 levels',
    '['.repeat(33) + ']'.repeat(33),
    ['line 1, column 33: the values are nested deeper than 32 levels; expected at most 32 levels'],
  ],
  [
    '200,000 levels of lists',
    '['.repeat(200_000) + ']'.repeat(200_000),
    ['line 1, column 33: the values are nested deeper than 32 levels; expected at most 32 levels'],
  ],
  [
    '200,000 levels of objects',
    '{"a":'.repeat(200_000),
    ['line 1, column 161: the values are nested deeper than 32 levels; expected at most 32 levels'],
  ],
  [
    'a key twice',
    '{\n  "a": 1,\n  "a": 2\n}',
    ['a: this key stands twice in the same object (again at line 3, column 3); expected every key once'],
  ],
  [
    'keys twice in two places',
    '{"b": [{"c": 1, "c": 1}],\n "d": 0, "d": 0}',
    [
      'b.0.c: this key stands twice in the same object (again at line 1, column 17); expected every key once',
      'd: this key stands twice in the same object (again at line 2, column 10); expected every key once',
    ],
  ],
  [
    'a key twice, once with an escape',
    '{"a": 1, "\\u0061": 2}',
    ['a: this key stands twice in the same object (again at line 1, column 10); expected every key once'],
  ],
  ['NaN', '{"a": NaN}', ['line 1, column 7: NaN is not a number that JSON can hold; expected a value']],
  ['Infinity', '{"a": Infinity}', ['line 1, column 7: Infinity is not a number that JSON can hold; expected a value']],
  [
    'minus infinity',
    '[\n-Infinity]',
    ['line 2, column 1: -Infinity is not a number that JSON can hold; expected a value'],
  ],
  ['1e400', '[1e400]', ['line 1, column 2: the number 1e400 is too large; expected a number below 1.8e308']],
  ['-1e400', '[-1e400]', ['line 1, column 2: the number -1e400 is too large; expected a number below 1.8e308']],
  ['a leading zero', '[007]', ['line 1, column 2: 007 is not a number as JSON writes it; expected a value']],
  ['a plus sign', '[+1]', ['line 1, column 2: +1 is not a number as JSON writes it; expected a value']],
  ['a bare point', '[.5]', ['line 1, column 2: .5 is not a number as JSON writes it; expected a value']],
  ['two points', '[1.5.2]', ['line 1, column 2: 1.5.2 is not a number as JSON writes it; expected a value']],
  ['a unit without quotes', '[900Nm]', ['line 1, column 2: 900Nm is not a number as JSON writes it; expected a value']],
  [
    'a comment',
    '{\n  // the shaft\n  "a": 1}',
    ['line 2, column 3: comments are not allowed; expected a key in double quotes'],
  ],
  ['a block comment', '/* */ {}', ['line 1, column 1: comments are not allowed; expected a value']],
  ['a comment after a value', '{"a": 1 // one\n}', ['line 1, column 9: comments are not allowed; expected "," or "}"']],
  [
    'single quotes',
    "{'a': 1}",
    ['line 1, column 2: text stands in single quotes, and JSON takes double quotes; expected a key in double quotes'],
  ],
  ['a key without quotes', '{a: 1}', ['line 1, column 2: a stands without quotes; expected a key in double quotes']],
  ['a comma at the end', '{"a": 1,}', ['line 1, column 9: "}" is not due here; expected a key in double quotes']],
  ['a comma at the end of a list', '[1,]', ['line 1, column 4: "]" is not due here; expected a value']],
  ['no comma', '{"a": 1\n"b": 2}', ['line 2, column 1: "b" is not due here; expected "," or "}"']],
  ['no colon', '{"a" 1}', ['line 1, column 6: 1 is not due here; expected ":" after the key "a"']],
  ['an end too early', '{"a": [1, 2', ['line 1, column 12: the text ends too early; expected "," or "]"']],
  [
    'a text not closed',
    '{"a": "900 N·m\n}',
    ['line 1, column 7: a text that starts here is not closed on its line; expected a value'],
  ],
  [
    'an unknown escape',
    '["\\x41"]',
    [
      'line 1, column 2: a text that starts here holds a control character or an escape that JSON does not know; expected a value',
    ],
  ],
  [
    'a second document',
    '{}\r\n{}',
    ['line 2, column 1: "{" is not due here; expected nothing after the end of the document'],
  ],
  ['a word', 'job', ['line 1, column 1: job stands without quotes; expected a value']],
  ['True', '[True]', ['line 1, column 2: True stands without quotes; expected a value']],
  ['a control character', '[1\u0007]', ['line 1, column 3: "\\u{7}" is not due here; expected "," or "]"']],
];

describe('parseJson refuses', () => {
  it.each(REFUSED)('%s', (_name, text, expected) => {
    expect(messages(text)).toEqual(expected);
  });

  it('whatever JSON.parse refuses, without throwing', () => {
    const scrap = fc.string({
      unit: fc.constantFrom(...'{}[]",:\\/ \n0123.-+eEtruefalsn'.split(/(?:)/u)),
      maxLength: 30,
    });
    fc.assert(
      fc.property(scrap, (text) => {
        let sound = true;
        try {
          JSON.parse(text);
        } catch {
          sound = false;
        }
        const parsed = parseJson(text);
        const repeated = !parsed.ok && parsed.problems.every((problem) => problem.message.includes('stands twice'));
        expect(parsed.ok || (sound && repeated)).toBe(sound);
      }),
      { numRuns: 3000 },
    );
  });
});
