import type { ModelDescription } from '../models/description.ts';
import { earthOrbit } from './earth-orbit.ts';
import { gpsLnav } from './gps-lnav.ts';

/** All models with their systems, by name. */
export const MODELS: Readonly<Record<string, ModelDescription>> = Object.fromEntries(
  [gpsLnav, earthOrbit].map((model) => [model.name, model]),
);
