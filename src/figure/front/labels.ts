import type { Point } from '../point.js';
import type { Band } from './bands.js';
import type { Box } from './box.js';
import type { Curve } from './curve.js';
import type { TextWidth } from './textWidth.js';
import { type Placed, placeLabels, type Unplaced } from './place.js';

/** The name of a line or band at its end. */
export interface EndLabel extends Placed {
  readonly text: string;
  readonly family: string;
  /** the pick's line */
  readonly strong: boolean;
}

/** The note on the pick: its ring, and two lines of text with a leader. */
export interface PickNote {
  readonly at: Point;
  readonly box: Box;
  readonly texts: readonly [string, string];
}

export const END_SIZE = 11.5;
export const PICK_SIZE = 12;
export const PICK_SIZE_BELOW = 11;
/** Radius of the ring about the pick, px. */
export const RING = 8;

const END_HEIGHT = 14;
const END_GAP = 9;
/** A name further off than this says less than its line does under the pointer. */
const END_REACH = 100;
const PICK_GAP = 40;
const PICK_HEIGHT = 32;

/** Where the lines' names and the note on the pick may stand. */
export interface Room {
  readonly within: Box;
  readonly taken: readonly Box[];
  /** cells of lines that a box would cover */
  readonly crowd: (box: Box) => number;
}

/** Where the note on the pick goes. */
export function placePick(at: Point, texts: readonly [string, string], room: Room, width: TextWidth): PickNote | null {
  const breadth = Math.max(width(texts[0], PICK_SIZE, 'mono', 500), width(texts[1], PICK_SIZE_BELOW, 'mono', 400));
  const label: Unplaced = {
    key: 'pick',
    at,
    width: breadth,
    height: PICK_HEIGHT,
    gap: PICK_GAP,
    prefers: 'left',
    reach: Infinity,
  };
  const [placed] = placeLabels([label], room.taken, room.within, room.crowd);
  return placed === undefined ? null : { at, box: placed.box, texts };
}

interface Named {
  readonly key: string;
  readonly text: string;
  readonly family: string;
  readonly at: Point;
  readonly strong: boolean;
  /** the greater the sooner it is placed */
  readonly rank: number;
}

/** Places the names at the ends of lines and bands, the pick's first, then what nothing beats, then the lightest. */
export function placeEnds(
  curves: readonly Curve[],
  bands: readonly Band[],
  pick: string | null,
  room: Room,
  width: TextWidth,
): readonly EndLabel[] {
  const named = [...curves.flatMap((curve) => curveName(curve, pick)), ...bands.flatMap(bandName)];
  named.sort((a, b) => b.rank - a.rank || b.at.y - a.at.y);
  const byKey = new Map(named.map((name) => [name.key, name]));
  const labels = named.map(({ key, text, at, strong }): Unplaced => ({
    key,
    at,
    width: width(text, END_SIZE, 'sans', strong ? 600 : 400),
    height: END_HEIGHT,
    gap: END_GAP,
    prefers: 'right',
    reach: END_REACH,
  }));
  return placeLabels(labels, room.taken, room.within, room.crowd).flatMap((placed) => {
    const name = byKey.get(placed.key);
    return name === undefined ? [] : [{ ...placed, text: name.text, family: name.family, strong: name.strong }];
  });
}

function curveName({ material, name, mark, points, folded }: Curve, pick: string | null): Named[] {
  const end = points.at(-1);
  if (end === undefined || folded) return [];
  const strong = material === pick;
  const rank = strong ? 2 : Number(points.some(({ point }) => !point.dominated));
  return [{ key: material, text: name, family: mark.family, at: { x: end.x, y: end.y }, strong, rank }];
}

function bandName({ family, count, lightest }: Band): Named[] {
  const at = lightest.at(-1);
  return at === undefined
    ? []
    : [{ key: `family ${family}`, text: `${family}, ${String(count)}`, family, at, strong: false, rank: 3 }];
}
