import type { Job, LoadCase, TubeSpec } from '../../src/job/job.js';
import type { Metal } from '../../src/material/material.js';
import type { Design, HeldResult, LimitEntry, LimitId } from '../../src/report/report.js';
import { job, load, metal } from '../src/fixtures.js';
import type { Engine } from './engine.js';

/** All that a row says of its job; SI. What it does not say is a steel of round numbers. */
export interface Question {
  readonly tube?: Partial<TubeSpec>;
  readonly load?: Partial<LoadCase>;
  readonly metal?: Partial<Metal>;
  /** running speed, rad/s */
  readonly speed?: number;
  readonly margin?: number;
  readonly torsionKnockdown?: number;
}

/** A tube in hand, and the job it is to do. */
export interface Held extends Question {
  readonly outerDiameter: number;
  readonly wall: number;
}

/** A metal that never yields, so that a wall's elastic buckling shows. */
export const ELASTIC: Partial<Metal> = {
  tensileYield: 1e15,
  tensileUltimate: 1e15,
  shearYield: 1e15,
  shearUltimate: 1e15,
  compressiveYield: 1e15,
};

export function jobOf({ tube, load: own, speed, margin, torsionKnockdown }: Question): Job {
  const length = tube?.length ?? 1;
  return job({
    tube: { ...job().tube, supportSpacing: length, ...tube },
    loads: [load({ ultimateFactor: 1, bucklingFactor: 1, ...own })],
    speed: speed === undefined ? null : { max: speed, margin: margin ?? 1 },
    buckling: { torsionKnockdown: torsionKnockdown ?? 1, method: 'formula' },
  });
}

/** The engine's report on a tube in hand; its list of sizes is that one tube, so that there is nothing to search. */
function inHand(engine: Engine, held: Held): HeldResult {
  const { outerDiameter, wall } = held;
  const record = metal(held.metal);
  const hold = [{ name: 'in hand', material: record.id, outerDiameter, wall }];
  const sizes = { stock: [{ outerDiameter, wall, pricePerMetre: null }] };
  const job = { ...jobOf(held), materials: [record], sizes, hold };
  const [result] = engine.sizeJob({ job, units: {} }).held;
  if (result === undefined) throw new Error('The report has no design in hand.');
  return result;
}

/** What the engine's report says of a tube in hand. */
export function designInHand(engine: Engine, held: Held): Design {
  return inHand(engine, held).design;
}

/** What the engine's report says of a limit of the tube in hand, the fullest of its entries. */
export function finding(engine: Engine, limit: LimitId, held: Held): LimitEntry {
  const entries = inHand(engine, held).limits.filter((entry) => entry.limit === limit);
  const [fullest] = entries.sort((a, b) => b.utilisation - a.utilisation);
  if (fullest === undefined) throw new Error(`The report has no limit ${limit}.`);
  return fullest;
}

/** The lightest tube that the engine's report gives for one metal. */
export function lightest(engine: Engine, question: Question): Design {
  const job = { ...jobOf(question), materials: [metal(question.metal)] };
  const design = engine.sizeJob({ job, units: {} }).candidates[0]?.design;
  if (design === undefined || design === null) throw new Error('The report has no design.');
  return design;
}
