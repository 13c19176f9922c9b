import { describe, expect, it, onTestFinished } from 'vitest';
import type { Desk, Refusal, SizeUpdate } from '../../../main/contract.js';
import { readJob, sizeJob, type Report } from '../../../src/index.js';
import { loadLibrary } from '../../../main/files/library.js';
import { jobOf, loadCases, metals } from '../solver/jobs.js';
import { temporaryFolder } from '../temporary.js';
import { RefusedCall } from './refusedCall.js';

/** A host as the suite sees it: the desk through its client, and its end. */
export interface Hosted {
  readonly desk: Desk;
  close(): Promise<void>;
}

/** Opens a host over the app's own folder. */
export type OpenHosted = (folder: string) => Promise<Hosted>;

async function refusalOf(call: Promise<unknown>): Promise<Refusal | null> {
  try {
    await call;
    return null;
  } catch (error) {
    return error instanceof RefusedCall ? error.refusal : null;
  }
}

/** What the engine itself answers, as it looks after crossing as JSON. */
async function expectedReport(job: unknown): Promise<unknown> {
  const library = await loadLibrary();
  const read = readJob(job, library.materials, library.stock);
  return JSON.parse(JSON.stringify(read.ok ? sizeJob(read.brief) : null));
}

/** What both hosts must do alike. */
export function testContract(name: string, openHosted: OpenHosted): void {
  async function open(folder = temporaryFolder()): Promise<Desk> {
    const hosted = await openHosted(folder);
    onTestFinished(() => hosted.close());
    return hosted.desk;
  }
  /** A run of 40 materials and 30 load cases, and its first update. */
  async function longRun(desk: Desk) {
    const updates: SizeUpdate[] = [];
    let followed = null;
    await new Promise((resolve) => {
      const job = jobOf({ materials: metals(40), loads: loadCases(30) });
      followed = desk.follow('size', { job }, (update) => {
        updates.push(update);
        resolve(null);
      });
    });
    return { updates, followed: followed as ReturnType<Desk['follow']> | null };
  }

  describe(`the contract through ${name}`, () => {
    it('begins with what is shipped, and remembers nothing at first', async () => {
      const { version, records, stockLists, demos, remembered } = await (await open()).ask('begin', null);
      expect(version).toMatch(/^\d+\.\d+\.\d+$/);
      expect(records.length).toBeGreaterThan(20);
      expect(stockLists.length).toBe(3);
      expect(demos[0]).toMatchObject({ format: 'wringwall-job', number: 'DEMO-1' });
      expect(demos).toHaveLength(3);
      expect(remembered).toBeNull();
    });

    it('remembers a state, also for the next start', async () => {
      const folder = temporaryFolder();
      const state = { theme: 'blueprint', job: jobOf(), list: [1, null, 'é · 2'] };
      const first = await open(folder);
      await first.ask('remember', { theme: 'paper' });
      expect(await first.ask('remember', state)).toBeNull();
      expect((await first.ask('begin', null)).remembered).toEqual(state);
      expect((await (await open(folder)).ask('begin', null)).remembered).toEqual(state);
    });

    it('keeps the last of many states that come at once', async () => {
      const desk = await open();
      await Promise.all(Array.from({ length: 20 }, (_, edit) => desk.ask('remember', { edit })));
      expect((await desk.ask('begin', null)).remembered).toEqual({ edit: 19 });
    });

    it('streams a run and ends it with the report of the engine', async () => {
      const desk = await open();
      const updates: SizeUpdate[] = [];
      const end = await desk.follow('size', { job: jobOf() }, (update) => updates.push(update)).done;
      expect(updates.filter(({ kind }) => kind === 'candidate')).toHaveLength(3);
      expect(updates[0]).toMatchObject({ kind: 'progress', done: 0, of: 3 });
      expect(end).toEqual({ kind: 'report', report: await expectedReport(jobOf()) });
    });

    it('streams the fronts of a run, material by material', async () => {
      const updates: SizeUpdate[] = [];
      const end = await (await open()).follow('size', { job: jobOf() }, (update) => updates.push(update)).done;
      const fronts = updates.flatMap((update) => (update.kind === 'front' ? [update] : []));
      const points = end.kind === 'report' ? end.report.front.points : [];
      expect(fronts.map(({ material }) => material)).toEqual(jobOf()['materials']);
      const own = fronts.flatMap((front) => front.points);
      expect(points).toMatchObject(own);
      expect(own.some((point) => 'dominated' in point)).toBe(false);
      expect(points.length).toBeGreaterThan(100);
    });

    it('checks a tube as a design in hand is checked, and lets a run go on', async () => {
      const desk = await open();
      const tube = { material: 'steel-4130-n', outerDiameter: 0.08, wall: 0.0031 };
      const hold = [{ name: 'own', material: tube.material, outerDiameter: '80 mm', wall: '3.1 mm' }];
      const { followed } = await longRun(desk);
      const answer = await desk.ask('check', { job: jobOf(), ...tube });
      const report = (await expectedReport(jobOf({ hold }))) as Report;
      const { name, ...check } = report.held[0] ?? { name: '' };
      expect(name).toBe('own');
      expect(answer).toEqual({ kind: 'checked', check });
      followed?.stop();
      expect(await followed?.done).toEqual({ kind: 'stopped' });
    });

    it('checks nothing of a wrong job, nor of a material that the job has not', async () => {
      const desk = await open();
      const tube = { material: 'steel-4130-n', outerDiameter: 0.08, wall: 0.003 };
      const answer = await desk.ask('check', { job: jobOf({ tube: {} }), ...tube });
      expect(answer).toMatchObject({ kind: 'refused', problems: [{ path: 'tube.length' }] });
      const unknown = desk.ask('check', { job: jobOf(), ...tube, material: 'al-2024-t3' });
      expect(await refusalOf(unknown)).toMatchObject({ code: 'bad-arguments' });
      const solid = desk.ask('check', { job: jobOf(), ...tube, wall: 0.04 });
      expect(await refusalOf(solid)).toMatchObject({ code: 'bad-arguments' });
    });

    it('supersedes a run by a later one', async () => {
      const desk = await open();
      const { updates, followed } = await longRun(desk);
      const later = desk.follow('size', { job: jobOf() }, () => undefined);
      expect(await followed?.done).toEqual({ kind: 'superseded' });
      const heard = updates.length;
      expect(await later.done).toMatchObject({ kind: 'report', report: { candidates: { length: 3 } } });
      expect(updates).toHaveLength(heard);
    });

    it('stops a run, and sizes the next', async () => {
      const desk = await open();
      const { followed } = await longRun(desk);
      followed?.stop();
      expect(await followed?.done).toEqual({ kind: 'stopped' });
      expect((await desk.follow('size', { job: jobOf() }, () => undefined).done).kind).toBe('report');
    });

    it('ends the run of a wrong job with its mistakes', async () => {
      const end = await (await open()).follow('size', { job: jobOf({ tube: {} }) }, () => undefined).done;
      expect(end).toMatchObject({ kind: 'refused', problems: [{ path: 'tube.length' }] });
    });

    it.each([null, 'job', [], {}, { job: jobOf(), more: 1 }])('refuses to size %j', async (args) => {
      const followed = (await open()).follow('size', args as never, () => undefined);
      expect(await refusalOf(followed.done)).toMatchObject({ code: 'bad-arguments' });
    });

    it.each([{}, 1, 'null'])('refuses to begin with %j', async (args) => {
      expect(await refusalOf((await open()).ask('begin', args as never))).toMatchObject({ code: 'bad-arguments' });
    });

    it('refuses to remember more than 4 MB, and keeps what it had', async () => {
      const desk = await open();
      await desk.ask('remember', 'before');
      expect(await refusalOf(desk.ask('remember', 'x'.repeat(4_000_000)))).toMatchObject({ code: 'too-large' });
      expect((await desk.ask('begin', null)).remembered).toBe('before');
    });

    it('refuses what is nested deeper than any state is', async () => {
      let deep: unknown = 1;
      for (let level = 0; level < 100; level++) deep = [deep];
      expect(await refusalOf((await open()).ask('remember', deep))).toMatchObject({ code: 'bad-arguments' });
    });
  });
}
