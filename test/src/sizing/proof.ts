import { least } from '../../../src/sizing/least.js';
import { Problem } from '../../../src/sizing/problem.js';
import type { Task } from './jobs.js';
import type { Proof, ProofBox } from './proofChecker.js';

/** The least-mass search of a task with every box that it excluded. */
export function proofOf({ job, metal }: Task): Proof {
  const boxes: ProofBox[] = [];
  const { found, lowerBound } = least(new Problem(job, metal), {
    witness: (outerLo, outerHi, wallLo, wallHi, under) => boxes.push({ outerLo, outerHi, wallLo, wallHi, under }),
  });
  return { boxes, found, lowerBound };
}
