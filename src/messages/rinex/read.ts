import type { NavigationRecord } from '../navigation-record.ts';
import { readLines } from '../text-lines.ts';
import { HeaderReader } from './header.ts';
import { readLnavRecord } from './lnav-record.ts';
import { RecordCutter } from './record-lines.ts';

/**
 * GPS LNAV records of a RINEX navigation file of version 2, 3 or 4, in the order of the file.
 *
 * Other systems and other messages are passed over; a file without GPS LNAV gives no records. The file is
 * read in chunks, so memory does not grow with its size.
 *
 * @param path file to read
 * @throws InputError at the first fault, with its line; codes start with rinex. or file.
 */
export async function* readRinexNavigation(path: string): AsyncGenerator<NavigationRecord> {
  const header = new HeaderReader(path);
  let cutter: RecordCutter | undefined;
  let number = 0;
  for await (const lines of readLines(path)) {
    for (const line of lines) {
      number++;
      if (cutter === undefined) {
        const layout = header.push(line, number);
        if (layout !== undefined) cutter = new RecordCutter(path, layout);
        continue;
      }
      const record = cutter.push(line, number);
      if (record !== undefined) yield readLnavRecord(path, record);
    }
  }
  if (cutter === undefined) throw header.unfinished(number);
  cutter.end(number);
}
