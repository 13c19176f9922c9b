import { describe, expect, it } from 'vitest';
import { buildStockLists } from '../../src/material/library.js';
import type { StockTube } from '../../src/material/material.js';
import { shipped } from './shipped.js';

const FILES = shipped('stock');
const LISTS = buildStockLists(FILES.map(({ content }) => content));
const INCH = 0.0254;

function tubes(id: string): readonly StockTube[] {
  return LISTS.get(id)?.rows.filter((row) => 'wall' in row) ?? [];
}

/** Rows as the file writes them, before sizes listed twice are dropped. */
function writtenRows(content: unknown): readonly unknown[] {
  const rows = typeof content === 'object' && content !== null && 'rows' in content ? content.rows : [];
  return Array.isArray(rows) ? rows : [];
}

function has(id: string, outerDiameter: number, wall: number): boolean {
  return tubes(id).some(
    (row) => Math.abs(row.outerDiameter - outerDiameter) < 1e-9 && Math.abs(row.wall - wall) < 1e-9,
  );
}

describe('the shipped stock lists', () => {
  it('are three, under the ids of their files, and say where they come from', () => {
    expect(Array.from(LISTS.keys())).toEqual(['inch-aircraft', 'inch-gauge', 'metric-precision']);
    expect(FILES.map(({ name }) => name)).toEqual(Array.from(LISTS.keys()));
    for (const { source } of LISTS.values()) expect(source).toMatch(/from memory|common practice/);
  });

  it.each([
    ['inch-aircraft', 216],
    ['inch-gauge', 251],
    ['metric-precision', 776],
  ])('%s has %d rows, none twice', (id, count) => {
    expect(tubes(id)).toHaveLength(count);
    expect(writtenRows(FILES.find(({ name }) => name === id)?.content)).toHaveLength(count);
  });

  it.each(Array.from(LISTS.keys()))('%s holds tubes that can be drawn: wall to D/4, D to 70 walls', (id) => {
    for (const { outerDiameter, wall, pricePerMetre } of tubes(id)) {
      expect(wall).toBeLessThanOrEqual(outerDiameter / 4 + 1e-12);
      expect(outerDiameter / wall).toBeLessThanOrEqual(70 + 1e-9);
      expect(pricePerMetre).toBeNull();
    }
  });

  it.each(Array.from(LISTS.keys()))('%s goes up in diameter, then in wall', (id) => {
    const rows = tubes(id);
    const sorted = rows.toSorted((a, b) => a.outerDiameter - b.outerDiameter || a.wall - b.wall);
    expect(rows).toEqual(sorted);
  });

  it.each([
    ['metric-precision', 0.05, 0.0015, true],
    ['metric-precision', 0.03, 0.0005, true],
    ['metric-precision', 0.032, 0.0005, false],
    ['metric-precision', 0.04, 0.0008, true],
    ['metric-precision', 0.042, 0.0008, false],
    ['metric-precision', 0.07, 0.001, true],
    ['metric-precision', 0.075, 0.001, false],
    ['metric-precision', 0.1, 0.0015, true],
    ['metric-precision', 0.11, 0.0015, false],
    ['metric-precision', 0.13, 0.002, true],
    ['metric-precision', 0.14, 0.002, false],
    ['metric-precision', 0.2, 0.025, true],
    ['metric-precision', 0.004, 0.001, true],
    ['metric-precision', 0.004, 0.0012, false],
    ['inch-aircraft', 2.5 * INCH, 0.065 * INCH, true],
    ['inch-aircraft', 0.1875 * INCH, 0.028 * INCH, true],
    ['inch-aircraft', 3 * INCH, 0.035 * INCH, false],
    ['inch-gauge', 2 * INCH, 0.065 * INCH, true],
    ['inch-gauge', 4 * INCH, 0.134 * INCH, true],
  ])('%s, diameter %d m, wall %d m: %s', (id, outerDiameter, wall, listed) => {
    expect(has(id, outerDiameter, wall)).toBe(listed);
  });

  it('gives every Birmingham gauge from 22 to 10 its wall', () => {
    const walls = new Map<string, string>();
    for (const row of writtenRows(FILES.find(({ name }) => name === 'inch-gauge')?.content)) {
      const { gauge, wall } = row as { gauge: string; wall: string };
      expect(walls.get(gauge) ?? wall).toBe(wall);
      walls.set(gauge, wall);
    }
    expect(Object.fromEntries(walls)).toEqual({
      'BWG 22': '0.028 in',
      'BWG 21': '0.032 in',
      'BWG 20': '0.035 in',
      'BWG 19': '0.042 in',
      'BWG 18': '0.049 in',
      'BWG 17': '0.058 in',
      'BWG 16': '0.065 in',
      'BWG 15': '0.072 in',
      'BWG 14': '0.083 in',
      'BWG 13': '0.095 in',
      'BWG 12': '0.109 in',
      'BWG 11': '0.12 in',
      'BWG 10': '0.134 in',
    });
  });
});
