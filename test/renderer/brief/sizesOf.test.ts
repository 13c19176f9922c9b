import { expect, it } from 'vitest';
import { sizesOf } from '../../../renderer/brief/sizesOf.js';

it('tells the three choices of sizes apart', () => {
  expect(sizesOf('any')).toEqual({ kind: 'any' });
  expect(sizesOf({ stock: 'metric-precision' })).toEqual({ kind: 'list', id: 'metric-precision' });
  expect(sizesOf({ stock: [{}, {}] })).toEqual({ kind: 'own', count: 2 });
});
