/** Rows under a heading, columns as wide as they must be; the first to the left, the others to the right. */
export function table(heading: string, rows: readonly (readonly string[])[]): string {
  const widths = (rows[0] ?? []).map((_, column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)));
  const lines = rows.map((row) =>
    row
      .map((cell, column) => (column === 0 ? cell.padEnd(widths[0] ?? 0) : cell.padStart(widths[column] ?? 0)))
      .join('  ')
      .trimEnd(),
  );
  return [heading, ...lines.map((line) => `  ${line}`), ''].join('\n') + '\n';
}

/** A number to three figures, thousands set apart. */
export function shown(value: number): string {
  const digits = value >= 100 ? 0 : value >= 10 ? 1 : 2;
  return value.toLocaleString('en-GB', { minimumFractionDigits: digits, maximumFractionDigits: digits });
}

/** How a number compares with a target that it should not pass. */
export function atMost(value: number, target: number): string {
  return `at most ${String(target)}: ${value <= target ? 'met' : 'not met'} (${(value / target).toFixed(2)} of it)`;
}

/** How a number compares with a target that it should reach. */
export function atLeast(value: number, target: number): string {
  return `at least ${String(target)}: ${value >= target ? 'met' : 'not met'}`;
}
