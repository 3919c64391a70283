import { type Finding, InputError } from '../../src/finding.ts';
import { groupBy } from '../../src/messages/group-by.ts';
import { type ComparedPoint, type Comparison, compareEpoch, summarize } from '../../src/orbits/compare.ts';
import { readSp3 } from '../../src/orbits/sp3.ts';
import { findSuspects, type Suspect, type SuspectSearch } from '../../src/orbits/suspects.ts';
import { toIso } from '../../src/time/calendar.ts';
import {
  contradictionFindings,
  contradictionsToJson,
  type EvaluateJob,
  nameOf,
  recordToJson,
  report,
  unhealthyNotes,
} from './evaluate-job.ts';

/** Compares the records with a precise orbit, prints the statistics and names what stands out. */
export async function evaluateAgainst(job: EvaluateJob, sp3: string): Promise<0 | 1> {
  const records = groupBy(job.records, (record) => record.satellite);
  const points: ComparedPoint[] = [];
  for await (const epoch of readSp3(sp3)) points.push(...compareEpoch(records, epoch));
  const comparison = summarize(points);
  if (comparison === undefined) throw nothingInCommon(job.file, sp3);
  const search = findSuspects(points);
  const text = job.json ? toJson(job, comparison, search) : toTable(comparison, search);
  process.stdout.write(text);
  for (const note of unhealthyNotes(records)) process.stderr.write(`${note}\n`);
  const findings = [...contradictionFindings(job), ...search.suspects.map(suspectFinding(job.file, search))];
  report(findings);
  return findings.length > 0 ? 1 : 0;
}

function toJson(job: EvaluateJob, comparison: Comparison, search: SuspectSearch): string {
  const group = {
    system: 'GPS',
    message: 'LNAV',
    satellites: comparison.satellites,
    points: comparison.points,
    rms_m: comparison.rms,
    max_m: comparison.worst.error.total,
    radial_rms_m: comparison.radialRms,
    along_rms_m: comparison.alongRms,
    cross_rms_m: comparison.crossRms,
    ...(comparison.velocityRms !== undefined && { velocity_rms_mps: comparison.velocityRms }),
    worst: worstToJson(comparison),
    suspect_limit_m: search.limit ?? null,
    suspects: search.suspects.map(suspectToJson),
    rms_without_suspects_m: search.others?.rms ?? null,
    max_without_suspects_m: search.others?.worst.error.total ?? null,
    contradictions: contradictionsToJson(job.contradictions),
  };
  return `${JSON.stringify({ groups: [group] })}\n`;
}

function suspectToJson({ record, comparison }: Suspect): unknown {
  return {
    ...recordToJson(record),
    points: comparison.points,
    rms_m: comparison.rms,
    max_m: comparison.worst.error.total,
    at: toIso(comparison.worst.time),
  };
}

function worstToJson({ worst }: Comparison): unknown {
  return { ...recordToJson(worst.record), at: toIso(worst.time), error_m: worst.error.total };
}

function toTable(comparison: Comparison, search: SuspectSearch): string {
  const { worst } = comparison;
  const { record } = worst;
  const columns: readonly (readonly [string, string])[] = [
    ['system', 'GPS'],
    ['message', 'LNAV'],
    ['satellites', String(comparison.satellites)],
    ['points', String(comparison.points)],
    ['3D RMS m', metres(comparison.rms)],
    ['max m', metres(worst.error.total)],
    ['radial RMS m', metres(comparison.radialRms)],
    ['along RMS m', metres(comparison.alongRms)],
    ['cross RMS m', metres(comparison.crossRms)],
  ];
  const width = columns.map(([head, value]) => Math.max(head.length, value.length));
  const row = (side: 0 | 1) =>
    columns.map((column, index) => column[side].padStart(width[index] ?? 0)).join('  ');
  const velocity = comparison.velocityRms;
  const lines = [
    row(0),
    row(1),
    '',
    'Broadcast minus precise, all points as computed.',
    ...(velocity === undefined ? [] : [`Velocity: RMS ${(velocity * 1e3).toFixed(3)} mm/s.`]),
    `Worst: ${metres(worst.error.total)} m at ${toIso(worst.time)}, ${nameOf(record)}, line ${record.line}.`,
    suspectLine(search),
  ];
  return `${lines.join('\n')}\n`;
}

function suspectLine({ limit, suspects, others }: SuspectSearch): string {
  if (limit === undefined) return 'Suspect records: not tested, too few records to have a spread.';
  if (suspects.length === 0) return `Suspect records: none; every error is below ${metres(limit)} m.`;
  const rest =
    others === undefined
      ? ''
      : ` Without them: RMS ${metres(others.rms)} m, max ${metres(others.worst.error.total)} m.`;
  return `Suspect records: ${suspects.length}, with errors above ${metres(limit)} m, named on stderr.${rest}`;
}

function suspectFinding(file: string, { limit = 0 }: SuspectSearch): (suspect: Suspect) => Finding {
  return ({ record, comparison: { points, rms, worst } }) => ({
    code: 'evaluate.suspect',
    place: { file, line: record.line },
    what: `${nameOf(record)} is off by up to ${metres(worst.error.total)} m, RMS of ${points} points ${metres(rms)} m`,
    why: `Median and fifteen robust standard deviations of all records put the limit at ${metres(limit)} m.`,
    remedy: 'Remove the record, or look for a manoeuvre if its neighbours drift as well.',
  });
}

function nothingInCommon(file: string, sp3: string): InputError {
  return new InputError({
    code: 'evaluate.nothing-in-common',
    place: { file: sp3 },
    what: `no epoch of the precise orbit lies within an hour of a healthy record of ${file}`,
    why: 'The two files cover different satellites or times.',
    remedy: 'Take the precise orbit of the same day.',
  });
}

function metres(value: number): string {
  return value.toFixed(3);
}
