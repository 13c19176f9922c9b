import type { Point } from '../point.js';
import { type Box, holds, nearestIn, overlaps } from './box.js';

/** A label to be placed, at the end of its line or beside its point. */
export interface Unplaced {
  readonly key: string;
  readonly at: Point;
  /** px */
  readonly width: number;
  readonly height: number;
  /** clear distance from the point, px */
  readonly gap: number;
  readonly prefers: 'right' | 'left';
  /** how far it may move before it is left out, px */
  readonly reach: number;
}

/** Where a label went; a leader from its point where it had to leave it. */
export interface Placed {
  readonly key: string;
  readonly box: Box;
  readonly leader: readonly [Point, Point] | null;
}

/** A label that has moved further than this from its place needs a leader, px. */
export const LEADER_FROM = 10;

/** Steps in which a label is moved, px, and how far aside it may go. */
const STEP_Y = 3;
const ASIDE = [0, 22, 48, 84, 130, 190];

/** What it costs, px of way, to stand on the other side of the point, and to cover one cell of lines. */
const OTHER_SIDE = 16;
const COVERED = 2.5;

/**
 * Places labels one after another, the most important first, each as near to its own place as the others, what is taken
 * and the lines under it let it. No two boxes overlap and all lie within; a label for which there is no room is left out.
 * @param crowd cells of lines that a box would cover
 */
export function placeLabels(
  labels: readonly Unplaced[],
  taken: readonly Box[],
  within: Box,
  crowd: (box: Box) => number,
): readonly Placed[] {
  const boxes = [...taken];
  const moves = { right: movesOf('right', within), left: movesOf('left', within) };
  return labels.flatMap((label) => {
    const placed = place(label, moves[label.prefers], { taken: boxes, within, crowd });
    if (placed === null) return [];
    boxes.push(placed.box);
    return [placed];
  });
}

interface Move {
  readonly dx: number;
  readonly dy: number;
  readonly side: 1 | -1;
  readonly way: number;
}

function movesOf(prefers: Unplaced['prefers'], { top, bottom }: Box): readonly Move[] {
  const reach = Math.ceil((bottom - top) / STEP_Y);
  const own = prefers === 'right' ? 1 : -1;
  const moves: Move[] = [];
  for (let step = -reach; step <= reach; step += 1)
    for (const dx of ASIDE)
      for (const side of [1, -1] as const) {
        const dy = step * STEP_Y;
        moves.push({ dx, dy, side, way: Math.hypot(dx, dy) + (side === own ? 0 : OTHER_SIDE) });
      }
  return moves.sort((a, b) => a.way - b.way);
}

function boxAt({ at, width, height, gap }: Unplaced, { dx, dy, side }: Move): Box {
  const near = at.x + side * (gap + dx);
  const [left, right] = side === 1 ? [near, near + width] : [near - width, near];
  return { left, right, top: at.y + dy - height / 2, bottom: at.y + dy + height / 2 };
}

interface Ground {
  readonly taken: readonly Box[];
  readonly within: Box;
  readonly crowd: (box: Box) => number;
}

function place(label: Unplaced, moves: readonly Move[], { taken, within, crowd }: Ground): Placed | null {
  let best: { readonly box: Box; readonly move: Move } | null = null;
  let least = Number.POSITIVE_INFINITY;
  for (const move of moves) {
    if (move.way >= Math.min(least, label.reach)) break;
    const box = boxAt(label, move);
    if (!holds(within, box) || taken.some((other) => overlaps(box, other))) continue;
    const cost = move.way + COVERED * crowd(box);
    if (cost >= least) continue;
    best = { box, move };
    least = cost;
  }
  if (best === null) return null;
  return { key: label.key, box: best.box, leader: leaderOf(label, best.box, best.move) };
}

function leaderOf({ at }: Unplaced, box: Box, { dx, dy }: Move): Placed['leader'] {
  return Math.hypot(dx, dy) > LEADER_FROM ? [at, nearestIn(box, at)] : null;
}
