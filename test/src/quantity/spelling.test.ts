import { describe, expect, it } from 'vitest';
import { otherWords, unitKey } from '../../../src/quantity/spelling.js';

const SAME: readonly (readonly string[])[] = [
  ['N·m', 'N*m', 'N.m', 'N-m', 'N m', 'm·N', 'N · m', 'N\u22c5m', 'newton metre', 'N\u00a0m'],
  ['kg/m³', 'kg/m^3', 'kg/m3', 'kg / m³', 'kg·m-3', 'kg m⁻³', 'kg·m^-3', 'kg per m3'],
  ['in', 'inch', 'inches', '"', '\u2033', 'in.'],
  ['ft', 'foot', 'feet', "'", '\u2032', 'ft.'],
  ['µm', 'um', '\u03bcm', 'micron'],
  ['deg/ft', '°/ft', 'degrees per foot'],
  ['1/min', 'min-1', 'min⁻¹'],
];

const UNREADABLE = [
  '',
  '/',
  '/m',
  'N/',
  'N/m/m',
  'N/mm·mm',
  'N·',
  '·N',
  'N··m',
  'm^',
  'm^0',
  'm5',
  'm1',
  'm22',
  '2m',
  '1',
  '-m',
];

describe('unitKey', () => {
  it.each(SAME)('reads %s however it is written', (first, ...others) => {
    const key = unitKey(first);
    expect(key).not.toBeNull();
    for (const other of others) expect([other, unitKey(other)]).toEqual([other, key]);
  });

  it('keeps what differs apart', () => {
    const keys = ['mm', 'Mm', 'm²', 'm³', 'm-2', 'N·m', 'N/m', 'm/N', 'Nm', 'N·mm', 'N·m²'].map(unitKey);
    expect(new Set(keys).size).toBe(keys.length);
  });

  it.each(UNREADABLE)('refuses "%s"', (text) => {
    expect(unitKey(text)).toBeNull();
  });
});

describe('otherWords', () => {
  it('lists what stands for a factor', () => {
    expect(otherWords('ft')).toEqual(['foot', 'feet', "'", '\u2032', '\u2019']);
    expect(otherWords('N·m')).toEqual([]);
  });
});
