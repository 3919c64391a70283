import { InputError } from '../../src/finding.ts';
import { groupBy } from '../../src/messages/group-by.ts';
import type { NavigationRecord } from '../../src/messages/navigation-record.ts';
import { halfFitInterval, nearestRecord } from '../../src/messages/select-record.ts';
import { clock, position } from '../../src/models/broadcast.ts';
import type { Position } from '../../src/models/position.ts';
import { GPS } from '../../src/systems/gps.ts';
import { toIso } from '../../src/time/calendar.ts';
import { addSeconds, type GnssTime, secondsBetween } from '../../src/time/gnss-time.ts';
import {
  contradictionFindings,
  contradictionsToJson,
  type EvaluateJob,
  report,
  unhealthyNotes,
} from './evaluate-job.ts';

/**
 * Times to evaluate at: each record's toe, given epochs, or steps of so many seconds from first to last toe.
 */
export type Times =
  | { readonly kind: 'toe' }
  | { readonly kind: 'at'; readonly epochs: readonly GnssTime[] }
  | { readonly kind: 'every'; readonly step: number };

/** One evaluation. */
interface Row {
  readonly time: GnssTime;
  readonly record: NavigationRecord;
  readonly tk: number;
  readonly position: Position;
  readonly clock: number;
}

/** Text is handed to stdout in pieces of about this length, so that a long output is never held whole. */
const PIECE = 1 << 16;

/** Widths of the columns: numbers are set to the right, time and satellite to the left. */
const COLUMNS: readonly (readonly [string, number])[] = [
  ['GPS time', -19],
  ['sat', -3],
  ['IODE', 4],
  ['line', 7],
  ['tk s', 10],
  ['x m', 14],
  ['y m', 14],
  ['z m', 14],
  ['clock s', 17],
];

const HEAD: string = tableLine(COLUMNS.map(([head]) => head));

/**
 * Prints positions and clock offsets, and names satellites that are unhealthy or have no record for a time.
 */
export function evaluatePositions(job: EvaluateJob, times: Times): 0 | 1 {
  const satellites = new Map([...groupBy(job.records, (record) => record.satellite)].sort());
  const gaps = new Map<string, number>();
  const rows = rowsOf(satellites, times, (satellite) => gaps.set(satellite, (gaps.get(satellite) ?? 0) + 1));
  const isAny = job.json
    ? print('{"positions":[', ',', rows, rowToJson, `],"contradictions":${contradictionsJson(job)}}\n`)
    : print(HEAD, '', rows, rowToText, '');
  if (!isAny) throw nothingToShow(job.file, unhealthyNotes(satellites));
  for (const note of [...unhealthyNotes(satellites), ...gapNotes(gaps)]) process.stderr.write(`${note}\n`);
  const findings = contradictionFindings(job);
  report(findings);
  return findings.length > 0 ? 1 : 0;
}

/** The evaluations in order of time, then satellite. */
function* rowsOf(
  satellites: ReadonlyMap<string, readonly NavigationRecord[]>,
  times: Times,
  onGap: (satellite: string) => void,
): Generator<Row> {
  if (times.kind === 'toe') {
    const healthy = [...satellites.values()].flat().filter((record) => record.health === 0);
    const sorted = healthy.toSorted((a, b) => secondsBetween(b.toe, a.toe)); // stable
    for (const record of sorted) yield rowOf(record, record.toe);
    return;
  }
  for (const time of times.kind === 'at'
    ? times.epochs
    : steps([...satellites.values()].flat(), times.step)) {
    for (const [satellite, records] of satellites) {
      const record = nearestRecord(records, time, halfFitInterval);
      if (record === undefined) onGap(satellite);
      else yield rowOf(record, time);
    }
  }
}

function rowOf(record: NavigationRecord, time: GnssTime): Row {
  const tk = secondsBetween(record.toe, time);
  return {
    time,
    record,
    tk,
    position: position(record.elements, GPS, tk),
    clock: clock(record.elements, GPS, tk),
  };
}

/** Epochs from the first toe to the last. */
function* steps(records: readonly NavigationRecord[], step: number): Generator<GnssTime> {
  const toes = records.map((record) => record.toe);
  const first = toes.reduce((a, b) => (secondsBetween(a, b) < 0 ? b : a));
  const last = toes.reduce((a, b) => (secondsBetween(a, b) > 0 ? b : a));
  const span = secondsBetween(first, last);
  for (let k = 0; k * step <= span; k++) yield addSeconds(first, k * step);
}

/** Prints the rows between `open` and `close`; prints nothing and returns false if there is no row. */
function print(
  open: string,
  separator: string,
  rows: Iterable<Row>,
  format: (row: Row) => string,
  close: string,
): boolean {
  let text = open;
  let isFirst = true;
  for (const row of rows) {
    text += (isFirst ? '' : separator) + format(row);
    isFirst = false;
    if (text.length < PIECE) continue;
    process.stdout.write(text);
    text = '';
  }
  if (!isFirst) process.stdout.write(text + close);
  return !isFirst;
}

function rowToText(row: Row): string {
  const { record } = row;
  const { x, y, z } = row.position;
  return tableLine([
    toIso(row.time),
    record.satellite,
    String(record.iode),
    String(record.line),
    row.tk.toFixed(3),
    ...[x, y, z].map((metres) => metres.toFixed(4)),
    row.clock.toFixed(14),
  ]);
}

function tableLine(cells: readonly string[]): string {
  const padded = COLUMNS.map(([, width], index) => {
    const cell = cells[index] ?? '';
    return width < 0 ? cell.padEnd(-width) : cell.padStart(width);
  });
  return `${padded.join('  ')}\n`;
}

function rowToJson(row: Row): string {
  const { record } = row;
  const { x, y, z } = row.position;
  return JSON.stringify({
    time: toIso(row.time),
    satellite: record.satellite,
    iode: record.iode,
    line: record.line,
    tk_s: row.tk,
    x_m: x,
    y_m: y,
    z_m: z,
    clock_s: row.clock,
  });
}

function contradictionsJson({ contradictions }: EvaluateJob): string {
  return JSON.stringify(contradictionsToJson(contradictions));
}

function gapNotes(gaps: ReadonlyMap<string, number>): string[] {
  return [...gaps].map(([satellite, count]) => {
    return `${satellite} has no healthy record within its fit interval at ${count} of the times`;
  });
}

function nothingToShow(file: string, unhealthy: readonly string[]): InputError {
  return new InputError({
    code: 'evaluate.nothing-to-show',
    place: { file },
    what: 'no record can be used at any of the times',
    why: [
      'A record serves while its health is 0 and the time lies within its fit interval.',
      ...unhealthy,
    ].join(' '),
    remedy:
      'Ask for a time within the span of the file; without --at each record is evaluated at its own toe.',
  });
}
