import { InputError, type Place } from '../../finding.ts';

/** A fault of a RINEX file, with the remedy that all of them share. */
export function rinexFault(code: string, place: Place, what: string, why: string): InputError {
  return new InputError({
    code: `rinex.${code}`,
    place,
    what,
    why,
    remedy: 'Mend the file at this place or fetch it again.',
  });
}
