import { fromCalendar } from '../../time/calendar.ts';
import { type GnssTime, nearestTime, secondsBetween, WEEK } from '../../time/gnss-time.ts';
import { LNAV, type LnavSymbol } from '../lnav.ts';
import type { NavigationRecord } from '../navigation-record.ts';
import { RecordCells } from './cells.ts';
import type { RecordLines } from './record-lines.ts';

/** Fields that stand in the record as numbers, in the order of the record. */
const SLOTS = (Object.keys(LNAV) as LnavSymbol[]).flatMap((symbol) => {
  const { rinex, unit, scale } = LNAV[symbol];
  if (rinex === undefined || rinex.holds === 'date') return [];
  return [{ symbol, ...rinex, isCount: rinex.holds === 'value' && unit === '1' && scale === 1 }];
});

const EPOCHS = {
  2: /^([ \d]\d) ([ \d]\d) ([ \d]\d) ([ \d]\d) ([ \d]\d) ([ \d]\d) ?([ \d]{1,2}\.\d?) *$/,
  3: /^G([ \d]\d) (\d{4}) ([ \d]\d) ([ \d]\d) ([ \d]\d) ([ \d]\d) ([ \d]\d)$/,
} as const;

/**
 * Stands for a transmission time that the writer does not know. Source: RINEX 2.11, Table A4 (from memory).
 */
const UNKNOWN_TIME = 0.9999e9;

/** The weeks of LNAV repeat after 1024; some writers leave the week truncated. */
const WEEK_CYCLE = 1024;

type Values = Record<LnavSymbol, number>;

const NO_VALUES = Object.fromEntries(Object.keys(LNAV).map((symbol) => [symbol, Number.NaN])) as Values;

/**
 * Reads one GPS LNAV record.
 *
 * @param file name for findings
 * @param record its eight lines
 * @throws InputError with code rinex.number, rinex.blank, rinex.epoch, rinex.range or rinex.week
 */
export function readLnavRecord(file: string, record: RecordLines): NavigationRecord {
  const cells = new RecordCells(file, record);
  const { satellite, toc } = readEpoch(cells, record.generation);
  const values = readValues(cells);
  checkRanges(cells, values);
  const toe = nearestTime(values.toe, toc);
  checkWeek(cells, values.WN, toe);
  const sent = cells.optional('transmission time', 7, 0);
  return {
    satellite,
    message: 'LNAV',
    toc,
    toe,
    elements: elementsOf(values, secondsBetween(toc, toe)),
    health: values.health,
    iode: values.IODE,
    iodc: values.IODC,
    ...(values.URA >= 0 && { uraMetres: values.URA }),
    ...(values.fitInterval > 0 && { fitIntervalHours: values.fitInterval }),
    ...(sent !== undefined && sent < UNKNOWN_TIME && { transmissionTime: sentNear(sent, toe) }),
    line: record.first,
  };
}

/** Numbers by symbol; NaN for a blank slot that may be blank. */
function readValues(cells: RecordCells): Values {
  const values = { ...NO_VALUES };
  for (const { symbol, line, column, blank, isCount } of SLOTS) {
    const value =
      blank === 'fault' ? cells.required(symbol, line, column) : cells.optional(symbol, line, column);
    if (isCount && value !== undefined && !(Number.isInteger(value) && value >= 0)) {
      throw cells.fault('range', line, column, `${symbol} is ${value}, not a count`);
    }
    values[symbol] = value ?? Number.NaN;
  }
  return values;
}

function readEpoch(
  cells: RecordCells,
  generation: RecordLines['generation'],
): { satellite: string; toc: GnssTime } {
  const match = (generation === 2 ? EPOCHS[2] : EPOCHS[3]).exec(cells.epoch);
  if (match === null) throw cells.fault('epoch', 0, 0, `"${cells.epoch}" is not a satellite and an epoch`);
  const [number, year, month, day, hour, minute, second] = match.slice(1).map(Number) as [
    number,
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const fullYear = generation === 2 ? year + (year >= 80 ? 1900 : 2000) : year; // RINEX 2.11, 6.5
  const toc = fromCalendar({ year: fullYear, month, day, hour, minute, second });
  if (toc === undefined) throw cells.fault('epoch', 0, 0, `no calendar has the epoch in "${cells.epoch}"`);
  return { satellite: `G${String(number).padStart(2, '0')}`, toc };
}

/** Values without which the model has no orbit or no time. */
function checkRanges(cells: RecordCells, values: Values): void {
  const check = (symbol: 'e' | 'sqrtA' | 'toe', holds: boolean, range: string): void => {
    const slot = LNAV[symbol].rinex;
    if (holds || slot === undefined) return;
    throw cells.fault('range', slot.line, slot.column, `${symbol} is ${values[symbol]}, outside ${range}`);
  };
  check('e', values.e >= 0 && values.e < 1, '[0, 1)');
  check('sqrtA', values.sqrtA > 0, '(0, infinity)');
  check('toe', values.toe >= 0 && values.toe < WEEK, `[0, ${WEEK})`);
}

/** The week is that of toe or, as some writers have it, of the transmission; full or truncated. */
function checkWeek(cells: RecordCells, week: number, toe: GnssTime): void {
  const difference = week - toe.week;
  const distance = Math.abs(difference - WEEK_CYCLE * Math.round(difference / WEEK_CYCLE));
  if (distance === 0 || distance === 1) return;
  const slot = LNAV.WN.rinex;
  throw cells.fault(
    'week',
    slot?.line ?? 0,
    slot?.column ?? 0,
    `week ${week} contradicts the epoch, week ${toe.week}`,
  );
}

/** Some writers count the transmission time on past the end of the week or below its start. */
function sentNear(seconds: number, toe: GnssTime): GnssTime {
  return nearestTime(seconds - WEEK * Math.floor(seconds / WEEK), toe);
}

function elementsOf(values: Values, toeMinusToc: number): NavigationRecord['elements'] {
  return {
    sqrtA: values.sqrtA,
    e: values.e,
    i0: values.i0,
    Omega0: values.Omega0,
    omega: values.omega,
    M0: values.M0,
    deltaN: values.deltaN,
    IDOT: values.IDOT,
    OmegaDot: values.OmegaDot,
    Cuc: values.Cuc,
    Cus: values.Cus,
    Crc: values.Crc,
    Crs: values.Crs,
    Cic: values.Cic,
    Cis: values.Cis,
    toe: values.toe,
    af0: values.af0,
    af1: values.af1,
    af2: values.af2,
    TGD: values.TGD,
    toeMinusToc,
  };
}
