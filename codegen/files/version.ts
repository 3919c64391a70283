import { readFileSync } from 'node:fs';

/** Name and version of this tool, from its package.json. */
export function toolVersion(): string {
  for (const path of ['../../package.json', '../../../package.json']) {
    try {
      const { name, version } = JSON.parse(readFileSync(new URL(path, import.meta.url), 'utf8')) as {
        name: string;
        version: string;
      };
      return `${name} ${version}`;
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'ENOENT') throw error;
    }
  }
  throw new Error('package.json is missing');
}
