import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { onTestFinished } from 'vitest';

/** Path of a file with this content that is removed when the test has ended. */
export function temporaryFile(content: string | Uint8Array, name = 'file'): string {
  const folder = mkdtempSync(join(tmpdir(), 'bound-orbit-'));
  onTestFinished(() => rmSync(folder, { recursive: true }));
  const path = join(folder, name);
  writeFileSync(path, content, 'latin1');
  return path;
}
