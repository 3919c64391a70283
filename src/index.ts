/**
 * bound-orbit: reference models of satellite prediction, their constants, and readers of navigation files.
 * The generator of kernels is the command line, bound-orbit.
 */
export { type Finding, InputError, type Place } from './finding.ts';
export { eccentricAnomaly } from './kepler/eccentric-anomaly.ts';
export type { NavigationRecord } from './messages/navigation-record.ts';
export { readRinexNavigation } from './messages/rinex/read.ts';
export {
  type BroadcastElements,
  type ClockParameters,
  clock,
  position,
  relativisticTerm,
} from './models/broadcast.ts';
export type { Domain, ModelDescription, Range } from './models/description.ts';
export type { Position } from './models/position.ts';
export { type CentralBody, type ClassicalElements, position as twoBodyPosition } from './models/two-body.ts';
export { readSp3, type Sp3Epoch, type Sp3State } from './orbits/sp3.ts';
export { MODELS } from './systems/catalogue.ts';
export type { EarthConstants } from './systems/constants.ts';
export { EARTH } from './systems/earth.ts';
export { GPS, GPS_PI, SPEED_OF_LIGHT } from './systems/gps.ts';
export { fromCalendar, fromIso, toCalendar, toIso } from './time/calendar.ts';
export {
  addSeconds,
  type GnssTime,
  gnssTime,
  resolveWeek,
  secondsBetween,
  WEEK,
  wrapHalfWeek,
} from './time/gnss-time.ts';
