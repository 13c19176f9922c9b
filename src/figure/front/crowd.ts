import type { Point } from '../point.js';
import type { Box } from './box.js';

/** Side of a cell, px. */
const CELL = 4;

/** The cells of an area, row by row. */
interface Grid {
  readonly area: Box;
  readonly columns: number;
  readonly rows: number;
}

/**
 * How many cells that lines run through lie under a box, for lines given as corners: read off a table of sums from the
 * area's corner (summed-area table), so that each answer takes four look-ups.
 */
export function crowdOf(lines: readonly (readonly Point[])[], area: Box): (box: Box) => number {
  const columns = Math.max(Math.ceil((area.right - area.left) / CELL), 1);
  const rows = Math.max(Math.ceil((area.bottom - area.top) / CELL), 1);
  const grid = { area, columns, rows };
  const cells = new Uint8Array(columns * rows);
  for (const line of lines)
    for (const [index, point] of line.entries()) markStroke(cells, grid, point, line[index + 1] ?? point);
  const sums = sumsOf(cells, grid);
  const sum = (column: number, row: number): number => sums[row * (columns + 1) + column]!;
  return ({ left, top, right, bottom }) => {
    const [c0, c1] = [left, right].map((x) => within((x - area.left) / CELL, columns)) as [number, number];
    const [r0, r1] = [top, bottom].map((y) => within((y - area.top) / CELL, rows)) as [number, number];
    const [c, r] = [Math.ceil(c1), Math.ceil(r1)];
    return sum(c, r) - sum(Math.floor(c0), r) - sum(c, Math.floor(r0)) + sum(Math.floor(c0), Math.floor(r0));
  };
}

function within(value: number, most: number): number {
  return Math.min(Math.max(value, 0), most);
}

/** Sums of all cells above and to the left, one row and column more than there are cells. */
function sumsOf(cells: Uint8Array, { columns, rows }: Grid): Uint32Array {
  const breadth = columns + 1;
  const sums = new Uint32Array(breadth * (rows + 1));
  for (let row = 0; row < rows; row += 1) {
    let along = 0;
    for (let column = 0; column < columns; column += 1) {
      along += cells[row * columns + column]!;
      sums[(row + 1) * breadth + column + 1] = sums[row * breadth + column + 1]! + along;
    }
  }
  return sums;
}

function markStroke(cells: Uint8Array, { area, columns, rows }: Grid, from: Point, to: Point): void {
  const steps = Math.min(Math.ceil(Math.hypot(to.x - from.x, to.y - from.y) / CELL), 2000);
  for (let step = 0; step <= steps; step += 1) {
    const part = steps === 0 ? 0 : step / steps;
    const column = Math.floor((from.x + part * (to.x - from.x) - area.left) / CELL);
    const row = Math.floor((from.y + part * (to.y - from.y) - area.top) / CELL);
    if (column >= 0 && column < columns && row >= 0 && row < rows) cells[row * columns + column] = 1;
  }
}
