import { type Finding, formatFinding } from '../../src/finding.ts';
import type { Contradiction } from '../../src/messages/contradictions.ts';
import type { NavigationRecord } from '../../src/messages/navigation-record.ts';
import { toIso } from '../../src/time/calendar.ts';

/** What both forms of the command work on. */
export interface EvaluateJob {
  /** The navigation file. */
  readonly file: string;
  /** At least one record. */
  readonly records: readonly NavigationRecord[];
  readonly contradictions: readonly Contradiction[];
  readonly json: boolean;
}

/** Prints findings to stderr. */
export function report(findings: readonly Finding[]): void {
  for (const finding of findings) process.stderr.write(`${formatFinding(finding)}\n`);
}

/** Records that share an issue of data and differ, as findings. */
export function contradictionFindings({ file, contradictions }: EvaluateJob): Finding[] {
  return contradictions.map(({ variants, fields }) => {
    const [first, ...others] = variants;
    const lines = others.map((other) => other.line).join(', ');
    return {
      code: 'evaluate.contradiction',
      place: { file, line: first.line },
      what: `${nameOf(first)} has other values at line ${lines}: ${fields.join(', ')}`,
      why: 'Satellite, toe and issue of data name one set of values: all but one of these records are wrong.',
      remedy: 'Compare with a precise orbit or with the neighbouring records and remove the wrong one.',
    };
  });
}

/** The same for JSON. */
export function contradictionsToJson(contradictions: readonly Contradiction[]): unknown[] {
  return contradictions.map(({ variants, fields }) => ({
    ...recordToJson(variants[0]),
    lines: variants.map((variant) => variant.line),
    fields,
  }));
}

/** Satellite, toe and IODE of a record. */
export function nameOf(record: NavigationRecord): string {
  return `${record.satellite} toe ${toIso(record.toe)} IODE ${record.iode}`;
}

/** The same for JSON, with the line of the file. */
export function recordToJson(record: NavigationRecord): {
  satellite: string;
  toe: string;
  iode: number;
  line: number;
} {
  return { satellite: record.satellite, toe: toIso(record.toe), iode: record.iode, line: record.line };
}

/** One line for each satellite that has unhealthy records. */
export function unhealthyNotes(satellites: ReadonlyMap<string, readonly NavigationRecord[]>): string[] {
  return [...satellites].flatMap(([satellite, records]) => {
    const bad = records.filter((record) => record.health !== 0);
    const first = bad[0];
    if (first === undefined) return [];
    const share = `${bad.length} of ${records.length} records`;
    return [`${satellite} is unhealthy in ${share}, not used (health ${first.health} at line ${first.line})`];
  });
}
