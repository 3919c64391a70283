import { expect, test } from 'vitest';
import { firstFailure } from './battery/battery.ts';
import { FAULTS } from './faults/faults.ts';
import { faultyAnalysis } from './faulty.ts';

const withoutFault = firstFailure(await faultyAnalysis());

test('the battery of checks finds nothing wrong in the analysis as it stands', () => {
  expect(withoutFault).toBeUndefined();
});

test('no two faults are the same', () => {
  for (const key of [({ name }) => name, ({ file, find }) => `${file} ${find}`] as ((
    fault: (typeof FAULTS)[number],
  ) => string)[])
    expect(new Set(FAULTS.map(key)).size).toBe(FAULTS.length);
  expect(FAULTS.length).toBeGreaterThan(90);
});

test.each(FAULTS)('noticed: $name', async (fault) => {
  const failure = firstFailure(await faultyAnalysis(fault));
  expect(failure).toBeDefined();
  expect(failure).not.toBe(withoutFault); // it is the fault that is noticed
});
