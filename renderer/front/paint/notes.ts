import { END_SIZE, type EndLabel, PICK_SIZE, PICK_SIZE_BELOW, RING } from '../../../src/figure/front/labels.js';
import { BEYOND_LIMIT, LIMIT_SIZE, LIMIT_SIZE_BELOW, strokesBeside } from '../../../src/figure/front/limit.js';
import type { FrontFigure } from '../../../src/figure/front/model.js';
import type { CanvasColours } from '../colours.js';
import { write } from '../text.js';

/** The job's own limit: the line, strokes on the side that is not allowed, and what it says. */
export function paintLimit(context: CanvasRenderingContext2D, figure: FrontFigure, colours: CanvasColours): void {
  const { limit, plot } = figure;
  if (limit === null) return;
  context.strokeStyle = colours.ink;
  context.lineWidth = 1.25;
  context.setLineDash([]);
  context.beginPath();
  context.moveTo(limit.x, plot.top);
  context.lineTo(limit.x, plot.bottom);
  context.stroke();
  context.lineWidth = 0.8;
  context.stroke(new Path2D(strokesBeside(limit.x, plot.top, plot.bottom)));
  if (limit.box === null) return;
  const { left, top } = limit.box;
  const halo = colours.paper;
  write(context, limit.words, left, top + 7, {
    size: LIMIT_SIZE,
    face: 'sans',
    weight: 500,
    colour: colours.ink,
    halo,
  });
  const below = { size: LIMIT_SIZE_BELOW, face: 'sans', weight: 400, colour: colours.ink2, halo } as const;
  write(context, BEYOND_LIMIT, left, top + 22, below);
}

/** Names at the ends of lines, each with a leader where it had to move; no leader crosses a name. */
export function paintEnds(context: CanvasRenderingContext2D, ends: readonly EndLabel[], colours: CanvasColours): void {
  context.strokeStyle = colours.ink2;
  context.lineWidth = 0.8;
  context.setLineDash([]);
  context.beginPath();
  for (const { leader } of ends)
    if (leader !== null) {
      const [from, to] = leader;
      context.moveTo(from.x, from.y);
      context.lineTo(to.x, to.y);
    }
  context.stroke();
  for (const end of ends) paintEnd(context, end, colours);
}

/** The name at a line's end. */
export function paintEnd(
  context: CanvasRenderingContext2D,
  { text, box, family, strong }: EndLabel,
  colours: CanvasColours,
): void {
  write(context, text, box.left, (box.top + box.bottom) / 2, {
    size: END_SIZE,
    face: 'sans',
    weight: strong ? 600 : 400,
    colour: colours.family(family),
    halo: colours.paper,
  });
}

/** The ring about the pick and its note, tied to it by a leader that runs on between its two lines. */
export function paintPick(
  context: CanvasRenderingContext2D,
  { pick, ring }: FrontFigure,
  colours: CanvasColours,
): void {
  if (ring === null) return;
  context.strokeStyle = colours.copper;
  context.setLineDash([]);
  context.lineWidth = 1.8;
  context.beginPath();
  context.arc(ring.x, ring.y, RING, 0, 2 * Math.PI);
  context.stroke();
  if (pick === null) return;
  const { box, texts } = pick;
  const middle = (box.top + box.bottom) / 2;
  const [near, far] = box.right < ring.x ? [box.right, box.left] : [box.left, box.right];
  const angle = Math.atan2(middle - ring.y, near - ring.x);
  const copper = { face: 'mono', colour: colours.copper, halo: colours.paper } as const;
  write(context, texts[0], box.left, middle - 9, { ...copper, size: PICK_SIZE, weight: 500 });
  write(context, texts[1], box.left, middle + 9, { ...copper, size: PICK_SIZE_BELOW, weight: 400 });
  context.strokeStyle = colours.copper;
  context.lineWidth = 1;
  context.beginPath();
  context.moveTo(far, middle);
  context.lineTo(near, middle);
  context.lineTo(ring.x + RING * Math.cos(angle), ring.y + RING * Math.sin(angle));
  context.stroke();
}
