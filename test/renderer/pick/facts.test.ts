import { describe, expect, it } from 'vitest';
import { facts, massTexts } from '../../../renderer/pick/facts.js';
import { design, entry } from './entries.js';

describe('facts', () => {
  it('says twist, stiffness and energy, and the cost where there is one', () => {
    expect(facts(design({ cost: 15.561 }), [], 'EUR', 'SI')).toEqual([
      { term: 'twist', value: '3.00 deg' },
      { term: 'stiffness', value: '300 N·m/deg' },
      { term: 'strain energy', value: '23.6 J' },
      { term: 'cost', value: '€ 15.56' },
    ]);
  });

  it('says the least first whirl speed, where the job runs at all', () => {
    const whirl = (capacity: number) => entry({ limit: 'whirl', unit: 'rad/s', capacity });
    expect(facts(design(), [whirl(800), whirl(793.4616)], null, 'SI')).toContainEqual({
      term: 'first whirl',
      value: '7577 rpm',
    });
    expect(facts(design(), [entry()], null, 'SI').some(({ term }) => term === 'first whirl')).toBe(false);
  });

  it('follows the units', () => {
    const values = facts(design(), [], null, 'US').map(({ value }) => value);
    expect(values).toEqual(['3.00 deg', '2655 lbf·in/deg', '17.4 ft·lbf']);
  });
});

describe('massTexts', () => {
  it('gives the mass and the mass of a metre, or of a foot', () => {
    expect(massTexts(design(), 1.4, 'SI')).toEqual({ number: '1.729', unit: 'kg', perLength: '1.235 kg per metre' });
    expect(massTexts(design(), 1.4, 'US')).toEqual({ number: '3.812', unit: 'lb', perLength: '0.8299 lb per foot' });
  });
});
