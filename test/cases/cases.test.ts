import { describe, expect, it } from 'vitest';
import type { Candidate, LimitId } from '../../src/report/report.js';
import { sizeJob } from '../../src/sizing/size.js';
import { CASES, type Answer } from './cases.js';

/** U of every limit, the fullest over the loads. */
function fullestByLimit({ limits }: Candidate): Record<string, number> {
  const fullest: Partial<Record<LimitId, number>> = {};
  for (const { limit, utilisation } of limits) fullest[limit] = Math.max(fullest[limit] ?? 0, utilisation);
  return fullest;
}

function agrees(candidate: Candidate, answer: Answer): void {
  const { mass, outerDiameter, wall, governs, utilisation = {} } = answer;
  const { design, limits, noFit } = candidate;
  expect(design!.mass / mass!).toBeGreaterThan(1 - 1e-6);
  expect(design!.mass / mass!).toBeLessThan(1 + 1e-6);
  expect(Math.abs(design!.outerDiameter / outerDiameter! - 1)).toBeLessThan(1e-4);
  expect(Math.abs(design!.wall / wall! - 1)).toBeLessThan(1e-4);
  expect(noFit).toBeNull();
  const mine = fullestByLimit(candidate);
  expect(Object.keys(mine).sort()).toEqual(Object.keys(utilisation).sort());
  for (const [limit, value] of Object.entries(utilisation)) {
    expect(Math.abs(mine[limit]! - value), limit).toBeLessThan(2e-5);
  }
  expect(limits.filter((entry) => entry.governs).map(({ limit }) => limit)).toContain(governs);
}

describe.each(CASES)('alignment case $name', ({ brief, answers }) => {
  const report = sizeJob(brief);

  it('has an answer for every material', () => {
    const asked = brief.job.materials.map(({ id }) => id).sort();
    expect(answers.map(({ material }) => material).sort()).toEqual(asked);
    expect(report.candidates.map(({ material }) => material).sort()).toEqual(asked);
  });

  it.each(answers)('$material: the same tube', (answer) => {
    const candidate = report.candidates.find(({ material }) => material === answer.material)!;
    expect(candidate.feasible).toBe(answer.feasible);
    if (answer.feasible) agrees(candidate, answer);
    else expect(candidate.noFit!.conflict.length).toBeGreaterThan(0);
    expect(candidate.design === null).toBe(!answer.feasible);
  });
});
