import type { NavigationRecord } from '../../src/messages/navigation-record.ts';
import { readRinexNavigation } from '../../src/messages/rinex/read.ts';

/** All records of a file. */
export async function readRecords(path: string): Promise<NavigationRecord[]> {
  const records: NavigationRecord[] = [];
  for await (const record of readRinexNavigation(path)) records.push(record);
  return records;
}

/** A healthy record: G01 with toe 2022-01-01 00:00. */
export async function sampleRecord(): Promise<NavigationRecord> {
  const [record] = await readRecords('test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx');
  if (record === undefined) throw new Error('the file has records');
  return record;
}
