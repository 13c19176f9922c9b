import type { Candidate, Report } from './report.js';
import { degrees, governingWords, hasSeveralLoads, leastMargin } from './words.js';

type Cell = string | number | null;

/** Text that a spreadsheet would take for a formula is made text by an apostrophe before it. */
function harmless(text: string): string {
  return /^[=+\-@\t\r]/.test(text) ? `'${text}` : text;
}

/** One field after RFC 4180: quoted where it holds a comma, a quote or a line end, quotes doubled. */
function field(cell: Cell): string {
  if (cell === null) return '';
  const text = typeof cell === 'number' ? String(Number(cell.toPrecision(9))) : harmless(cell);
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}

function headOf({ job }: Report): readonly Cell[] {
  const cost = job.currency === null ? 'cost' : `cost (${job.currency})`;
  return [
    'material',
    'name',
    'fits',
    'outer diameter (mm)',
    'wall (mm)',
    'bore (mm)',
    'mass (kg)',
    'twist (deg)',
    'torsional stiffness (N·m/rad)',
    'strain energy (J)',
    cost,
    'governing limit',
    'least margin',
  ];
}

function rowOf({ material, feasible, design, limits }: Candidate, report: Report): readonly Cell[] {
  const name = report.job.materials.find(({ id }) => id === material)?.name ?? '';
  const head: readonly Cell[] = [material, name, feasible ? 'yes' : 'no'];
  if (design === null) return [...head, ...Array.from({ length: 10 }, () => null)];
  const { outerDiameter, wall, bore, mass, twist, torsionalStiffness, strainEnergy, cost } = design;
  const size = [
    outerDiameter * 1e3,
    wall * 1e3,
    bore * 1e3,
    mass,
    degrees(twist),
    torsionalStiffness,
    strainEnergy,
    cost,
  ];
  return [...head, ...size, governingWords(limits, hasSeveralLoads(report)), leastMargin(limits)];
}

/**
 * The line-up of a report as CSV after RFC 4180: a line of titles with units, a line a material, lines ended by CR LF,
 * decimal points, nine figures.
 */
export function reportCsv(report: Report): string {
  const rows = [headOf(report), ...report.candidates.map((candidate) => rowOf(candidate, report))];
  return rows.map((row) => `${row.map(field).join(',')}\r\n`).join('');
}
