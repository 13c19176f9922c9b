import { brokenDimension, GAP_MARGIN } from './dimension.js';
import type { Label, Shape } from './figure.js';
import { CAPTION_SIZE, dimensionLabel, textWidth } from './label.js';
import type { Point } from './point.js';
import { boreText, type Scaled } from './sectionSheet.js';

/** The bore's dimension lies at this angle, its figure in the lower left half. */
const BORE_TURN = -38;

/** A point on the bore's dimension, so far from the middle: to the upper right where positive. */
function onBore({ sheet: { middle } }: Scaled, distance: number): Point {
  const angle = (BORE_TURN * Math.PI) / 180;
  return { x: middle.x + distance * Math.cos(angle), y: middle.y + distance * Math.sin(angle) };
}

function boreGap(drawing: Scaled): number {
  return textWidth(boreText(drawing), CAPTION_SIZE, 'mono') + GAP_MARGIN;
}

/** Whether the bore's figure has room between the middle and the arrowhead; where not, a caption says it. */
export function boreFits(drawing: Scaled): boolean {
  return drawing.boreRadius >= boreGap(drawing) + 11;
}

/** How far the middle of the bore's figure lies from the middle of the section. */
function boreFigureAt(drawing: Scaled): number {
  return 3 + boreGap(drawing) / 2;
}

/** The bore's dimension line, broken for its figure; none where it has no room. */
export function boreDimension(drawing: Scaled): readonly Shape[] {
  if (!boreFits(drawing)) return [];
  const { boreRadius } = drawing;
  const at = (boreRadius - boreFigureAt(drawing)) / (2 * boreRadius);
  return brokenDimension(onBore(drawing, -boreRadius), onBore(drawing, boreRadius), at, boreGap(drawing));
}

/** The bore's figure in the gap of its line. */
export function boreLabel(drawing: Scaled): readonly Label[] {
  if (!boreFits(drawing)) return [];
  const angle = (BORE_TURN * Math.PI) / 180;
  const middle = onBore(drawing, -boreFigureAt(drawing));
  const drop = CAPTION_SIZE * 0.36;
  const base = { x: middle.x - drop * Math.sin(angle), y: middle.y + drop * Math.cos(angle) };
  return [dimensionLabel(boreText(drawing), base.x, base.y, { size: CAPTION_SIZE, weight: 400, turn: BORE_TURN })];
}
