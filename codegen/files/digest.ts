import { createHash } from 'node:crypto';

/** SHA-256 of text or bytes, in hexadecimal. */
export function digest(data: string | Uint8Array): string {
  return createHash('sha256').update(data).digest('hex');
}
