import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { job, load } from '../fixtures.js';
import { alignmentTasks } from '../../cases/cases.js';
import { HARD } from './hard.js';
import { tasks } from './jobs.js';
import { proofOf } from './proof.js';
import { flawsOf, uncovered, type Proof, type ProofBox } from './proofChecker.js';

describe('the proof of least mass', () => {
  it.each(Object.entries(HARD))('stands when read again: %s', (name, task) => {
    const proof = proofOf(task);
    expect(flawsOf(proof, task, 6)).toEqual([]);
    expect(proof.found === null).toBe(name.startsWith('nothing fits'));
  });

  it.each(alignmentTasks())('stands when read again: $name', ({ task, feasible }) => {
    const proof = proofOf(task);
    expect(flawsOf(proof, task, 8)).toEqual([]);
    expect(proof.found !== null).toBe(feasible);
  });

  it('stands when read again, whatever the job', { timeout: 60_000 }, () => {
    let fitted = 0;
    let unfit = 0;
    const stands = fc.property(tasks, (task) => {
      const proof = proofOf(task);
      if (proof.found === null) unfit++;
      else fitted++;
      expect(flawsOf(proof, task)).toEqual([]);
    });
    fc.assert(stands, { numRuns: 150, seed: 11, endOnFailure: true });
    expect(fitted).toBeGreaterThan(100);
    expect(unfit).toBeGreaterThan(10);
  });
});

describe('the reader of proofs', () => {
  const task = HARD['wall buckling alone, a smooth optimum']!;
  const proof = proofOf(task);
  const { boxes } = proof;
  const without = (i: number): readonly ProofBox[] => boxes.toSpliced(i, 1);
  const replaced = (i: number, change: Partial<ProofBox>): Proof => ({
    ...proof,
    boxes: boxes.with(i, { ...boxes[i]!, ...change }),
  });
  /** Index of a box that holds the size found. */
  const holder = boxes.findIndex(
    ({ outerLo, outerHi, wallLo, wallHi }) =>
      outerLo <= proof.found!.outerDiameter &&
      proof.found!.outerDiameter <= outerHi &&
      wallLo <= proof.found!.wall &&
      proof.found!.wall <= wallHi,
  );

  it('misses any box that is taken out', () => {
    expect(boxes.length).toBeGreaterThan(20);
    expect(uncovered(boxes)).toBeNull();
    expect(boxes.map((_, i) => i).filter((i) => uncovered(without(i)) === null)).toEqual([]);
  });

  it('misses a strip a millionth wide', () => {
    const { outerHi, wallHi } = boxes[holder]!;
    expect(uncovered(replaced(holder, { outerHi: outerHi * (1 - 1e-6) }).boxes)).not.toBeNull();
    expect(uncovered(replaced(holder, { wallHi: wallHi * (1 - 1e-6) }).boxes)).not.toBeNull();
  });

  it('refuses a box that claims more than is so', () => {
    const { under } = boxes[holder]!;
    expect(flawsOf(proof, task)).toEqual([]);
    expect(flawsOf(replaced(holder, { under: under * 1.000_01 }), task)).toHaveLength(1);
  });

  it('refuses a box grown over lighter sizes that pass, under a bound that was drawn too high', () => {
    const raised = {
      ...proof,
      boxes: boxes.map((box) => ({ ...box, under: Math.max(box.under, proof.lowerBound * 1.02) })),
    };
    expect(flawsOf(raised, task).length).toBeGreaterThan(0);
  });

  it('refuses the proof of a harder job', () => {
    const harder = { ...task, job: { ...task.job, loads: [load({ torque: 3003 })] } };
    const claimed = proofOf(harder);
    expect(flawsOf(claimed, harder)).toEqual([]);
    expect(flawsOf(claimed, task).length).toBeGreaterThan(0);
    expect(flawsOf(proof, harder).some((flaw) => flaw.includes('does not pass'))).toBe(true);
  });

  it('refuses to take "nothing fits" for proved where a box is left open, or a size fits', () => {
    const nothing = HARD['nothing fits: envelope against twist']!;
    const claimed = proofOf(nothing);
    expect(flawsOf({ ...claimed, lowerBound: 1 }, nothing)).toHaveLength(1);
    expect(flawsOf(claimed, { ...nothing, job: job({ loads: [load({ twistMax: 0.5 })] }) }).length).toBeGreaterThan(0);
  });

  it('refuses a bound over the mass, a gap too wide and a mass that is not the size’s', () => {
    const { found, lowerBound } = proof;
    expect(flawsOf({ ...proof, lowerBound: found!.value * 1.000_001 }, task).length).toBeGreaterThan(1);
    expect(flawsOf({ ...proof, lowerBound: lowerBound * (1 - 1e-6) }, task)).toHaveLength(1);
    expect(flawsOf({ ...proof, found: { ...found!, value: found!.value * (1 + 1e-9) } }, task)).toHaveLength(1);
  });
});
