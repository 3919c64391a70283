import { InputError } from '../../src/finding.ts';
import { findContradictions } from '../../src/messages/contradictions.ts';
import type { NavigationRecord } from '../../src/messages/navigation-record.ts';
import { readRinexNavigation } from '../../src/messages/rinex/read.ts';
import { fromIso } from '../../src/time/calendar.ts';
import type { GnssTime } from '../../src/time/gnss-time.ts';
import { parseArguments, usageError } from './arguments.ts';
import type { Command } from './command.ts';
import { evaluateAgainst } from './evaluate-against.ts';
import { evaluatePositions, type Times } from './evaluate-positions.ts';

const help = `bound-orbit evaluate station.rnx --at 2022-01-01T06:00:00 --satellite G07

Positions and clock offsets from the GPS LNAV records of a RINEX navigation file (versions 2, 3, 4),
computed with the reference model: Earth-fixed metres of the antenna phase centre, and seconds for a
single-frequency user of L1.

  --at EPOCH        GPS time, such as 2022-01-01T06:00:00; may be given again; without it and
                    without --every each record is evaluated at its own toe
  --every SECONDS   from the first toe of the file to the last
  --satellite G07   this satellite alone
  --against SP3     compare with a precise orbit (SP3-a, c or d, in GPS time) at the epochs of that file
  --json            JSON on stdout

At a time the healthy record with the nearest toe is used, within its fit interval; with --against,
within an hour. Against a precise orbit: broadcast minus precise, along the radius, along the track
and across the orbital plane; all points count.

A record far outside the spread of the others, and records that share satellite, toe and issue of
data but not their values, are named on stderr, and the exit code is 1.
`;

/** Reference positions from a navigation file, or its comparison with a precise orbit. */
export const evaluate: Command = {
  help,
  async run(args) {
    const { values, positionals } = parseArguments('evaluate', args, {
      at: { type: 'string', multiple: true },
      every: { type: 'string' },
      satellite: { type: 'string' },
      against: { type: 'string' },
      json: { type: 'boolean', default: false },
    });
    const [file, ...others] = positionals;
    if (file === undefined) throw usageError('evaluate', 'no navigation file is named');
    if (others.length > 0) throw usageError('evaluate', `"${others[0]}" is one file too many`);
    const times = timesOf(values.at, values.every);
    if (values.against !== undefined && times.kind !== 'toe') {
      throw usageError(
        'evaluate',
        '--against takes its epochs from the precise orbit: --at and --every do not apply',
      );
    }
    const records = await readRecords(file, satelliteOf(values.satellite));
    const job = { file, records, contradictions: findContradictions(records), json: values.json };
    return values.against === undefined
      ? evaluatePositions(job, times)
      : evaluateAgainst(job, values.against);
  },
};

function timesOf(at: readonly string[] | undefined, every: string | undefined): Times {
  if (at !== undefined && every !== undefined)
    throw usageError('evaluate', '--at and --every exclude each other');
  if (at !== undefined) return { kind: 'at', epochs: at.map(epochOf) };
  if (every === undefined) return { kind: 'toe' };
  const step = every.trim() === '' ? Number.NaN : Number(every);
  if (!(step > 0 && step < Number.POSITIVE_INFINITY)) {
    throw usageError('evaluate', `--every takes seconds above 0, not "${every}"`);
  }
  return { kind: 'every', step };
}

function epochOf(text: string): GnssTime {
  const time = fromIso(text);
  if (time !== undefined) return time;
  throw usageError(
    'evaluate',
    `"${text}" is no GPS time such as 2022-01-01T06:00:00 (no zone: GPS time is not UTC)`,
  );
}

function satelliteOf(text: string | undefined): string | undefined {
  if (text === undefined || /^[A-Z]\d\d$/.test(text)) return text;
  throw usageError('evaluate', `"${text}" is no satellite such as G07`);
}

/** All records of the file, or those of one satellite; at least one. */
async function readRecords(file: string, satellite: string | undefined): Promise<NavigationRecord[]> {
  const records: NavigationRecord[] = [];
  for await (const record of readRinexNavigation(file)) {
    if (satellite === undefined || record.satellite === satellite) records.push(record);
  }
  if (records.length > 0) return records;
  throw new InputError({
    code: 'evaluate.no-records',
    place: { file },
    what: `the file holds no GPS LNAV record${satellite === undefined ? '' : ` of ${satellite}`}`,
    why: 'There is nothing to evaluate; other systems and messages are passed over.',
    remedy: 'Name a file with GPS LNAV ephemerides, or another satellite.',
  });
}
