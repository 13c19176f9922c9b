import type { Job } from '../job/job.js';
import type { Metal } from '../material/material.js';
import type { Candidate, LimitId } from '../report/report.js';
import { PASS } from './problem.js';
import { solve } from './solve.js';
import type { Size } from './stock.js';
import type { MapPoint } from './mapScale.js';

/** A limit is full above this utilisation. */
const FULL = 0.999;

/** Limits on the sizes themselves: where one of them is full the optimum would lie elsewhere without it. */
const ENVELOPE: readonly LimitId[] = ['outer-diameter', 'bore', 'wall-min', 'diameter-to-wall'];

/** Where the optimum would lie without one limit of the envelope. */
export interface Without {
  readonly limit: LimitId;
  readonly size: Size;
}

/** The sizes that a map is drawn about. */
export interface MapPoints {
  /** null where nothing fits */
  readonly optimum: Size | null;
  /** limits that are full at the optimum */
  readonly full: readonly LimitId[];
  /** null where no limit of the envelope is full, or nothing is gained */
  readonly without: Without | null;
  /** limits that cannot be met together; empty where something fits */
  readonly conflict: readonly LimitId[];
  /** for each of those, the lightest size that meets all but it, where there is one */
  readonly instead: readonly MapPoint[];
}

/** The sizes that a map of this metal is drawn about, from what the report says of it. */
export function mapPoints(job: Job, metal: Metal, { design, limits, noFit }: Candidate): MapPoints {
  const conflict = noFit?.conflict ?? [];
  if (design === null) {
    const instead = conflict.flatMap((limit) => solve(job, metal, { lifted: new Set([limit]) }).size ?? []);
    return { optimum: null, full: [], without: null, conflict, instead };
  }
  const { outerDiameter, wall, mass } = design;
  const full = [...new Set(limits.filter(({ utilisation }) => utilisation > FULL).map(({ limit }) => limit))];
  const optimum = { outerDiameter, wall, mass, pricePerMetre: null };
  return { optimum, full, without: withoutEnvelope(job, metal, optimum, full), conflict, instead: [] };
}

/** Of the full limits of the envelope the one whose absence saves most. */
function withoutEnvelope(job: Job, metal: Metal, optimum: Size, full: readonly LimitId[]): Without | null {
  return ENVELOPE.filter((limit) => full.includes(limit)).reduce<Without | null>((best, limit) => {
    const { size } = solve(job, metal, { lifted: new Set([limit]) }, { start: optimum });
    if (size === null || size.mass >= (best?.size ?? optimum).mass * (1 - 1e3 * PASS)) return best;
    return { limit, size };
  }, null);
}
