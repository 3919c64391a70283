import { readFileSync } from 'node:fs';
import benny from 'benny';
import { Random } from '../../codegen/numbers/random.ts';
import { importKernel } from '../../codegen/observe/module.ts';
import { Points } from '../../codegen/observe/points.ts';
import { type BroadcastElements, position } from '../../src/models/broadcast.ts';
import { GPS } from '../../src/systems/gps.ts';
import { gpsLnav } from '../../src/systems/gps-lnav.ts';

/** Satellites that one case goes through. */
const COUNT = 64;

/** Committed variants of the broadcast model that are compared with the reference. */
const FOLDERS = ['tide-gauge', 'drift-buoy', 'ice-tag'];

const names = Object.keys(gpsLnav.domains['flown']!);
const points = new Points(gpsLnav.domains['flown']!, names, new Random(5));
const inputs = Array.from({ length: COUNT }, () => points.draw());
const out = new Float64Array(3);

async function tick(folder: string): Promise<() => void> {
  const kernel = await importKernel(
    readFileSync(new URL(`../../generated/${folder}/kernel.js`, import.meta.url), 'utf8'),
  );
  const states = inputs.map((point) => {
    const state = new Float64Array(kernel.stateWords);
    kernel.setup(point, state);
    return state;
  });
  return () => {
    for (let k = 0; k < COUNT; k++) kernel.position(inputs[k]!['t']!, states[k]!, out);
  };
}

const kernels = await Promise.all(FOLDERS.map(async (folder) => ({ folder, run: await tick(folder) })));

await benny.suite(
  `${COUNT} ticks of the GPS broadcast model, V8; ratios count, not times`,
  benny.add('reference', () => {
    for (const point of inputs) position(point as unknown as BroadcastElements, GPS, point['t']!);
  }),
  ...kernels.map(({ folder, run }) => benny.add(folder, run)),
  benny.cycle(),
  benny.complete(),
);
