import type { NavigationRecord } from '../messages/navigation-record.ts';
import { nearestRecord } from '../messages/select-record.ts';
import { position } from '../models/broadcast.ts';
import { GPS } from '../systems/gps.ts';
import { type GnssTime, secondsBetween } from '../time/gnss-time.ts';
import { differenceVelocity, distanceBetween, type OrbitError, orbitError } from './orbit-error.ts';
import type { Sp3Epoch, Sp3State } from './sp3.ts';

/** One epoch of one satellite for which both broadcast and precise orbit are known. */
export interface ComparedPoint {
  readonly time: GnssTime;
  /** The record that gave the broadcast position. */
  readonly record: NavigationRecord;
  /** Broadcast minus precise position. */
  readonly error: OrbitError;
  /** Length of broadcast minus precise velocity, m/s, where the precise orbit has velocities. */
  readonly velocityError?: number;
}

/** Statistics over compared points; positions in metres. */
export interface Comparison {
  readonly satellites: number;
  readonly points: number;
  readonly rms: number;
  readonly radialRms: number;
  readonly alongRms: number;
  readonly crossRms: number;
  /** m/s, over the points that have a velocity. */
  readonly velocityRms?: number;
  /** The point with the largest error. */
  readonly worst: ComparedPoint;
}

/** A record is used up to so many seconds from its toe; records follow each other every two hours. */
const REACH = 3600;

/**
 * Compares one epoch of a precise orbit with GPS LNAV records: broadcast minus precise, with the healthy
 * record whose toe is nearest and within an hour (`nearestRecord`). The broadcast position is that of the
 * antenna, the precise one that of the centre of mass: about -1 m of radial error belongs to that (common
 * practice, no source).
 *
 * @param records records by satellite
 * @param epoch precise states
 */
export function compareEpoch(
  records: ReadonlyMap<string, readonly NavigationRecord[]>,
  epoch: Sp3Epoch,
): ComparedPoint[] {
  return epoch.states.flatMap((state) => {
    const record = nearestRecord(records.get(state.satellite) ?? [], epoch.time, () => REACH);
    return record === undefined ? [] : [compareState(record, state, epoch.time)];
  });
}

function compareState(record: NavigationRecord, state: Sp3State, time: GnssTime): ComparedPoint {
  const tk = secondsBetween(record.toe, time);
  const positionAt = (t: number) => position(record.elements, GPS, t);
  const velocity = differenceVelocity(positionAt, tk);
  return {
    time,
    record,
    error: orbitError(positionAt(tk), state.position, velocity, GPS.OmegaEDot),
    ...(state.velocity && { velocityError: distanceBetween(velocity, state.velocity) }),
  };
}

/** Statistics over all the points, none left out; undefined where there are none. */
export function summarize(points: readonly ComparedPoint[]): Comparison | undefined {
  const [first, ...rest] = points;
  if (first === undefined) return undefined;
  const velocityErrors = points.flatMap((point) => point.velocityError ?? []);
  return {
    satellites: new Set(points.map((point) => point.record.satellite)).size,
    points: points.length,
    rms: rootMeanSquare(points.map((point) => point.error.total)),
    radialRms: rootMeanSquare(points.map((point) => point.error.radial)),
    alongRms: rootMeanSquare(points.map((point) => point.error.along)),
    crossRms: rootMeanSquare(points.map((point) => point.error.cross)),
    ...(velocityErrors.length > 0 && { velocityRms: rootMeanSquare(velocityErrors) }),
    worst: rest.reduce((worst, point) => (point.error.total > worst.error.total ? point : worst), first),
  };
}

/** Square root of the mean of the squares; 0 of nothing. */
function rootMeanSquare(values: readonly number[]): number {
  if (values.length === 0) return 0;
  return Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / values.length);
}
