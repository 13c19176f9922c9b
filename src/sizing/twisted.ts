import type { Job, LoadCase } from '../job/job.js';

/** The load cases whose twist counts: those that carry a limit on it, or all where none does. */
export function twistedLoads(job: Job): readonly LoadCase[] {
  const limited = job.loads.filter(({ torque, twistMax }) => torque !== 0 && twistMax !== null);
  return limited.length > 0 ? limited : job.loads;
}

/** The largest |T| over the load cases whose twist counts, N·m: the one that twists the tube furthest. */
export function worstTorque(job: Job): number {
  return Math.max(...twistedLoads(job).map(({ torque }) => Math.abs(torque)));
}
