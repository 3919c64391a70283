/**
 * A table as text: columns as wide as their widest cell, numbers to the right.
 *
 * @param head names of the columns
 * @param rows cells by row; undefined is an empty cell
 */
export function formatTable(
  head: readonly string[],
  rows: readonly (readonly (string | number | undefined)[])[],
): string {
  const cells = [head, ...rows.map((row) => row.map((cell) => String(cell ?? '')))];
  const widths = head.map((_, column) => Math.max(...cells.map((row) => row[column]!.length)));
  const right = head.map((_, column) => rows.some((row) => typeof row[column] === 'number'));
  const line = (row: readonly string[]) =>
    row
      .map((cell, column) => (right[column] ? cell.padStart(widths[column]!) : cell.padEnd(widths[column]!)))
      .join('  ')
      .trimEnd();
  return `${[line(cells[0]!), line(widths.map((width) => '-'.repeat(width))), ...cells.slice(1).map(line)].join('\n')}\n`;
}
