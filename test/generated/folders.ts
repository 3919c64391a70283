import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Certificate } from '../../codegen/certificate/certificate.ts';

/** A committed variant. */
export interface Folder {
  readonly name: string;
  readonly path: string;
  readonly certificate: Certificate;
}

/** All folders of generated/ that hold a certificate. */
export function folders(): readonly Folder[] {
  const root = fileURLToPath(new URL('../../generated', import.meta.url));
  return readdirSync(root)
    .filter((name) => existsSync(`${root}/${name}/certificate.json`))
    .map((name) => {
      const path = `${root}/${name}`;
      return {
        name,
        path,
        certificate: JSON.parse(readFileSync(`${path}/certificate.json`, 'utf8')) as Certificate,
      };
    });
}
