import { describe, expect, it } from 'vitest';
import { engine } from './engine.js';
import { DOCUMENTS, KNOWN_FAILURES, ROWS } from './index.js';
import { codeMiss, tableMiss } from './row.js';

describe('the published tables', () => {
  it('name each row once, at least 45 of them, from at least 12 sources', () => {
    expect(new Set(ROWS.map((row) => row.id)).size).toBe(ROWS.length);
    expect(ROWS.length).toBeGreaterThanOrEqual(45);
    const used = DOCUMENTS.filter((name) => ROWS.some((row) => row.source.includes(name)));
    expect(used).toEqual(DOCUMENTS);
    expect(used.length).toBeGreaterThanOrEqual(12);
  });

  it.each(ROWS)('agree with themselves: $id ($source)', (row) => {
    expect(tableMiss(row)).toBeNull();
  });
});

describe('the engine', () => {
  it.each(ROWS.filter(({ id }) => !KNOWN_FAILURES.has(id)))('gives $id ($source)', (row) => {
    expect(codeMiss(row, engine)).toBeNull();
  });

  it.each([...KNOWN_FAILURES])('does not give %s: %s', (id) => {
    const row = ROWS.find((one) => one.id === id);
    expect(row && codeMiss(row, engine)).toMatch(/, not /);
  });
});
