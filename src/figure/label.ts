import type { Label } from './figure.js';
import type { Point } from './point.js';

/** Advance of a character of the monospaced face, in em: exact. */
const MONO_ADVANCE = 0.6;

/** Mean advance of the sans face in sentences, in em: a little more than it takes. */
const SANS_ADVANCE = 0.53;

/** Height over and depth under the base line that figures and letters take, in em. */
const ASCENT = 0.74;
const DESCENT = 0.22;

/** Smallest size on a drawing, px. */
export const CAPTION_SIZE = 10.5;

/** Size of a dimension's figure, px. */
export const FIGURE_SIZE = 11;

/** Width of a text, px. */
export function textWidth(text: string, size: number, face: Label['face']): number {
  return Array.from(text).length * size * (face === 'mono' ? MONO_ADVANCE : SANS_ADVANCE);
}

/** A value on a drawing, set in the monospaced face about its middle. */
export function dimensionLabel(text: string, x: number, y: number, own: Partial<Label> = {}): Label {
  const base = { text, x, y, anchor: 'middle', size: FIGURE_SIZE, face: 'mono', weight: 500, tone: 'ink', turn: 0 };
  return { ...(base as Label), ...own };
}

/** A caption in words. */
export function captionLabel(text: string, x: number, y: number, own: Partial<Label> = {}): Label {
  return { ...dimensionLabel(text, x, y), size: CAPTION_SIZE, face: 'sans', weight: 400, tone: 'ink2', ...own };
}

/** Share of its width that a text lies before its anchor. */
const BEFORE = { start: 0, middle: 0.5, end: 1 } as const;

/** Corners of the box that a label takes, turned as it is. */
export function labelBox(label: Label): readonly Point[] {
  const width = textWidth(label.text, label.size, label.face);
  const left = -width * BEFORE[label.anchor];
  const [top, bottom] = [-ASCENT * label.size, DESCENT * label.size];
  const angle = (label.turn * Math.PI) / 180;
  return [
    [left, top],
    [left + width, top],
    [left + width, bottom],
    [left, bottom],
  ].map(([x = 0, y = 0]) => ({
    x: label.x + x * Math.cos(angle) - y * Math.sin(angle),
    y: label.y + x * Math.sin(angle) + y * Math.cos(angle),
  }));
}
