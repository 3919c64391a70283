import { grid } from './field.ts';
import { LNAV, type LnavSymbol } from './lnav.ts';
import type { NavigationRecord } from './navigation-record.ts';

/** Records that claim to be one data set and differ. */
export interface Contradiction {
  /** One record of each variant, in the order of the file; at least two. */
  readonly variants: readonly [NavigationRecord, NavigationRecord, ...NavigationRecord[]];
  /** Fields in which any variant differs from the first. */
  readonly fields: readonly LnavSymbol[];
}

type ElementSymbol = LnavSymbol & keyof NavigationRecord['elements'];

const ELEMENTS: readonly ElementSymbol[] = [
  'sqrtA',
  'e',
  'i0',
  'Omega0',
  'omega',
  'M0',
  'deltaN',
  'IDOT',
  'OmegaDot',
  'Cuc',
  'Cus',
  'Crc',
  'Crs',
  'Cic',
  'Cis',
  'toe',
  'af0',
  'af1',
  'af2',
  'TGD',
];

/**
 * Finds records of one satellite with the same toe, IODE and IODC whose elements differ: an issue of data
 * names one set of values (IS-GPS-200, 20.3.4.4). Values are compared as multiples of the field's step, so
 * that the digits a writer cut off make no difference.
 */
export function findContradictions(records: Iterable<NavigationRecord>): Contradiction[] {
  const issues = new Map<string, NavigationRecord[]>();
  for (const record of records) {
    const { satellite, toe, iode, iodc } = record;
    const key = `${satellite} ${toe.week} ${toe.seconds} ${iode} ${iodc}`;
    const variants = issues.get(key);
    if (variants === undefined) issues.set(key, [record]);
    else if (variants.every((variant) => differing(variant, record).length > 0)) variants.push(record);
  }
  return [...issues.values()].flatMap((variants) => {
    const [first, second, ...more] = variants;
    if (first === undefined || second === undefined) return [];
    const fields = ELEMENTS.filter((symbol) => variants.some((variant) => differs(symbol, first, variant)));
    return [{ variants: [first, second, ...more], fields }];
  });
}

function differing(one: NavigationRecord, other: NavigationRecord): ElementSymbol[] {
  return ELEMENTS.filter((symbol) => differs(symbol, one, other));
}

function differs(symbol: ElementSymbol, one: NavigationRecord, other: NavigationRecord): boolean {
  const step = grid(LNAV[symbol]);
  return Math.round(one.elements[symbol] / step) !== Math.round(other.elements[symbol] / step);
}
