import type { CentralBody } from '../models/two-body.ts';

/** The Earth as a central body. Source: WGS 84, NIMA TR8350.2, table 3.1 (value from memory). */
export const EARTH: CentralBody = { mu: 3.986004418e14 };
