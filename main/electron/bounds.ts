/** Where a window stands, px. */
export interface Rectangle {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** What is remembered of a window. */
export interface Placement {
  readonly bounds: Rectangle | null;
  readonly maximized: boolean;
}

/** A size, px. */
export type Size = Pick<Rectangle, 'width' | 'height'>;

export const FIRST_SIZE: Size = Object.freeze({ width: 1440, height: 900 });
export const LEAST_SIZE = Object.freeze({ minWidth: 480, minHeight: 360 });

/** px of a title bar that must be within reach, so that a window can be dragged back. */
const REACH = 80;

function isRectangle(value: unknown): value is Rectangle {
  if (typeof value !== 'object' || value === null) return false;
  const own = new Map<string, unknown>(Object.entries(value));
  return ['x', 'y', 'width', 'height'].every((key) => Number.isInteger(own.get(key)));
}

/** What was remembered of a window, read with distrust: what is wrong counts as nothing. */
export function readPlacement(value: unknown): Placement {
  if (typeof value !== 'object' || value === null) return { bounds: null, maximized: false };
  const own = new Map<string, unknown>(Object.entries(value));
  const bounds = own.get('bounds');
  return { bounds: isRectangle(bounds) ? bounds : null, maximized: own.get('maximized') === true };
}

/**
 * Bounds that can be reached on the display nearest to them: a screen may have been taken away since. Size alone is
 * kept where the place is out of reach.
 * @param area of that display, without the system's bars
 */
export function reachable(bounds: Rectangle, area: Rectangle): Size & Partial<Rectangle> {
  const width = Math.max(LEAST_SIZE.minWidth, Math.min(bounds.width, area.width));
  const height = Math.max(LEAST_SIZE.minHeight, Math.min(bounds.height, area.height));
  const across = bounds.x + width >= area.x + REACH && bounds.x <= area.x + area.width - REACH;
  const down = bounds.y >= area.y && bounds.y <= area.y + area.height - REACH;
  return across && down ? { x: bounds.x, y: bounds.y, width, height } : { width, height };
}
