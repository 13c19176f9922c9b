import { describe, expect, it } from 'vitest';
import { nameParts, ordinal } from '../../../renderer/pick/names.js';

describe('nameParts', () => {
  it('parts what it is from the form it comes in', () => {
    expect(nameParts('Aluminium 6061-T6, drawn tube')).toEqual({ name: 'Aluminium 6061-T6', form: 'drawn tube' });
    expect(nameParts('Steel 4130, tube, wall to 4 mm')).toEqual({ name: 'Steel 4130', form: 'tube, wall to 4 mm' });
    expect(nameParts('my steel')).toEqual({ name: 'my steel', form: '' });
  });
});

describe('ordinal', () => {
  it.each([
    [2, 'second'],
    [12, 'twelfth'],
    [13, '13th'],
    [21, '21st'],
    [32, '32nd'],
    [43, '43rd'],
  ])('%d is %j', (place, expected) => {
    expect(ordinal(place)).toBe(expected);
  });
});
