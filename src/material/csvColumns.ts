import { findUnit, nearestUnit } from '../quantity/lookup.js';
import { nearest } from '../quantity/nearest.js';
import { clip, saidProblem, wrongValue, type Problem } from './problem.js';

/** What a stock list's CSV may hold; other columns are passed over. */
export type ColumnName = 'outerDiameter' | 'wall' | 'pricePerMetre';

/** Where a column stands, its title as written, and the unit in its title, if any (of lengths only). */
export interface Column {
  readonly index: number;
  readonly title: string;
  readonly unit: string | null;
}

export type Columns = Readonly<Partial<Record<ColumnName, Column>>>;

/** The first title of each column is the one that messages ask for. */
const TITLES: Readonly<Record<ColumnName, readonly [string, ...string[]]>> = {
  outerDiameter: ['outer diameter', 'outside diameter', 'od', 'outer dia', 'outside dia'],
  wall: ['wall', 'wall thickness', 'thickness', 'wt', 't'],
  pricePerMetre: ['price per metre', 'price per meter', 'price per m', 'price/m'],
};
const NAMES: readonly ColumnName[] = ['outerDiameter', 'wall', 'pricePerMetre'];
const OTHER_DIAMETERS = ['inner diameter', 'inside diameter', 'inner dia', 'inside dia'];

const LONGEST_TITLE = 100;

interface Title {
  readonly name: string;
  readonly unit: string | null;
}

/** "Outer_Diameter" and "outerDiameter" and "O.D." without their accidents. */
function plainName(text: string): string {
  const spaced = text.replace(/([a-z])([A-Z])/g, '$1 $2').replace(/[\s_-]+/g, ' ');
  return spaced.replaceAll('.', '').trim().toLowerCase();
}

/** "wall (mm)", "wall [mm]", "wall, mm" and "wall mm" name a unit; "price (EUR/m)" is a price per metre. */
function readTitle(cell: string): Title {
  if (cell.length > LONGEST_TITLE) return { name: '', unit: null };
  const bracket = /^(.*?)\s*(?:\(([^()]*)\)|\[([^[\]]*)\]|,([^,]*))$/s.exec(cell);
  const unit = (bracket?.[2] ?? bracket?.[3] ?? bracket?.[4])?.trim();
  const name = plainName(bracket?.[1] ?? cell);
  if (unit !== undefined) return name === 'price' && /\/\s*m$/.test(unit) ? { name: 'price/m', unit } : { name, unit };
  const last = /^(.+)\s(\S+)$/s.exec(cell.trim());
  const isUnit = last?.[2] !== undefined && findUnit(last[2], 'length') !== null;
  const bare = plainName(last?.[1] ?? '');
  return isUnit && columnOf(bare) !== null ? { name: bare, unit: last[2] ?? null } : { name, unit: null };
}

function columnOf(name: string): ColumnName | null {
  return NAMES.find((column) => TITLES[column].includes(name)) ?? null;
}

/** A title that was meant for one of ours but is not it would drop a column in silence; all else is passed over. */
function misspelt(path: string, cell: string, name: string): Problem | null {
  if (/^(?:price|cost)\b/.test(name))
    return wrongValue(path, cell, 'is not a price per metre', `"${TITLES.pricePerMetre[0]}" or another title`);
  if (name.length < 4 || OTHER_DIAMETERS.includes(name)) return null;
  const near = nearest(name, Object.values(TITLES).flat());
  return near === null ? null : wrongValue(path, cell, 'is not a known column', `"${near}" or another title`);
}

function titleFault(
  path: string,
  cell: string,
  name: ColumnName,
  unit: string | null,
  columns: Columns,
): Problem | null {
  if (columns[name] !== undefined)
    return wrongValue(path, cell, `is a second column for ${TITLES[name][0]}`, 'one column for each');
  if (name === 'pricePerMetre' || unit === null || findUnit(unit, 'length') !== null) return null;
  const near = nearestUnit(unit, ['length']) ?? 'mm';
  return wrongValue(path, cell, 'names no unit of length', `a unit such as "${near}"`);
}

/**
 * Finds the columns of a stock list by their titles.
 * @param path file and line, for messages
 * @returns the columns and every mistake in the titles
 */
export function readColumns(cells: readonly string[], path: string): { columns: Columns; problems: Problem[] } {
  const columns: Partial<Record<ColumnName, Column>> = {};
  const problems: Problem[] = [];
  for (const [index, cell] of cells.entries()) {
    const { name, unit } = readTitle(cell);
    const column = columnOf(name);
    const fault = column === null ? misspelt(path, cell, name) : titleFault(path, cell, column, unit, columns);
    if (fault !== null) problems.push(fault);
    if (column !== null) columns[column] = { index, title: clip(cell), unit };
  }
  return { columns, problems: [...problems, ...absent(columns, path, problems)] };
}

/** A needed column that is not there, unless a title that was meant for it is refused already. */
function absent(columns: Columns, path: string, problems: readonly Problem[]): Problem[] {
  const required: readonly ColumnName[] = ['outerDiameter', 'wall'];
  const isMeant = (title: string): boolean => problems.some((problem) => problem.expected.startsWith(`"${title}"`));
  const expected = 'a line of titles such as "outer diameter (mm), wall (mm)"';
  return required
    .filter((name) => columns[name] === undefined && !TITLES[name].some(isMeant))
    .map((name) => saidProblem(path, undefined, `has no column "${TITLES[name][0]}"; expected ${expected}`, expected));
}
