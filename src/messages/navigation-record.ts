import type { BroadcastElements, ClockParameters } from '../models/broadcast.ts';
import type { GnssTime } from '../time/gnss-time.ts';

/** One broadcast ephemeris as a navigation file gives it. */
export interface NavigationRecord {
  /** System letter and two digits, such as G07. */
  readonly satellite: string;
  readonly message: 'LNAV';
  /** Reference time of the clock. */
  readonly toc: GnssTime;
  /** Reference time of the ephemeris, within half a week of toc. */
  readonly toe: GnssTime;
  /** All that the model needs, in its units. */
  readonly elements: BroadcastElements & ClockParameters;
  /** Health bits, 0 to 63; 0 is good (IS-GPS-200, 20.3.3.3.1.4). */
  readonly health: number;
  /** Issue of data, ephemeris. */
  readonly iode: number;
  /** Issue of data, clock. */
  readonly iodc: number;
  /** User range accuracy, m. */
  readonly uraMetres?: number;
  /** Length of the interval that the elements were fitted over, centred on toe, h. */
  readonly fitIntervalHours?: number;
  /** When the message was sent, within half a week of toe. */
  readonly transmissionTime?: GnssTime;
  /** Line of the file where the record starts, from 1. */
  readonly line: number;
}
