import { describe, expect, it } from 'vitest';
import type { RunNews } from '../../../main/solver/protocol.js';
import { workOn } from '../../../main/solver/work.js';
import { jobOf, metals } from './jobs.js';

/** What a worker says to a task, in a thread of the test's own; `onNews` may change the run that is wanted. */
function said(job: unknown, wantedRun: number, onNews: (news: RunNews, wanted: Int32Array) => void = () => undefined) {
  const wanted = new Int32Array(new SharedArrayBuffer(4));
  wanted[0] = wantedRun;
  const all: RunNews[] = [];
  const work = workOn({ records: [], stockLists: [], wanted: wanted.buffer }, (news) => {
    all.push(news);
    onNews(news, wanted);
  });
  work({ run: 1, job });
  return all;
}

const JOB = jobOf({ materials: metals(3) });

describe('the work', () => {
  it('ends with a report, after its updates', () => {
    const all = said(JOB, 1);
    expect(all.at(-1)).toMatchObject({ run: 1, kind: 'end', end: { kind: 'report' } });
    expect(all.slice(0, -1).every(({ kind }) => kind === 'update')).toBe(true);
  });

  it('is left at once where another run is wanted', () => {
    expect(said(JOB, 2)).toEqual([{ run: 1, kind: 'left' }]);
  });

  it('is left between two steps as soon as another run is wanted', () => {
    const all = said(JOB, 1, (news, wanted) => {
      if (news.kind === 'update' && news.update.kind === 'candidate') wanted[0] = 2;
    });
    expect(all.filter((news) => news.kind === 'update' && news.update.kind === 'candidate')).toHaveLength(1);
    expect(all.at(-1)).toEqual({ run: 1, kind: 'left' });
  });

  it('ends as refused for a wrong job', () => {
    expect(said({}, 1)).toMatchObject([{ kind: 'end', end: { kind: 'refused' } }]);
  });

  it('ends as failed where the engine throws, in one sentence without a stack', () => {
    const broken = {
      get format(): string {
        throw new Error('out of order\n    at engine.js:1:1');
      },
    };
    expect(said(broken, 1)).toEqual([
      {
        run: 1,
        kind: 'end',
        end: { kind: 'failed', sentence: 'The solver met an error of its own (out of order). The job is kept.' },
      },
    ]);
  });
});
