import { type GnssTime, secondsBetween } from '../time/gnss-time.ts';
import type { NavigationRecord } from './navigation-record.ts';

/** Source: IS-GPS-200, 20.3.4.4: a fit interval flag of 0 stands for four hours. */
const USUAL_FIT_HOURS = 4;

/** Half the fit interval of a record, s; of four hours where the record does not tell. */
export function halfFitInterval(record: NavigationRecord): number {
  return ((record.fitIntervalHours ?? USUAL_FIT_HOURS) / 2) * 3600;
}

/**
 * The healthy record of one satellite to use at a time: the one whose toe is nearest and within reach.
 *
 * Of two that are equally near, the later toe wins, for a satellite sends an ephemeris during the two hours
 * before its toe rather than after (common practice, no source); of two with one toe, the one sent later;
 * then the later in the file.
 *
 * @param records records of one satellite
 * @param time time of use
 * @param reach largest distance from toe that a record may be used at, s
 */
export function nearestRecord(
  records: readonly NavigationRecord[],
  time: GnssTime,
  reach: (record: NavigationRecord) => number,
): NavigationRecord | undefined {
  let best: NavigationRecord | undefined;
  for (const record of records) {
    if (record.health !== 0 || distance(record, time) > reach(record)) continue;
    if (best === undefined || !isBetter(best, record, time)) best = record;
  }
  return best;
}

/** Whether `one` is to be preferred to `other`, which stands later in the file. */
function isBetter(one: NavigationRecord, other: NavigationRecord, time: GnssTime): boolean {
  const nearer = distance(other, time) - distance(one, time);
  if (nearer !== 0) return nearer > 0;
  const later = secondsBetween(other.toe, one.toe);
  if (later !== 0) return later > 0;
  const [sent, otherSent] = [one.transmissionTime, other.transmissionTime];
  return sent !== undefined && otherSent !== undefined && secondsBetween(otherSent, sent) > 0;
}

function distance(record: NavigationRecord, time: GnssTime): number {
  return Math.abs(secondsBetween(record.toe, time));
}
