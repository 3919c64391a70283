import { groupBy } from '../messages/group-by.ts';
import type { NavigationRecord } from '../messages/navigation-record.ts';
import { type ComparedPoint, type Comparison, summarize } from './compare.ts';

/** A record whose orbit stands far outside what the others of its group do. */
export interface Suspect {
  readonly record: NavigationRecord;
  /** Statistics over the points that this record gave. */
  readonly comparison: Comparison;
}

/** The outcome of the test for outliers. */
export interface SuspectSearch {
  /**
   * Error from which on a point makes its record suspect, m; undefined where the records are too few to tell.
   */
  readonly limit: number | undefined;
  readonly suspects: readonly Suspect[];
  /** Statistics over the points of all other records; undefined where none are left. */
  readonly others: Comparison | undefined;
}

/** With fewer records the median may itself be that of a bad one. */
const FEWEST_RECORDS = 5;

/**
 * Robust standard deviations above the median. Sound GPS broadcast orbits of whole days reach 8 (measured).
 */
const DEVIATIONS = 15;

/** Median absolute deviation to standard deviation, for a normal distribution. */
const NORMAL = 1.4826;

/** SP3 gives positions to a millimetre: no spread is taken for less, m. */
const RESOLUTION = 1e-3;

/**
 * Tests each record of a group against the spread of the whole group: a record is suspect if any of its
 * points has an error above the median by fifteen robust standard deviations (median absolute deviation times
 * 1.4826).
 */
export function findSuspects(points: readonly ComparedPoint[]): SuspectSearch {
  const byRecord = groupBy(points, (point) => point.record);
  if (byRecord.size < FEWEST_RECORDS) return { limit: undefined, suspects: [], others: summarize(points) };
  const errors = points.map((point) => point.error.total);
  const middle = median(errors);
  const spread = Math.max(median(errors.map((error) => Math.abs(error - middle))), RESOLUTION);
  const limit = middle + DEVIATIONS * NORMAL * spread;
  const isFar = (point: ComparedPoint) => point.error.total > limit;
  const suspects = [...byRecord].flatMap(([record, own]) => {
    const comparison = own.some(isFar) ? summarize(own) : undefined;
    return comparison === undefined ? [] : [{ record, comparison }];
  });
  const bad = new Set(suspects.map((suspect) => suspect.record));
  return { limit, suspects, others: summarize(points.filter((point) => !bad.has(point.record))) };
}

function median(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b);
  const half = Math.floor(sorted.length / 2);
  const upper = sorted[half] ?? 0;
  return sorted.length % 2 === 1 ? upper : ((sorted[half - 1] ?? 0) + upper) / 2;
}
