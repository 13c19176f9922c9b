import { describe, expect, it } from 'vitest';
import { newReading } from '../../../src/material/reading.js';
import { collectRow } from '../../../src/material/stockRow.js';

function read(entry: unknown): { row: unknown; messages: string[]; units: object } {
  const reading = newReading();
  const row = collectRow(entry, 's.0', reading);
  return { row, messages: reading.problems.map(({ message }) => message), units: reading.units };
}

describe('a stock row', () => {
  it('is a tube', () => {
    expect(read({ outerDiameter: '2 in', wall: '1.5 mm', pricePerMetre: 9.5, gauge: 'BWG 17' })).toEqual({
      row: { outerDiameter: 0.0508, wall: 0.0015, pricePerMetre: 9.5 },
      messages: [],
      units: { 's.0.outerDiameter': 'in', 's.0.wall': 'mm' },
    });
  });

  it('or a mandrel', () => {
    expect(read({ bore: '40 mm' })).toEqual({ row: { bore: 0.04 }, messages: [], units: { 's.0.bore': 'mm' } });
  });

  it.each([
    [
      { outerDiameter: '50 mm', wall: '25 mm' },
      ['s.0.wall: "25 mm" leaves no bore; expected a wall under half of outerDiameter'],
    ],
    [
      { outerDiameter: '50 mm', wal: '2 mm' },
      [
        's.0.wal: "wal" is not a key of a stock size; expected "wall"',
        's.0.wall: is missing; expected a length from 0.001 mm to 100 m, such as "50 mm"',
      ],
    ],
    [
      { outerDiameter: '-50 mm', wall: 2 },
      [
        's.0.outerDiameter: "-50 mm" is out of range; expected a length from 0.001 mm to 100 m, such as "50 mm"',
        's.0.wall: 2 has no unit; expected a length such as "1.4 m"',
      ],
    ],
    [
      { outerDiameter: '50 mm', wall: '2 mm', pricePerMetre: '9' },
      ['s.0.pricePerMetre: "9" is not a number; expected a number from 0 to 1000000000'],
    ],
    [
      { outerDiameter: '50 mm', wall: '2 mm', gauge: 16 },
      ['s.0.gauge: 16 is not text; expected text of 1 to 40 characters'],
    ],
    [{ bore: '4 mm', wall: '1 mm' }, ['s.0.wall: "wall" is not a key of a mandrel; expected one of bore, gauge']],
    [null, ['s.0: null is not an object; expected a stock size']],
  ])('is refused: %j', (entry, messages) => {
    expect(read(entry).messages).toEqual(messages);
  });
});
