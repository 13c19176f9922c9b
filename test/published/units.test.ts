import { describe, expect, it } from 'vitest';
import { parseQuantity } from '../../src/quantity/parse.js';
import { quantities } from '../../src/quantity/register.js';
import { unitRows } from './units.js';

describe('the table of exact conversions', () => {
  it('names each row once and agrees with itself', () => {
    expect(new Set(unitRows.map((row) => row.id)).size).toBe(unitRows.length);
    const value = (id: string) => unitRows.find((row) => row.id === id)?.expected ?? NaN;
    const close = (a: number, b: number) => {
      expect(Math.abs(a / b - 1)).toBeLessThan(5e-16);
    };
    close(value('U2'), 12 * value('U1'));
    close(value('U4'), value('U3') * value('U5'));
    close(value('U6'), value('U4') * value('U1'));
    close(value('U7'), value('U4') * value('U2'));
    close(value('U8'), value('U4') / value('U1') ** 2);
    close(value('U11'), value('U3') / value('U1') ** 3);
    close(value('U12'), value('U3') / value('U2'));
    close(value('U13'), value('U3') / value('U1'));
    close(value('U14'), value('U1') ** 4);
  });
});

describe('conversion to SI', () => {
  it.each(unitRows)('$id: $text is $expected $si ($source)', (row) => {
    const parsed = parseQuantity(row.text, row.quantity);
    if (!parsed.ok) throw new Error(parsed.message);
    expect(quantities[row.quantity].si).toBe(row.si);
    expect(Math.abs(parsed.value / row.expected - 1)).toBeLessThanOrEqual(row.tolerance);
  });
});
