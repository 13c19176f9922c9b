import { beforeEach, describe, expect, it } from 'vitest';
import type { useJob } from '../../../renderer/stores/job.js';
import { begin, smallJob } from '../window.js';

let job: ReturnType<typeof useJob>;
beforeEach(() => {
  job = begin();
});

describe('the job', () => {
  it('begins sound, with what ships beside it, and nothing to undo', () => {
    expect(job.sound).toBe(true);
    expect(job.problems).toEqual([]);
    expect(job.lastSound?.brief.job.loads[0]?.torque).toBe(900);
    expect(job.library.get('al-6061-t6')?.family).toBe('aluminium');
    expect(job.records.get('al-6061-t6')?.['density']).toBe('0.098 lb/in³');
    expect(job.stockLists.has('metric-precision')).toBe(true);
    expect(job.canUndo || job.canRedo).toBe(false);
  });

  it('holds what was entered, and reads it with the engine', () => {
    job.edit('loads.0.torque', '1 kN*m');
    expect(job.at('loads.0.torque')).toBe('1 kN*m');
    expect(job.lastSound?.brief.job.loads[0]?.torque).toBe(1000);
  });

  it('tells mistakes by their key path, and keeps the last sound brief meanwhile', () => {
    const before = job.lastSound;
    job.edit('loads.0.torque', '9 mm');
    expect(job.sound).toBe(false);
    expect(job.problemAt('loads.0.torque')?.message).toContain('is a length');
    expect(job.problemAt('tube.length')).toBeNull();
    expect(job.lastSound).toBe(before);
    job.edit('loads.0.torque', '9 N·m');
    expect(job.lastSound?.document).toBe(job.document);
  });

  it('undoes and redoes every edit', () => {
    const first = job.document;
    job.edit('title', 'another');
    job.editAll([
      { path: 'materials.0', value: undefined },
      { path: 'pick', value: { material: 'al-2024-t3' } },
    ]);
    job.undo();
    expect(job.document).toEqual({ ...first, title: 'another' });
    job.undo();
    expect(job.document).toBe(first);
    job.redo();
    job.redo();
    expect(job.at('pick.material')).toBe('al-2024-t3');
    expect(job.canRedo).toBe(false);
  });

  it('brings the last sound brief back with what is undone', () => {
    job.edit('loads.0.torque', '800 N·m');
    job.undo();
    expect(job.lastSound?.brief.job.loads[0]?.torque).toBe(900);
  });

  it('undoes the letters of one typing as one, and those of the next by themselves', () => {
    for (const text of ['8 N·m', '80 N·m', '800 N·m']) job.edit('loads.0.torque', text, 'first');
    job.closeGroup();
    job.edit('loads.0.torque', '700 N·m', 'first');
    job.undo();
    expect(job.at('loads.0.torque')).toBe('800 N·m');
    job.undo();
    expect(job.at('loads.0.torque')).toBe('900 N·m');
  });

  it('opens another document as one undoable edit', () => {
    const first = job.document;
    job.open(smallJob({ title: 'other', materials: ['al-7075-t6'] }));
    expect(job.lastSound?.brief.job.materials).toHaveLength(1);
    job.undo();
    expect(job.document).toBe(first);
  });

  it('foretells whether a value would be read', () => {
    const would = (value: unknown): boolean => job.wouldRead('tube.length', [{ path: 'tube.length', value }]);
    expect([would('2 m'), would('2'), would(undefined), would('5000 km')]).toEqual([true, false, false, false]);
    expect(job.at('tube.length')).toBe('1.4 m');
  });

  it('begins with a job in error on the brief that was sound before', () => {
    const other = begin(smallJob({ title: '' }));
    expect(other.lastSound).toBeNull();
    other.begin([], [], smallJob({ materials: [] }));
    expect(other.lastSound).toBeNull();
  });
});

it('keeps the sound document it began with while the first is in error', () => {
  const sound = smallJob({ title: 'sound' });
  const wrong = smallJob({ title: '' });
  job.begin(Array.from(job.records.values()), [], wrong, sound);
  expect(job.document).toBe(wrong);
  expect(job.lastSound?.document).toBe(sound);
  expect(job.canUndo).toBe(false);
});
