import type { Walked } from './along.js';
import type { Label } from './figure.js';
import { captionLabel, textWidth } from './label.js';
import type { Area } from './mapSheet.js';
import type { Placing } from './placing.js';
import type { Point } from './point.js';

/** A name in its place, with a line to its curve where it had to go aside. */
export interface PlacedName {
  readonly labels: readonly Label[];
  readonly leader: readonly [Point, Point] | null;
}

/** Size of names, px. */
export const NAME_SIZE = 11.5;

/** How far a name's letters keep from its curve, px: more on the side of the strokes. */
const CLEAR = { free: 5, strokes: 8 } as const;
/** Distance between two places that are tried, px. */
const PITCH = 13;
/** Steeper than this a name is not written along its curve, degrees. */
const STEEP = 84;
/** How far aside names are tried when there is no place along the curve, px. */
const ASIDE = [20, 34, 50, 70] as const;
const DIRECTIONS = 8;
/** Height of letters over the base line and under it, in em, and the middle between. */
const RISE = 0.74;
const DROP = 0.22;
const MIDDLE = (RISE - DROP) / 2;

interface Tried {
  readonly name: PlacedName;
  readonly cost: number;
}

/** Finds the place for a curve's name: along it where there is room, else aside with a leader; null where there is none. */
export function nameCurve(
  text: string,
  pieces: readonly Walked[],
  own: Partial<Label>,
  placing: Placing,
  area: Area,
): PlacedName | null {
  const along = pieces.flatMap((piece) => alongCurve(text, piece, own));
  const aside = (): readonly Tried[] => pieces.flatMap((piece) => asideOf(text, piece, own));
  return cheapest(along, placing, area) ?? cheapest(aside(), placing, area);
}

/** The cheapest that fits. */
function cheapest(tried: readonly Tried[], placing: Placing, area: Area): PlacedName | null {
  let best: PlacedName | null = null;
  let least = Infinity;
  for (const { name, cost } of tried) {
    if (cost >= least || !placing.fits(name.labels, area)) continue;
    const whole = cost + 6 * placing.covered(name.labels);
    if (whole < least) [best, least] = [name, whole];
  }
  return best;
}

/** Every place along a piece, on either side. */
function alongCurve(text: string, piece: Walked, own: Partial<Label>): readonly Tried[] {
  const width = textWidth(text, NAME_SIZE, 'sans');
  const room = piece.length - width;
  if (room < 0) return [];
  const count = Math.floor(room / PITCH) + 1;
  return Array.from(
    { length: count },
    (_, i) => width / 2 + (count === 1 ? room / 2 : (i * room) / (count - 1)),
  ).flatMap((middle) => ([1, -1] as const).flatMap((side) => oneAlong(text, piece, middle, width, side, own)));
}

/** @param side 1 on the left as y goes up, where the strokes are */
function oneAlong(
  text: string,
  piece: Walked,
  middle: number,
  width: number,
  side: 1 | -1,
  own: Partial<Label>,
): readonly Tried[] {
  const [p, q] = [piece.at(middle - width / 2), piece.at(middle + width / 2)];
  const chord = Math.hypot(q.x - p.x, q.y - p.y);
  const [ux, uy] = [(q.x - p.x) / chord, (q.y - p.y) / chord];
  const bows = [0.25, 0.5, 0.75].map((share) => {
    const at = piece.at(middle + (share - 0.5) * width);
    return (at.x - p.x) * uy - (at.y - p.y) * ux;
  });
  // the curve may bow towards the name: it keeps clear of the whole of it
  const bow = Math.max(0, ...bows.map((one) => side * one));
  const spread = Math.max(...bows.map(Math.abs));
  const [nx, ny] = [side * uy, -side * ux];
  const clear = (side === 1 ? CLEAR.strokes : CLEAR.free) + bow;
  const steep = Math.abs(((Math.atan2(uy, ux) * 180) / Math.PI) % 180);
  const upright = steep > STEEP && steep < 180 - STEEP;
  const centre = { x: (p.x + q.x) / 2, y: (p.y + q.y) / 2 };
  const label = upright ? beside(text, centre, nx, clear, own) : leaning(text, centre, ux, uy, nx, ny, clear, own);
  return [
    {
      name: { labels: [label], leader: null },
      cost: 1.5 * spread + (upright ? uprightCost(centre, side) : levelCost(middle / piece.length, side)),
    },
  ];
}

/** Upright lines are named on the side of the strokes, high up. */
function uprightCost({ y }: Point, side: 1 | -1): number {
  return (side === 1 ? 0 : 5) + y / 40;
}

/** Others on the free side, about the middle. */
function levelCost(share: number, side: 1 | -1): number {
  return (side === 1 ? 2 : 0) + 2 * Math.abs(share - 0.5);
}

function leaning(
  text: string,
  centre: Point,
  ux: number,
  uy: number,
  nx: number,
  ny: number,
  clear: number,
  own: Partial<Label>,
): Label {
  const forward = ux < 0 || (ux === 0 && uy > 0) ? -1 : 1;
  const turn = (Math.atan2(forward * uy, forward * ux) * 180) / Math.PI;
  // whether the name stands over its curve or hangs under it, as it is read
  const over = forward * (nx * uy - ny * ux) > 0;
  const away = clear + (over ? DROP : RISE) * NAME_SIZE - (over ? DROP : 0) * NAME_SIZE;
  return captionLabel(text, centre.x + nx * away, centre.y + ny * away, { ...own, size: NAME_SIZE, turn });
}

/** Level, next to an upright line. */
function beside(text: string, { x, y }: Point, nx: number, clear: number, own: Partial<Label>): Label {
  const anchor = nx > 0 ? 'start' : 'end';
  return captionLabel(text, x + Math.sign(nx) * (clear + 3), y + MIDDLE * NAME_SIZE, {
    ...own,
    size: NAME_SIZE,
    anchor,
  });
}

/** Level places about a piece, with a leader to it. */
function asideOf(text: string, piece: Walked, own: Partial<Label>): readonly Tried[] {
  const width = textWidth(text, NAME_SIZE, 'sans');
  return piece.every(Math.max(piece.length / 12, 8)).flatMap((at) =>
    ASIDE.flatMap((away) =>
      Array.from({ length: DIRECTIONS }, (_, i) => {
        const angle = (2 * Math.PI * (i + 0.5)) / DIRECTIONS;
        const end = { x: at.x + away * Math.cos(angle), y: at.y + away * Math.sin(angle) };
        const anchor = Math.cos(angle) > 0 ? ('start' as const) : ('end' as const);
        const label = captionLabel(text, end.x + Math.sign(Math.cos(angle)) * 3, end.y + MIDDLE * NAME_SIZE, {
          ...own,
          size: NAME_SIZE,
          anchor,
        });
        const leader: readonly [Point, Point] = [{ x: at.x, y: at.y }, end];
        return { name: { labels: [label], leader }, cost: 10 + away + width / 100 };
      }),
    ),
  );
}
