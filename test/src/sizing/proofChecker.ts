import { fullest, massOf } from '../../reference/limits.js';
import type { Task } from './jobs.js';

/** "No size in this box passes every limit and weighs less than `under`"; m, kg. */
export interface ProofBox {
  readonly outerLo: number;
  readonly outerHi: number;
  readonly wallLo: number;
  readonly wallHi: number;
  readonly under: number;
}

/** What the search claims, and every box on which the claim rests. */
export interface Proof {
  readonly boxes: readonly ProofBox[];
  readonly found: { readonly outerDiameter: number; readonly wall: number; readonly value: number } | null;
  readonly lowerBound: number;
}

/** All sizes that a search must speak of, m. */
export const DOMAIN = { outerLo: 2e-6, outerHi: 100, wallLo: 1e-6, wallHi: 50 } as const;

/** Relative width of a crack between boxes that is forgiven: no two tubes differ by so little. */
const HAIRLINE = 1e-9;

/** What passes in the engine's book may be this far over; the two programs' roundings stay below the difference. */
const PASSES = 0.99e-9;
const ROUNDING = 1e-12;

const wider = (lo: number, hi: number): boolean => hi > lo * (1 + HAIRLINE);

/** A strip of the domain that no box covers, in words; null where the boxes leave none. Sweeps over every edge in D. */
export function uncovered(boxes: readonly ProofBox[]): string | null {
  const edges = boxes.flatMap(({ outerLo, outerHi }) => [outerLo, outerHi]);
  const inside = edges.filter((edge) => edge > DOMAIN.outerLo && edge < DOMAIN.outerHi);
  const cuts = [...new Set([DOMAIN.outerLo, ...inside, DOMAIN.outerHi])].sort((a, b) => a - b);
  const byWall = boxes.toSorted((a, b) => a.wallLo - b.wallLo);
  for (let i = 1; i < cuts.length; i++) {
    const lo = cuts[i - 1]!;
    const hi = cuts[i]!;
    if (!wider(lo, hi)) continue;
    let reached: number = DOMAIN.wallLo;
    for (const box of byWall) {
      if (box.outerLo > lo || box.outerHi < hi) continue;
      if (wider(reached, box.wallLo)) break;
      reached = Math.max(reached, box.wallHi);
    }
    if (wider(reached, DOMAIN.wallHi)) return `no box covers D = ${lo} to ${hi} from t = ${reached}`;
  }
  return null;
}

/** A small generator of its own, so that a proof is sampled at the same places every time (Lehmer, 16807 mod 2³¹ − 1). */
function randomFrom(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 16807) % 2147483647) / 2147483647;
}

/** By how much a size fails to break the box's claim: > 0 where it fails a limit or weighs enough, as a logarithm. */
type Excuse = (x: number, y: number) => number;

function excuseOf({ job, metal }: Task, under: number): Excuse {
  return (x, y) => {
    const D = Math.exp(x);
    const t = Math.exp(y);
    const over = Math.log(fullest(job, metal, D, t)) - PASSES;
    const heavy = under === Infinity || D <= 2 * t ? -Infinity : Math.log(massOf(job, metal, D, t) / under) + ROUNDING;
    return Math.max(over, heavy);
  };
}

/** Moves of the pattern search, and where each looks. */
const MOVES = 24;
const AROUND = [-1, 0, 1].flatMap((i) => [-1, 0, 1].map((j) => [i, j] as const));

interface Place {
  x: number;
  y: number;
  excuse: number;
}

/**
 * The worst place in a box: of a grid with edges and corners, and of random places, the one with the least excuse, from
 * which a pattern search (Hooke & Jeeves' exploratory moves, halving) goes on downhill without leaving the box.
 */
function worstPlace(box: ProofBox, excuse: Excuse, per: number, random: () => number): Place {
  const x0 = Math.log(box.outerLo);
  const w = Math.log(box.outerHi) - x0;
  const y0 = Math.log(box.wallLo);
  const h = Math.log(box.wallHi) - y0;
  const worst: Place = { x: x0, y: y0, excuse: Infinity };
  const look = (u: number, v: number): boolean => {
    const x = x0 + Math.min(1, Math.max(0, u)) * w;
    const y = y0 + Math.min(1, Math.max(0, v)) * h;
    const value = excuse(x, y);
    if (value >= worst.excuse) return false;
    Object.assign(worst, { x, y, excuse: value });
    return true;
  };
  for (let i = 0; i <= per; i++) for (let j = 0; j <= per; j++) look(i / per, j / per);
  for (let i = 0; i < 2 * per; i++) look(random(), random());
  for (let moves = 0, step = 0.5 / per; moves < MOVES && worst.excuse > 0; moves++) {
    const u = w > 0 ? (worst.x - x0) / w : 0;
    const v = h > 0 ? (worst.y - y0) / h : 0;
    if (!AROUND.some(([i, j]) => look(u + i * step, v + j * step))) step /= 2;
  }
  return worst;
}

function flawOfBox(box: ProofBox, excuse: Excuse, per: number, random: () => number): string | null {
  const { x, y, excuse: least } = worstPlace(box, excuse, per, random);
  if (least > 0) return null;
  return `${Math.exp(x)} × ${Math.exp(y)} passes and weighs under ${box.under}`;
}

function flawsOfClaim({ boxes, found, lowerBound }: Proof, { job, metal }: Task): string[] {
  const flaws: string[] = [];
  const weakest = Math.min(...boxes.map(({ under }) => under));
  if (!(lowerBound <= weakest)) flaws.push(`the bound ${lowerBound} is over what the boxes show, ${weakest}`);
  if (found === null) return lowerBound === Infinity ? flaws : [...flaws, 'nothing was found, and nothing proved'];
  const { outerDiameter, wall, value } = found;
  const mass = massOf(job, metal, outerDiameter, wall);
  const U = fullest(job, metal, outerDiameter, wall);
  if (!(Math.abs(mass / value - 1) < ROUNDING)) flaws.push(`the mass is ${mass}, not ${value}`);
  if (!(U <= 1 + 1e-9 + ROUNDING)) flaws.push(`what was found does not pass: U = ${U}`);
  if (!(lowerBound <= value)) flaws.push(`the bound ${lowerBound} is over the mass ${value}`);
  if (!(value - lowerBound <= 1e-6 * value)) flaws.push(`the gap is ${1 - lowerBound / value}`);
  return flaws;
}

/**
 * Reads a proof again, by other formulas than the search used, and says what is wrong with it; nothing where it stands.
 * @param per samples along each side of a box
 */
export function flawsOf(proof: Proof, task: Task, per = 4): string[] {
  const random = randomFrom(20261);
  const hole = uncovered(proof.boxes);
  const broken = proof.boxes.map((box) => flawOfBox(box, excuseOf(task, box.under), per, random));
  return [...flawsOfClaim(proof, task), hole, ...broken].filter((flaw) => flaw !== null);
}
