/** Lines of small RINEX files for tests, made from one real record. */

const label = (content: string, name: string) => content.padEnd(60) + name.padEnd(20);

export const header3: readonly string[] = [
  label('     3.05           NAVIGATION DATA     GPS', 'RINEX VERSION / TYPE'),
  label('', 'END OF HEADER'),
];

export const header4: readonly string[] = [
  label('     4.00           NAVIGATION DATA     M', 'RINEX VERSION / TYPE'),
  label('', 'END OF HEADER'),
];

export const header2: readonly string[] = [
  label('     2.11           N: GPS NAV DATA', 'RINEX VERSION / TYPE'),
  label('', 'END OF HEADER'),
];

/** G01 of 2022-01-01 00:00 from BRDC00IGS_R_20220010000_01D_GN, its numbers as text. */
const CELLS: readonly (readonly string[])[] = [
  ['', ' 4.691267386079e-04', '-1.000444171950e-11', ' 0.000000000000e+00'],
  [' 3.900000000000e+01', '-1.411250000000e+02', ' 3.988380417768e-09', '-6.242942382352e-01'],
  ['-7.363036274910e-06', ' 1.121813920327e-02', ' 4.695728421211e-06', ' 5.153674995422e+03'],
  [' 5.184000000000e+05', '-3.166496753693e-08', '-1.036611240093e+00', ' 1.955777406693e-07'],
  [' 9.864187694897e-01', ' 2.997500000000e+02', ' 8.840876015687e-01', '-8.133553080847e-09'],
  ['-3.778728827795e-10', ' 1.000000000000e+00', ' 2.190000000000e+03', ' 0.000000000000e+00'],
  [' 2.000000000000e+00', ' 0.000000000000e+00', ' 5.122274160385e-09', ' 3.900000000000e+01'],
  [' 5.112180000000e+05', ' 4.000000000000e+00'],
];

/**
 * What differs from the real record: numbers by line and column, such as '3:0', and the satellite with its
 * epoch.
 */
export interface Changes {
  readonly start?: string;
  readonly cells?: Readonly<Record<string, number | string>>;
}

/** The eight lines of a record of generation 3 or 4. */
export function record3({ start = 'G01 2022 01 01 00 00 00', cells = {} }: Changes = {}): string[] {
  return lines(start, '    ', cells);
}

/** The eight lines of a record of generation 2. */
export function record2({ start = ' 1 22  1  1  0  0  0.0', cells = {} }: Changes = {}): string[] {
  return lines(start, '   ', cells);
}

function lines(start: string, indent: string, cells: Readonly<Record<string, number | string>>): string[] {
  return CELLS.map((row, line) => {
    const numbers = row.map((text, column) => {
      const change = cells[`${line}:${column}`];
      if (line === 0 && column === 0) return '';
      return (typeof change === 'number' ? change.toExponential(12) : (change ?? text)).padStart(19);
    });
    return (line === 0 ? start : indent) + numbers.join('');
  });
}
