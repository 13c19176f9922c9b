import type { Mark, MarkerFill, MarkerShape } from './marker.js';
import { coordinate, type Point, polyline } from './point.js';

/** A mark as path data about (0, 0), 14 px square over all. */
export interface MarkerPaths {
  /** the whole shape; closed but for a full cross or plus, which are strokes alone */
  readonly outline: string;
  /** the part that is filled with the family's colour, '' where none is */
  readonly filled: string;
  /** px; the outline is stroked in the family's colour */
  readonly strokeWidth: number;
}

const RADIUS = 4.23;

const CIRCLE = 48;

/** Length of a cross's arm, and half its breadth where it is drawn hollow. */
const ARM = 4.9;
const BREADTH = 1.7;

/** Corners of a shape of about equal area, clockwise from the top. */
function corners(shape: MarkerShape): readonly Point[] {
  switch (shape) {
    case 'circle':
      return Array.from({ length: CIRCLE }, (_, i) => onCircle(i / CIRCLE));
    case 'square':
      return [-1, 1, 1, -1].map((side, i) => ({ x: side * 3.86, y: (i < 2 ? -1 : 1) * 3.86 }));
    case 'triangle':
      return [at(0, -5.15), at(4.83, 3.59), at(-4.83, 3.59)];
    case 'diamond':
      return [at(0, -5.52), at(5.52, 0), at(0, 5.52), at(-5.52, 0)];
    case 'plus':
      return hollowPlus();
    case 'cross':
      return hollowPlus().map(turned);
  }
}

function at(x: number, y: number): Point {
  return { x, y };
}

function onCircle(part: number): Point {
  return at(RADIUS * Math.sin(2 * Math.PI * part), -RADIUS * Math.cos(2 * Math.PI * part));
}

function hollowPlus(): readonly Point[] {
  const corner = [at(BREADTH, -ARM), at(BREADTH, -BREADTH), at(ARM, -BREADTH)];
  const quarter = ({ x, y }: Point): Point => at(-y, x);
  const second = corner.map(quarter);
  const third = second.map(quarter);
  return [...corner, ...second, ...third, ...third.map(quarter)];
}

function turned({ x, y }: Point): Point {
  return at((x - y) * Math.SQRT1_2, (x + y) * Math.SQRT1_2);
}

/** The part of a polygon on one side of a line through the middle: where side(point) ≥ 0 (Sutherland and Hodgman). */
function cut(points: readonly Point[], side: (point: Point) => number): readonly Point[] {
  return points.flatMap((point, i) => {
    const next = points[(i + 1) % points.length] ?? point;
    const [here, there] = [side(point), side(next)];
    const kept = here >= 0 ? [point] : [];
    if (here * there >= 0) return kept;
    const part = here / (here - there);
    return [...kept, at(point.x + part * (next.x - point.x), point.y + part * (next.y - point.y))];
  });
}

/** A full cross or plus has no inside: two strokes. */
function strokes(shape: 'cross' | 'plus'): string {
  const ends = [at(-ARM, 0), at(ARM, 0), at(0, -ARM), at(0, ARM)].map((end) => (shape === 'cross' ? turned(end) : end));
  return polyline(ends.slice(0, 2)) + polyline(ends.slice(2));
}

const DOT = `M${coordinate(-1.5)} 0a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0 -3 0z`;

function filledPart(points: readonly Point[], fill: MarkerFill): string {
  switch (fill) {
    case 'full':
      return polyline(points, true);
    case 'half':
      return polyline(
        cut(points, ({ y }) => y),
        true,
      );
    case 'left':
      return polyline(
        cut(points, ({ x }) => -x),
        true,
      );
    case 'right':
      return polyline(
        cut(points, ({ x }) => x),
        true,
      );
    case 'dot':
      return DOT;
    case 'open':
      return '';
  }
}

/** The mark's path data, about its middle. */
export function markerPaths({ shape, fill }: Pick<Mark, 'shape' | 'fill'>): MarkerPaths {
  const line = shape === 'cross' || shape === 'plus';
  if (line && fill === 'full') return { outline: strokes(shape), filled: '', strokeWidth: 1.7 };
  const points = corners(shape);
  return { outline: polyline(points, true), filled: filledPart(points, fill), strokeWidth: line ? 1 : 1.3 };
}
