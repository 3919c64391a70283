import { describe, expect, test } from 'vitest';
import { firstFailure } from './battery/battery.ts';
import { FAULTS } from './faults/faults.ts';
import { faultyAnalysis, withFault } from './faulty.ts';

const withoutFault = firstFailure(await faultyAnalysis());

test('the battery of checks finds nothing wrong in the error proof', () => {
  expect(withoutFault).toBeUndefined();
});

describe('a fault in the error proof is noticed', () => {
  test.each(
    FAULTS.filter(({ name }) =>
      [
        'half the rounding of products',
        'a quotient with the wrong end',
        'the slope of M without denominator',
        'halves of a box with a gap',
      ].includes(name),
    ),
  )('$name', async (fault) => {
    const failure = firstFailure(await faultyAnalysis(fault));
    expect(failure).toBeDefined();
    expect(failure).not.toBe(withoutFault); // it is the fault that is noticed
  });

  test('every fault of the deep list has one place in its file', () => {
    for (const fault of FAULTS) expect(withFault(fault)).toContain(fault.replace);
  });

  test('a fault without a place is none', () => {
    const [first] = FAULTS as readonly [(typeof FAULTS)[number]];
    expect(() => withFault({ ...first, find: 'text that stands nowhere' })).toThrow(/occurs 0 times/);
    expect(() => withFault({ ...first, replace: first.find })).toThrow(/occurs 1 times/);
  });
});
