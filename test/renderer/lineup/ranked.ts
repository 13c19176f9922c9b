import type { LineUpResults } from '../../../renderer/lineup/ranking.js';
import type { Candidate, HeldResult } from '../../../src/report/report.js';
import { job, metal } from '../../src/fixtures.js';
import { design, entry } from '../pick/entries.js';

const optimality = { method: 'a method', lowerBoundMass: 1, gap: 0, evaluations: 1 };

/** A material at its lightest, of this mass, kg. */
export function fitting(material: string, mass: number, own: Partial<Candidate> = {}): Candidate {
  const limits = [entry({ utilisation: 1, governs: true })];
  const rest = { relief: [], flags: [], noFit: null, optimality };
  return { material, feasible: true, design: design({ mass }), limits, ...rest, ...own };
}

/** A material that nothing fits of. */
export function unfit(material: string): Candidate {
  const ease = [
    { path: 'tube.outerDiameterMax', from: '90 mm', to: '97.9 mm' },
    { path: 'loads.0.twistMax', from: '3 deg', to: '3.92 deg' },
  ];
  const noFit = { conflict: ['twist', 'outer-diameter'] as const, ease, torqueFactor: null };
  return { ...fitting(material, 1), feasible: false, design: null, limits: [], noFit };
}

/** A design in hand, of this mass, kg. */
export function inHand(name: string, material: string, mass: number, feasible = true): HeldResult {
  const limits = [entry({ utilisation: feasible ? 0.9 : 1.34, governs: true })];
  return { name, material, feasible, design: design({ mass }), limits, flags: [] };
}

/** Results of these candidates and designs in hand, each material named after its id. */
export function results(candidates: readonly Candidate[], held: readonly HeldResult[] = []): LineUpResults {
  const ids = new Set([...candidates, ...held].map(({ material }) => material));
  const materials = [...ids].map((id) => metal({ id, name: `${id} steel, drawn tube` }));
  return { job: job({ materials }), candidates, held };
}
