import type { Domain, ModelDescription, Range } from '../models/description.ts';
import { EARTH } from './earth.ts';

const full: Range = { min: -Math.PI, max: Math.PI, from: 'the full circle, rounded to float64' };

/** Elliptic orbits from low ones to the geosynchronous altitude, up to an eccentricity. */
function upTo(e: number, from: string): Domain {
  return {
    a: {
      min: 6.6e6,
      max: 4.3e7,
      from: 'from 220 km of altitude to a little above the geosynchronous radius',
    },
    e: { min: 0, max: e, from },
    i: { min: 0, max: Math.PI, from: 'all inclinations, rounded to float64' },
    Omega: full,
    omega: full,
    M0: full,
    t: { min: -7200, max: 7200, from: 'two hours on each side of the epoch' },
  };
}

/** Unperturbed orbits around the Earth. */
export const earthOrbit: ModelDescription = {
  name: 'earth-orbit',
  title: 'Unperturbed elliptic orbit around the Earth, inertial position',
  source: 'Vallado, Fundamentals of Astrodynamics and Applications, sections 2.2 and 2.6',
  file: new URL('../models/two-body.ts', import.meta.url),
  outputs: { position: { function: 'position', unit: 'm' } },
  units: { a: 'm', e: '1', i: 'rad', Omega: 'rad', omega: 'rad', M0: 'rad' },
  constants: { ...EARTH },
  frameRate: 0,
  domains: {
    'near-circular': upTo(0.1, 'common practice, no source: most Earth satellites'),
    eccentric: upTo(0.7, 'common practice, no source: up to twelve-hour orbits of high apogee'),
    'highly-eccentric': upTo(0.9, 'common practice, no source: transfer orbits and beyond'),
  },
};
