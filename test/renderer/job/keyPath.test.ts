import { describe, expect, it } from 'vitest';
import { documentOf, sameValue, valueAt, withValue } from '../../../renderer/job/keyPath.js';

const JOB = { title: 'a', tube: { length: '1 m' }, loads: [{ name: 'one' }, { name: 'two' }] };

describe('valueAt', () => {
  it('walks objects and lists, and finds nothing where nothing stands', () => {
    expect(valueAt(JOB, 'loads.1.name')).toBe('two');
    expect(valueAt(JOB, 'loads.2.name')).toBeUndefined();
    expect(valueAt(JOB, 'tube.length.unit')).toBeUndefined();
    expect(valueAt(JOB, 'constructor')).toBeUndefined();
    expect(valueAt(JOB, '')).toBe(JOB);
  });
});

describe('withValue', () => {
  it('changes one value, shares the rest, and leaves the old document as it was', () => {
    const next = withValue(JOB, { path: 'loads.0.name', value: 'first' });
    expect(next).toEqual({ ...JOB, loads: [{ name: 'first' }, { name: 'two' }] });
    expect(next['tube']).toBe(JOB.tube);
    expect(JOB.loads[0]).toEqual({ name: 'one' });
  });

  it('makes the objects on its way, and keeps the order of keys', () => {
    expect(withValue(JOB, { path: 'speed.max', value: '3 rpm' })['speed']).toEqual({ max: '3 rpm' });
    expect(Object.keys(withValue(JOB, { path: 'title', value: 'b' }))).toEqual(['title', 'tube', 'loads']);
  });

  it('takes out a key, an entry of a list, and nothing where nothing stands', () => {
    expect(withValue(JOB, { path: 'tube.length', value: undefined })['tube']).toEqual({});
    expect(withValue(JOB, { path: 'loads.0', value: undefined })['loads']).toEqual([{ name: 'two' }]);
    expect(withValue(JOB, { path: 'pick', value: undefined })).toEqual(JOB);
  });

  it('puts an entry behind the last of a list', () => {
    const next = withValue(JOB, { path: 'loads.2', value: { name: 'three' } });
    expect(valueAt(next, 'loads.2.name')).toBe('three');
  });
});

describe('sameValue', () => {
  it('compares what JSON values say, whatever the order of keys', () => {
    expect(sameValue({ a: 1, b: [1, { c: 2 }] }, { b: [1, { c: 2 }], a: 1 })).toBe(true);
    expect(sameValue([1, 2], [1])).toBe(false);
    expect(sameValue({ a: 1 }, { b: 1 })).toBe(false);
    expect(sameValue({ a: undefined }, {})).toBe(false);
    expect(sameValue([], {})).toBe(false);
  });
});

describe('documentOf', () => {
  it('takes objects, and nothing else', () => {
    expect(documentOf(JOB)).toBe(JOB);
    for (const other of [null, [], 'text', 3]) expect(documentOf(other)).toEqual({});
  });
});
