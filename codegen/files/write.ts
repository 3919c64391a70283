import { mkdirSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/**
 * Writes several files of one folder so that either all stand there or none is touched: each goes to a temporary
 * name first and is renamed when all are written.
 *
 * @param folder the folder, made when missing
 * @param files text by file name
 */
export function writeTogether(folder: string, files: ReadonlyMap<string, string>): void {
  mkdirSync(folder, { recursive: true });
  const temporary = new Map(
    [...files.keys()].map((name) => [name, join(folder, `.${name}.${process.pid}.part`)]),
  );
  try {
    for (const [name, text] of files) writeFileSync(temporary.get(name)!, text);
    for (const [name, part] of temporary) renameSync(part, join(folder, name));
  } catch (error) {
    for (const part of temporary.values()) rmSync(part, { force: true });
    throw error;
  }
}
