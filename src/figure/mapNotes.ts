import type { Label } from './figure.js';
import { isInside } from './hatch.js';
import { captionLabel, labelBox, textWidth } from './label.js';
import type { Point } from './point.js';
import type { Drafting } from './mapDrafting.js';

const LINE = 13;
const SIZE = 11;
/** Widest line where nothing fits, px. */
const WIDEST = 330;
/** Places that are tried across and down. */
const ACROSS = 24;
const DOWN = 14;

/** "every limit holds here", in the region where it has room; else nothing. */
export function regionNote(rings: readonly (readonly Point[])[], { placing }: Drafting): readonly Label[] {
  const all = rings.flat();
  if (all.length === 0) return [];
  const [left, right] = [Math.min(...all.map(({ x }) => x)), Math.max(...all.map(({ x }) => x))];
  const [top, bottom] = [Math.min(...all.map(({ y }) => y)), Math.max(...all.map(({ y }) => y))];
  const middle = { x: (left + right) / 2, y: (top + bottom) / 2 };
  return bestOf(
    grid(left, top, right, bottom).map((at) => ({ labels: lines(['every limit', 'holds here'], at), at })),
    middle,
    placing,
    (labels) => labels.flatMap(labelBox).every((corner) => isInside(corner, rings)),
  );
}

/** What is said where nothing fits: in the middle where that is free, else where it covers least. */
export function notes(texts: readonly string[], { sheet, placing }: Drafting): readonly Label[] {
  const { left, top, right, bottom } = sheet.plot;
  const middle = { x: (left + right) / 2, y: top + (bottom - top) / 4 };
  const widest = Math.min(right - left - 16, WIDEST);
  const broken = texts.flatMap((text) => wrapped(text, widest));
  const places = grid(left, top, right, bottom).map((at) => ({
    labels: lines(broken, at, { tone: 'ink', weight: 500, size: 11.5 }),
    at,
  }));
  return bestOf(places, middle, placing, (labels) => placing.fits(labels, sheet.plot));
}

function wrapped(text: string, widest: number): readonly string[] {
  const rows = [''];
  for (const word of text.split(' ')) {
    const longer = `${rows[rows.length - 1] ?? ''} ${word}`.trim();
    if (textWidth(longer, 11.5, 'sans') <= widest) rows[rows.length - 1] = longer;
    else rows.push(word);
  }
  return rows;
}

function grid(left: number, top: number, right: number, bottom: number): readonly Point[] {
  return Array.from({ length: ACROSS * DOWN }, (_, i) => ({
    x: left + ((right - left) * ((i % ACROSS) + 0.5)) / ACROSS,
    y: top + ((bottom - top) * (Math.floor(i / ACROSS) + 0.5)) / DOWN,
  }));
}

function lines(texts: readonly string[], { x, y }: Point, own: Partial<Label> = { size: SIZE }): readonly Label[] {
  return texts.map((text, line) => captionLabel(text, x, y + LINE * (line - (texts.length - 1) / 2), own));
}

interface Place {
  readonly labels: readonly Label[];
  readonly at: Point;
}

function bestOf(
  places: readonly Place[],
  middle: Point,
  placing: Drafting['placing'],
  holds: (labels: readonly Label[]) => boolean,
): readonly Label[] {
  let best: readonly Label[] = [];
  let least = Infinity;
  for (const { labels, at } of places) {
    if (!holds(labels) || !placing.fits(labels)) continue;
    const cost = 20 * placing.covered(labels) + Math.hypot(at.x - middle.x, at.y - middle.y) / 10;
    if (cost < least) [best, least] = [labels, cost];
  }
  placing.take(best);
  return best;
}
