/** Characters a text takes on a terminal, near enough: code points. */
function widthOf(text: string): number {
  return Array.from(text).length;
}

function padded(text: string, width: number, toRight: boolean): string {
  const space = ' '.repeat(Math.max(0, width - widthOf(text)));
  return toRight ? `${space}${text}` : `${text}${space}`;
}

/**
 * Rows of equal length set in columns two spaces apart, with a rule under the first.
 * @param toRight for each column whether it is set to the right, as numbers are
 */
export function setColumns(rows: readonly (readonly string[])[], toRight: readonly boolean[]): readonly string[] {
  const widths = toRight.map((_, column) => Math.max(0, ...rows.map((row) => widthOf(row[column] ?? ''))));
  const lines = rows.map((row) =>
    widths
      .map((width, column) => padded(row[column] ?? '', width, toRight[column] ?? false))
      .join('  ')
      .trimEnd(),
  );
  const [head = '', ...body] = lines;
  return [head, widths.map((width) => '-'.repeat(width)).join('  '), ...body];
}
