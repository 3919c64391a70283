import { describe, expect, it } from 'vitest';
import type { NavigationRecord } from '../../src/messages/navigation-record.ts';
import { halfFitInterval, nearestRecord } from '../../src/messages/select-record.ts';
import { addSeconds } from '../../src/time/gnss-time.ts';
import { sampleRecord } from './records.ts';

const sample = await sampleRecord();
const start = sample.toe;
const hour = () => 3600;

/** The sample, its toe moved by hours, other changes on top. */
function record(hours: number, changes: Partial<NavigationRecord> = {}): NavigationRecord {
  return { ...sample, toe: addSeconds(start, hours * 3600), line: 100 + hours, ...changes };
}

describe('nearestRecord', () => {
  it('takes the nearest toe, in whatever order the records stand', () => {
    const records = [record(4), record(0), record(2)];
    expect(nearestRecord(records, addSeconds(start, 3599), hour)?.line).toBe(100);
    expect(nearestRecord(records, addSeconds(start, 3601), hour)?.line).toBe(102);
  });

  it('takes the later of two toes that are equally near', () => {
    const at = addSeconds(start, 3600);
    expect(nearestRecord([record(0), record(2)], at, hour)?.line).toBe(102);
    expect(nearestRecord([record(2), record(0)], at, hour)?.line).toBe(102);
  });

  it('takes of two with one toe the one sent later, else the later in the file', () => {
    const early = record(0, { line: 1, transmissionTime: addSeconds(start, -7000) });
    const late = record(0, { line: 2, transmissionTime: addSeconds(start, -3000) });
    expect(nearestRecord([early, late], start, hour)?.line).toBe(2);
    expect(nearestRecord([late, early], start, hour)?.line).toBe(2);
    const { transmissionTime, ...unsent } = record(0, { line: 3 });
    expect(transmissionTime).toBeDefined();
    expect(nearestRecord([late, unsent], start, hour)?.line).toBe(3);
    expect(nearestRecord([unsent, late], start, hour)?.line).toBe(2);
  });

  it('passes over unhealthy records', () => {
    const records = [record(0, { health: 1 }), record(2), record(4, { health: 63 })];
    expect(nearestRecord(records, start, () => 7200)?.line).toBe(102);
    expect(nearestRecord([record(0, { health: 32 })], start, hour)).toBeUndefined();
  });

  it('goes as far as the reach and no further', () => {
    expect(nearestRecord([record(0)], addSeconds(start, 3600), hour)?.line).toBe(100);
    expect(nearestRecord([record(0)], addSeconds(start, -3600), hour)?.line).toBe(100);
    expect(nearestRecord([record(0)], addSeconds(start, 3600.001), hour)).toBeUndefined();
    expect(nearestRecord([], start, hour)).toBeUndefined();
  });
});

describe('halfFitInterval', () => {
  it('is two hours unless the record says otherwise (IS-GPS-200, 20.3.4.4)', () => {
    expect(halfFitInterval(record(0, { fitIntervalHours: 6 }))).toBe(10800);
    const { fitIntervalHours, ...silent } = sample;
    expect(fitIntervalHours).toBe(4);
    expect(halfFitInterval(silent)).toBe(7200);
  });
});
