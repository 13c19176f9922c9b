import { describe, expect, it } from 'vitest';
import { readRemembered } from '../../../renderer/job/remembered.js';
import { smallJob } from '../window.js';

describe('readRemembered', () => {
  it('finds what was remembered', () => {
    const state = {
      version: 1,
      job: smallJob(),
      sound: smallJob({ title: 'before' }),
      settings: { theme: 'blueprint', units: 'US' },
    };
    expect(readRemembered(state)).toEqual(state);
  });

  it('takes the job for the sound one, and the usual settings, where these make no sense', () => {
    const job = smallJob();
    expect(readRemembered({ version: 1, job, sound: 3, settings: { theme: 'pink', units: 7 } })).toEqual({
      version: 1,
      job,
      sound: job,
      settings: { theme: 'paper', units: 'SI' },
    });
  });

  it.each([null, 'text', {}, { version: 2, job: smallJob() }, { version: 1, job: { format: 'other' } }])(
    'finds nothing of use in %j',
    (state) => {
      expect(readRemembered(state)).toBeNull();
    },
  );
});
