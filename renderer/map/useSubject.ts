import { computed, shallowRef, watch } from 'vue';
import { mapAxes } from '../../src/figure/mapAxes.js';
import type { WallMap } from '../../src/figure/wallMap.js';
import type { Job } from '../../src/job/job.js';
import type { Metal } from '../../src/material/material.js';
import type { Candidate, HeldResult } from '../../src/report/report.js';
import { designMap } from '../../src/sizing/map.js';
import { mapPoints } from '../../src/sizing/mapPoints.js';
import type { UnitSystem } from '../../src/quantity/register.js';
import { conflictWords } from '../../src/report/noFit.js';
import { easeLines, lastResort } from '../pick/conflict.js';
import { usePick } from '../stores/pick.js';
import { useRun } from '../stores/run.js';
import { useSettings } from '../stores/settings.js';

/** What a map is drawn of: a material of a job, sized. */
export interface Subject {
  readonly job: Job;
  readonly metal: Metal;
  readonly candidate: Candidate;
  readonly held: readonly HeldResult[];
}

/** A map with its axes, as long as the subject, the units and the kind of axis stay. */
export interface Traced extends Omit<WallMap, 'isPick' | 'held'> {
  readonly subject: Subject;
  readonly axes: ReturnType<typeof mapAxes>;
}

/** How a frame is awaited. */
const nextFrame = (then: () => void): number => requestAnimationFrame(then);

/**
 * The map of the material in focus. It is traced when that, its results, the units or the kind of axis change, at most
 * once a frame; while results are awaited the last map stands.
 */
export function useSubject(isLog: () => boolean) {
  const run = useRun();
  const pick = usePick();
  const settings = useSettings();
  const traced = shallowRef<Traced | null>(null);
  let awaited: number | null = null;

  const subject = computed<Subject | null>((before) => {
    const shown = run.shown;
    const metal = shown?.job.materials.find(({ id }) => id === pick.focus);
    const candidate = shown?.candidates.find(({ material }) => material === pick.focus);
    if (shown === null || metal === undefined || candidate === undefined) return null;
    if (shown.old.has(metal.id)) return before?.metal.id === metal.id ? before : null;
    if (before !== undefined && before !== null && before.job === shown.job && before.candidate === candidate)
      return before;
    const held = shown.held.filter(({ material }) => material === metal.id);
    return { job: shown.job, metal, candidate, held };
  });

  function trace(): void {
    awaited = null;
    traced.value = subject.value === null ? null : traceOf(subject.value, settings.units, isLog());
  }

  watch([subject, () => settings.units, isLog], () => {
    if (traced.value === null) trace();
    else awaited ??= nextFrame(trace);
  });
  trace();
  return traced;
}

function traceOf(subject: Subject, system: UnitSystem, log: boolean): Traced {
  const { job, metal, candidate } = subject;
  const points = mapPoints(job, metal, candidate);
  const axes = mapAxes(
    points,
    job.tube,
    subject.held.map(({ design }) => design),
    system,
    log,
  );
  const map = designMap(job, metal, axes.window);
  return { subject, axes, map, points, metal: { metal, length: job.tube.length }, notes: notesOf(subject) };
}

/** Why nothing fits, and the least change that lets something fit. */
function notesOf({ candidate: { noFit }, job }: Subject): readonly string[] {
  if (noFit === null) return [];
  const [first] = easeLines(noFit, job);
  const change =
    first === undefined
      ? lastResort(noFit)
      : `it fits with ${first.term} ${first.ease.to} in place of ${first.ease.from}`;
  return [conflictWords(noFit), ...(change === null ? [] : [change])];
}
