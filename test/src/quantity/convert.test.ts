import { describe, expect, it } from 'vitest';
import { fromSI, toSI } from '../../../src/quantity/convert.js';
import { ratio } from '../../../src/quantity/ratio.js';

const MILLI = ratio(1, 1000);

describe('conversion', () => {
  it('divides by whole powers of ten, so that 70 mm is the number 0.07', () => {
    for (let count = 1; count <= 3000; count += 1) expect(toSI(count, MILLI)).toBe(Number(`${count}e-3`));
    expect(fromSI(0.07, MILLI)).toBe(70);
  });

  it('gives no negative zero', () => {
    expect(Object.is(toSI(-0, MILLI), 0)).toBe(true);
    expect(Object.is(fromSI(-0, MILLI), 0)).toBe(true);
  });
});
