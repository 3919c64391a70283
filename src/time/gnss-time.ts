/** Seconds in one week. */
export const WEEK = 604800;

/**
 * An instant on a system time scale without leap seconds.
 *
 * Seconds are kept within the week, so that float64 resolves them to better than 1.2e-10 s in any week.
 */
export interface GnssTime {
  /** Continuous week number; week 0 of GPS time begins on 1980-01-06 (IS-GPS-200, 3.3.4). Never truncated. */
  readonly week: number;
  /** Seconds of the week, 0 <= seconds < 604800. */
  readonly seconds: number;
}

/**
 * The instant so many seconds after the start of a week.
 *
 * @param week continuous week number, an integer
 * @param seconds seconds after the start of that week, any finite value
 */
export function gnssTime(week: number, seconds: number): GnssTime {
  const carry = Math.floor(seconds / WEEK);
  const rest = seconds - carry * WEEK;
  if (rest >= WEEK) return { week: week + carry + 1, seconds: 0 }; // rounded up to a whole week
  return { week: week + carry, seconds: Math.max(0, rest) }; // a tiny negative quotient rounds to zero
}

/** The instant a number of seconds later. */
export function addSeconds(time: GnssTime, seconds: number): GnssTime {
  return gnssTime(time.week, time.seconds + seconds);
}

/** Seconds from `from` to `to`; negative where `to` is earlier. */
export function secondsBetween(from: GnssTime, to: GnssTime): number {
  return (to.week - from.week) * WEEK + (to.seconds - from.seconds);
}

/**
 * A difference of two times of week, brought to within half a week of zero.
 * Source: IS-GPS-200, Table 20-IV, footnote on tk (there: subtract or add 604800 s where |tk| > 302400 s).
 *
 * @param seconds any finite difference, s
 * @returns the difference in [-302400, 302400], s
 */
export function wrapHalfWeek(seconds: number): number {
  if (Math.abs(seconds) <= WEEK / 2) return seconds;
  return seconds - WEEK * Math.round(seconds / WEEK);
}

/**
 * The full week number that a truncated one stands for, nearest to a reference.
 *
 * @param truncated week number modulo `cycle`, as broadcast
 * @param reference an instant known to within half a cycle
 * @param cycle number of weeks after which the broadcast number repeats; 1024 for the ten bits of LNAV
 *   (IS-GPS-200, 20.3.3.3.1.1)
 */
export function resolveWeek(truncated: number, reference: GnssTime, cycle = 1024): number {
  return truncated + cycle * Math.round((reference.week - truncated) / cycle);
}

/**
 * The instant with a given second of the week that lies nearest to a reference.
 *
 * @param secondsOfWeek 0 <= secondsOfWeek < 604800
 * @param reference the instant to stay within half a week of
 */
export function nearestTime(secondsOfWeek: number, reference: GnssTime): GnssTime {
  const weeks = Math.round((reference.seconds - secondsOfWeek) / WEEK);
  return { week: reference.week + weeks, seconds: secondsOfWeek };
}
