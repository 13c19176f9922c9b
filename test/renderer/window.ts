import { readdirSync, readFileSync } from 'node:fs';
import { createPinia, setActivePinia } from 'pinia';
import type { CheckAnswer, CheckArguments, Desk, Follows, SizeEnd, SizeUpdate } from '../../main/contract.js';
import { documentOf, type JobDocument } from '../../renderer/job/keyPath.js';
import { useJob } from '../../renderer/stores/job.js';
import { readJob } from '../../src/job/read.js';
import { buildLibrary, buildStockLists, rowsById } from '../../src/material/library.js';
import { checkDesign } from '../../src/sizing/candidate.js';
import { sizeSteps } from '../../src/sizing/size.js';

/** The JSON files of a folder of assets/, by the order of their names; tests run at the root of the tree. */
function shipped(folder: string): readonly unknown[] {
  const files = readdirSync(`assets/${folder}`).sort();
  return files.map((file): unknown => JSON.parse(readFileSync(`assets/${folder}/${file}`, 'utf8')));
}

export const RECORDS = shipped('materials');
export const LISTS = shipped('stock');
/** control surface, interconnect, tracker */
export const DEMOS = shipped('jobs').map(documentOf);

const stock = rowsById(buildStockLists(LISTS));
const library = buildLibrary(RECORDS, stock);

/** A small job of three materials, that changes may be laid over. */
export function smallJob(changes: JobDocument = {}): JobDocument {
  return {
    format: 'wringwall-job',
    version: 1,
    title: 'a shaft',
    tube: { length: '1.4 m', outerDiameterMax: '90 mm' },
    loads: [{ name: 'jam', torque: '900 N·m', twistMax: '3 deg' }],
    materials: ['al-6061-t6', 'al-2024-t3', 'steel-4130-n'],
    ...changes,
  };
}

/** A window's stores, begun with a job. */
export function begin(first: JobDocument = smallJob()): ReturnType<typeof useJob> {
  setActivePinia(createPinia());
  const job = useJob();
  job.begin(RECORDS, LISTS, first);
  return job;
}

/** What a desk answers to a check. */
function checked({ job, material, outerDiameter, wall }: CheckArguments): CheckAnswer {
  const read = readJob(job, library, stock);
  if (!read.ok) return { kind: 'refused', problems: read.problems };
  const metal = read.brief.job.materials.find(({ id }) => id === material);
  if (metal === undefined) throw new Error('The material is none of this job.');
  return { kind: 'checked', check: checkDesign(read.brief.job, metal, outerDiameter, wall) };
}

/** A run that a test leads by the hand. */
export interface LedRun {
  readonly job: JobDocument;
  readonly update: (update: SizeUpdate) => void;
  readonly end: (end: SizeEnd) => void;
  readonly fail: (error: Error) => void;
  stopped: boolean;
}

/** A desk that does only what the test says; it keeps its runs and what it is asked to remember. */
export function ledDesk(): Desk & { readonly runs: LedRun[]; readonly remembered: unknown[]; beginning: unknown } {
  const runs: LedRun[] = [];
  const remembered: unknown[] = [];
  const desk = {
    runs,
    remembered,
    beginning: null as unknown,
    ask: (name: string, args: unknown): Promise<never> => {
      if (name === 'remember') remembered.push(args);
      const begun = { version: '0', records: RECORDS, stockLists: LISTS, demos: DEMOS, remembered: desk.beginning };
      if (name === 'check') return Promise.resolve(checked(args as CheckArguments) as never);
      return Promise.resolve((name === 'begin' ? begun : null) as never);
    },
    follow: (_: string, args: Follows['size']['args'], onUpdate: (update: SizeUpdate) => void) => {
      let end: (end: SizeEnd) => void = () => undefined;
      let fail: (error: Error) => void = () => undefined;
      const done = new Promise<SizeEnd>((resolve, reject) => {
        end = resolve;
        fail = reject;
      });
      const run: LedRun = { job: documentOf(args.job), update: onUpdate, end, fail, stopped: false };
      runs.push(run);
      const stop = (): void => {
        run.stopped = true;
      };
      return { done, stop };
    },
  };
  return desk;
}

/** Every step of sizing a document, and its end, as a desk would give them. */
export function sized(document: JobDocument): { readonly updates: readonly SizeUpdate[]; readonly end: SizeEnd } {
  const read = readJob(document, library, stock);
  if (!read.ok) return { updates: [], end: { kind: 'refused', problems: read.problems } };
  const updates: SizeUpdate[] = [];
  const steps = sizeSteps(read.brief);
  for (;;) {
    const step = steps.next();
    if (step.done === true) return { updates, end: { kind: 'report', report: step.value } };
    updates.push(step.value);
  }
}

/** A desk that sizes at once. */
export function quickDesk(): ReturnType<typeof ledDesk> {
  const led = ledDesk();
  return {
    ...led,
    follow: (name, args, onUpdate) => {
      const followed = led.follow(name, args, onUpdate);
      const { updates, end } = sized(documentOf(args.job));
      for (const update of updates) onUpdate(update);
      led.runs.at(-1)?.end(end);
      return followed;
    },
  };
}
