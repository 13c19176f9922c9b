import type { CircleShape, PathShape, Shape } from './figure.js';
import { coordinate, type Point, polyline } from './point.js';
import { insideCircle, shared, without } from './spans.js';

/** A piece of a tube's wall under the glass; all px. */
export interface WallDetail {
  /** the circle that it is seen in */
  readonly glass: { readonly x: number; readonly y: number; readonly r: number };
  /** thickness of the wall as enlarged */
  readonly wall: number;
  /** outer radius of the tube as enlarged */
  readonly outerRadius: number;
}

/** Least and greatest thickness of the wall under the glass, px, and the thickness that is aimed at. */
export const DETAIL_WALL = { least: 18, aim: 22, most: 30 } as const;

/** Factors that are easily said; neighbours lie within a third of each other, and so a wall within a sixth of the aim. */
const SAID = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8] as const;

/** Distance between two strokes of the hatching, px across. */
const HATCH_PITCH = 4.24;

/** How many times a wall of so many px must be enlarged to be well seen: a factor that is easily said. */
export function detailFactor(wall: number): number {
  const decade = 10 ** Math.floor(Math.log10(DETAIL_WALL.aim / wall));
  const factors = [...SAID, 10].map((factor) => Number((factor * decade).toPrecision(2)));
  const off = (factor: number): number => Math.abs(Math.log((factor * wall) / DETAIL_WALL.aim));
  return factors.reduce((best, factor) => (off(factor) < off(best) ? factor : best));
}

/** The two faces of the wall on the horizontal through the middle of the glass. */
export function wallFaces({ glass, wall }: WallDetail): { readonly inner: Point; readonly outer: Point } {
  return { inner: { x: glass.x - wall / 2, y: glass.y }, outer: { x: glass.x + wall / 2, y: glass.y } };
}

/** The enlarged wall: hatched as cut, its two faces, and the rim of the glass over them. */
export function wallDetail(detail: WallDetail): readonly Shape[] {
  const { glass, wall, outerRadius } = detail;
  const axis = { x: glass.x + wall / 2 - outerRadius, y: glass.y };
  const faces = [outerRadius, outerRadius - wall].map((r): CircleShape => ({ kind: 'circle', ...axis, r }));
  return [
    hatching(glass, axis, outerRadius, wall),
    ...faces.flatMap((face) => faceArc(face, glass)),
    { kind: 'circle', ...glass, line: 'ink2', width: 0.9 },
  ];
}

/** Strokes at 45 degrees wherever there is material inside the glass. */
function hatching(glass: WallDetail['glass'], axis: Point, outerRadius: number, wall: number): PathShape {
  const count = Math.ceil(glass.r / HATCH_PITCH);
  const strokes = Array.from({ length: 2 * count + 1 }, (_, i) => {
    const off = (i - count) * HATCH_PITCH * Math.SQRT1_2;
    const line = { x: glass.x + off, y: glass.y + off, dx: Math.SQRT1_2, dy: -Math.SQRT1_2 };
    const seen = shared(insideCircle(line, glass), insideCircle(line, { ...axis, r: outerRadius }));
    const solid = without(seen, insideCircle(line, { ...axis, r: outerRadius - wall }));
    return solid.map((ends) => polyline(ends.map((s) => ({ x: line.x + s * line.dx, y: line.y + s * line.dy }))));
  });
  return { kind: 'path', d: strokes.flat().join(''), line: 'copper', width: 0.9 };
}

/** The part of a face that is seen in the glass: an arc between the two places where it meets the rim. */
function faceArc(face: CircleShape, glass: WallDetail['glass']): readonly PathShape[] {
  const apart = glass.x - face.x;
  const along = (apart * apart + face.r * face.r - glass.r * glass.r) / (2 * apart);
  const across = face.r * face.r - along * along;
  if (face.r <= 0 || across <= 0) return [];
  const ends = [-1, 1].map((side) => `${coordinate(face.x + along)} ${coordinate(face.y + side * Math.sqrt(across))}`);
  const arc = `${coordinate(face.r)} ${coordinate(face.r)} 0 ${along < 0 ? '1' : '0'} 1`;
  return [{ kind: 'path', d: `M${ends[0] ?? ''}A${arc} ${ends[1] ?? ''}`, line: 'copper', width: 1.4 }];
}
