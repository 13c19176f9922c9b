import { formatQuantity } from '../quantity/format.js';
import { shownUnit, type UnitSystem } from '../quantity/register.js';
import type { Without } from '../sizing/mapPoints.js';
import { sizeTexts } from './decimals.js';
import type { Label } from './figure.js';
import { captionLabel } from './label.js';
import { type Point, polyline } from './point.js';
import type { Drafting, Part } from './mapDrafting.js';

const RADIUS = 3.6;
const SIZE = 11;
const LINE = 13;
const DISTANCES = [26, 42, 60, 82, 106] as const;
const DIRECTIONS = 16;

/** An open circle where the optimum would lie without the limit of the envelope that governs, and a note that says so. */
export function withoutNote(without: Without | null, { sheet, system, placing }: Drafting): Part {
  if (without === null || !sheet.holds(sheet.at(without.size))) return { shapes: [], labels: [] };
  const at = sheet.at(without.size);
  placing.block({
    left: at.x - RADIUS - 2,
    top: at.y - RADIUS - 2,
    right: at.x + RADIUS + 2,
    bottom: at.y + RADIUS + 2,
  });
  const ring = { kind: 'circle', ...at, r: RADIUS, line: 'ink2', fill: 'paper', width: 1.2 } as const;
  const texts = textsOf(without, system);
  const best = placesAbout(at)
    .map((place) => ({ ...place, labels: noteAt(texts, place) }))
    .filter(({ labels }) => placing.fits(labels))
    .map((place) => ({
      ...place,
      cost: 5 * placing.covered(place.labels) + 4 * placing.crossed(at, place.end) + place.away / 6,
    }))
    .sort((a, b) => a.cost - b.cost)[0];
  if (best === undefined) return { shapes: [ring], labels: [] };
  placing.take(best.labels);
  const length = Math.hypot(best.end.x - at.x, best.end.y - at.y);
  const from = { x: at.x + ((best.end.x - at.x) * RADIUS) / length, y: at.y + ((best.end.y - at.y) * RADIUS) / length };
  return {
    shapes: [{ kind: 'path', d: polyline([from, best.end]), line: 'ink2', width: 0.8 }, ring],
    labels: best.labels,
  };
}

function textsOf({ size }: Without, system: UnitSystem): readonly string[] {
  const [outer = ''] = sizeTexts([size.outerDiameter], 'outerDiameter', system);
  const [wall = ''] = sizeTexts([size.wall], 'wall', system);
  const mass = formatQuantity(size.mass, 'mass', shownUnit('mass', system), { decimals: 3 });
  return ['without this limit', `${outer} × ${wall}, ${mass}`];
}

interface Place {
  readonly end: Point;
  /** where the note lies from the end of its leader: −1 left of it, 1 right, 0 over or under it */
  readonly side: -1 | 0 | 1;
  readonly under: boolean;
  readonly away: number;
}

function placesAbout({ x, y }: Point): readonly Place[] {
  return DISTANCES.flatMap((away) =>
    Array.from({ length: DIRECTIONS }, (_, i) => (2 * Math.PI * (i + 0.5)) / DIRECTIONS).flatMap((angle) => {
      const end = { x: x + away * Math.cos(angle), y: y + away * Math.sin(angle) };
      const under = Math.sin(angle) > 0;
      return ([0, Math.cos(angle) > 0 ? 1 : -1] as const).map((side) => ({ end, side, under, away }));
    }),
  );
}

/** Two lines at the end of the leader. */
function noteAt(texts: readonly string[], { end: { x, y }, side, under }: Place): readonly Label[] {
  const anchor = side === 0 ? 'middle' : side > 0 ? 'start' : 'end';
  const first = side === 0 ? (under ? 11 : -4 - LINE) : -2;
  return texts.map((text, line) => captionLabel(text, x + 4 * side, y + first + LINE * line, { anchor, size: SIZE }));
}
