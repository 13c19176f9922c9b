import type { TextWidth } from '../../src/figure/front/textWidth.js';
import { textWidth } from '../../src/figure/label.js';

type Face = Parameters<TextWidth>[2];
type Weight = Parameters<TextWidth>[3];

const FACES = { sans: '"Plex Sans", sans-serif', mono: '"Plex Mono", monospace' } as const;

/** A font as a canvas names it. */
export function fontOf(size: number, face: Face, weight: Weight): string {
  return `${String(weight)} ${String(size)}px ${FACES[face]}`;
}

/** Every font that the front is written in. */
const FONTS = (['sans', 'mono'] as const).flatMap((face) =>
  ([400, 500, ...(face === 'sans' ? [600 as const] : [])] as const).map((weight) => fontOf(12, face, weight)),
);

/** Resolves when the fonts of the front can be drawn with: a canvas draws at once, with whatever is there. */
export async function fontsReady(): Promise<void> {
  if ('fonts' in document) await Promise.allSettled(FONTS.map((font) => document.fonts.load(font)));
}

/** Measures on a canvas of its own; by the mean letter where there is none. */
export function measureText(): TextWidth {
  const context = document.createElement('canvas').getContext('2d');
  if (context === null) return (text, size, face) => textWidth(text, size, face);
  return (text, size, face, weight) => {
    context.font = fontOf(size, face, weight);
    return context.measureText(text).width;
  };
}

/** How a text is written. */
export interface Writing {
  readonly size: number;
  readonly face: Face;
  readonly weight: Weight;
  readonly colour: string;
  readonly align?: CanvasTextAlign;
  /** colour of the halo; none where left out */
  readonly halo?: string;
}

/** Writes a line of text about the middle of its height. */
export function write(context: CanvasRenderingContext2D, text: string, x: number, y: number, writing: Writing): void {
  const { size, face, weight, colour, align = 'left', halo } = writing;
  context.font = fontOf(size, face, weight);
  context.textAlign = align;
  context.textBaseline = 'alphabetic';
  const base = y + size * 0.35;
  if (halo !== undefined) {
    context.strokeStyle = halo;
    context.lineWidth = 4;
    context.lineJoin = 'round';
    context.strokeText(text, x, base);
  }
  context.fillStyle = colour;
  context.fillText(text, x, base);
}
