// @vitest-environment happy-dom
import { mount } from '@vue/test-utils';
import { beforeEach, describe, expect, it } from 'vitest';
import FieldInput from '../../../renderer/field/FieldInput.vue';
import type { useJob } from '../../../renderer/stores/job.js';
import { useSettings } from '../../../renderer/stores/settings.js';
import { begin } from '../window.js';

let job: ReturnType<typeof useJob>;
beforeEach(() => {
  job = begin();
});

function torque() {
  const field = mount(FieldInput, { props: { path: 'loads.0.torque', kind: ['torque'], label: 'torque' } });
  const input = field.get('input');
  return { field, input, shown: () => input.element.value };
}

describe('a field', () => {
  it('shows what was entered, and in the other system what it comes to', async () => {
    const { shown, field } = torque();
    expect(shown()).toBe('900 N·m');
    useSettings().units = 'US';
    await field.vm.$nextTick();
    expect(shown()).toBe('7965.7 lbf·in');
    expect(job.at('loads.0.torque')).toBe('900 N·m');
  });

  it('keeps what was entered where it is looked at in another unit, or typed back', async () => {
    useSettings().units = 'US';
    const { input } = torque();
    await input.trigger('focus');
    await input.trigger('blur');
    await input.setValue('7965 lbf·in');
    expect(job.at('loads.0.torque')).toBe('7965 lbf·in');
    await input.setValue('7965.7 lbf·in');
    await input.trigger('blur');
    expect(job.at('loads.0.torque')).toBe('900 N·m');
    expect(job.canUndo).toBe(false);
  });

  it('puts a sound text into the job while it is typed, a wrong one only on leaving', async () => {
    const { input } = torque();
    await input.setValue('800 N·m');
    expect(job.at('loads.0.torque')).toBe('800 N·m');
    await input.setValue('800 N·m/s');
    expect(job.at('loads.0.torque')).toBe('800 N·m');
    expect(input.attributes('aria-invalid')).toBe('false');
    await input.trigger('blur');
    expect(job.at('loads.0.torque')).toBe('800 N·m/s');
    expect(input.attributes('aria-invalid')).toBe('true');
    expect(input.attributes('aria-describedby')).toBe('wrong-loads-0-torque');
  });

  it('takes what was typed at Enter, right or wrong', async () => {
    const { input } = torque();
    await input.setValue('much');
    await input.trigger('keydown', { key: 'Enter' });
    expect(job.problemAt('loads.0.torque')).not.toBeNull();
  });

  it('takes the value out when it is emptied and left, not before', async () => {
    job.edit('loads.0.axial', '-2 kN');
    const field = mount(FieldInput, {
      props: { path: 'loads.0.axial', kind: ['force'], label: 'axial', empty: 'none' },
    });
    const input = field.get('input');
    expect(input.element.value).toBe('−2 kN');
    await input.setValue('');
    expect(job.at('loads.0.axial')).toBe('-2 kN');
    await input.trigger('blur');
    expect(job.at('loads.0')).not.toHaveProperty('axial');
    expect(input.attributes('placeholder')).toBe('none');
  });

  it('puts the old text back at Escape, and leaves nothing to undo', async () => {
    const { input, shown } = torque();
    await input.setValue('800 N·m');
    await input.setValue('80');
    await input.trigger('keydown', { key: 'Escape' });
    expect(shown()).toBe('900 N·m');
    expect(job.at('loads.0.torque')).toBe('900 N·m');
    expect(job.canUndo).toBe(false);
  });

  it('is one step to undo for one typing', async () => {
    const { input } = torque();
    for (const text of ['8 N·m', '80 N·m', '800 N·m']) await input.setValue(text);
    await input.trigger('blur');
    await input.setValue('700 N·m');
    await input.trigger('blur');
    job.undo();
    expect(job.at('loads.0.torque')).toBe('800 N·m');
    job.undo();
    expect(job.at('loads.0.torque')).toBe('900 N·m');
  });

  it('forgets at undo what is typed and not taken, before any edit is undone', async () => {
    const { input, shown } = torque();
    job.edit('title', 'other');
    await input.setValue('80');
    await input.trigger('keydown', { key: 'z', ctrlKey: true });
    expect(shown()).toBe('900 N·m');
    expect(job.at('title')).toBe('other');
  });

  it('steps the last digit, tenfold with Shift', async () => {
    const { input, shown } = torque();
    await input.trigger('keydown', { key: 'ArrowUp' });
    await input.trigger('keydown', { key: 'ArrowDown', shiftKey: true });
    expect(shown()).toBe('891 N·m');
    expect(job.at('loads.0.torque')).toBe('891 N·m');
  });

  it('holds bare numbers as numbers', async () => {
    const field = mount(FieldInput, { props: { path: 'loads.0.yieldFactor', kind: 'number', label: 'yield factor' } });
    await field.get('input').setValue('1.2');
    expect(job.at('loads.0.yieldFactor')).toBe(1.2);
  });
});
