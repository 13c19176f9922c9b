import type { Job, Pick } from '../../src/job/job.js';
import type { Material } from '../../src/material/material.js';
import type { Candidate, Design, HeldResult, LimitEntry, NoFit } from '../../src/report/report.js';

/** What the line-up is made of. */
export interface LineUpResults {
  readonly job: Job;
  readonly candidates: readonly Candidate[];
  readonly held: readonly HeldResult[];
}

/** A material at its lightest, or a design in hand, in its place. */
export interface Ranked {
  readonly key: string;
  readonly pick: Pick;
  readonly material: Material;
  /** the material's name, or that of the design in hand */
  readonly name: string;
  readonly held: boolean;
  /** place by mass among those that carry the job, 1 first; null for those that do not */
  readonly rank: number | null;
  readonly design: Design | null;
  readonly limits: readonly LimitEntry[];
  readonly noFit: NoFit | null;
}

/** All places, and what they are measured against. */
export interface Ranking {
  /** by rank; designs in hand that fail after them, materials without design last */
  readonly entries: readonly Ranked[];
  /** kg: the lightest sized tube; where none fits the lightest in hand that does; null where nothing does */
  readonly lightest: number | null;
}

type Unranked = Omit<Ranked, 'rank'> & { readonly feasible: boolean };

function ofCandidate(candidate: Candidate, material: Material): Unranked {
  const { feasible, design, limits, noFit } = candidate;
  const pick = { material: material.id };
  return { key: `m ${material.id}`, pick, material, name: material.name, held: false, feasible, design, limits, noFit };
}

function ofHeld(result: HeldResult, material: Material): Unranked {
  const { name, feasible, design, limits } = result;
  return { key: `h ${name}`, pick: { held: name }, material, name, held: true, feasible, design, limits, noFit: null };
}

/** The heaviest last, and what has no mass after it; of one mass the order stays. */
function byMass(a: Unranked, b: Unranked): number {
  return (a.design?.mass ?? Infinity) - (b.design?.mass ?? Infinity) || 0;
}

/** Ranks every material and design in hand by mass. */
export function ranking({ job, candidates, held }: LineUpResults): Ranking {
  const materials = new Map(job.materials.map((material) => [material.id, material]));
  const all = [
    ...candidates.map((candidate) => ({ of: candidate.material, make: (m: Material) => ofCandidate(candidate, m) })),
    ...held.map((result) => ({ of: result.material, make: (m: Material) => ofHeld(result, m) })),
  ].flatMap(({ of, make }) => {
    const material = materials.get(of);
    return material === undefined ? [] : [make(material)];
  });
  const fit = all.filter(({ feasible }) => feasible).sort(byMass);
  const rest = all.filter(({ feasible }) => !feasible).sort(byMass);
  const entries = [...fit, ...rest].map(({ feasible, ...entry }, index) => ({
    ...entry,
    rank: feasible ? index + 1 : null,
  }));
  return { entries, lightest: (fit.find((entry) => !entry.held) ?? fit[0])?.design?.mass ?? null };
}
