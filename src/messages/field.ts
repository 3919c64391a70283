import { GPS_PI } from '../systems/gps.ts';

/** Units on the air. Angles are in semicircles there, in radians in the models. */
export type BroadcastUnit =
  | 'semicircle'
  | 'semicircle/s'
  | 'rad'
  | 'm'
  | 'm^(1/2)'
  | 's'
  | 's/s'
  | 's/s^2'
  | 'week'
  | '1';

/** A run of bits in a subframe of 300 bits. */
export interface BitRun {
  readonly subframe: number;
  /**
   * First bit, counted from 1 at the start of the subframe, parity included, as the figures of IS-GPS-200 do.
   */
  readonly firstBit: number;
  readonly bits: number;
}

/** Where a RINEX navigation record holds the field. */
export interface RinexSlot {
  /** 0 for the epoch line, 1 to 7 for the broadcast orbit lines. */
  readonly line: number;
  /** 0 to 3; column 0 of line 0 is the satellite and the epoch. */
  readonly column: number;
  /**
   * What stands there: the value in the model's unit; for the accuracy the metres that the index stands for;
   * for the fit interval flag the hours that it stands for; for toc the calendar date.
   */
  readonly holds: 'value' | 'metres' | 'hours' | 'date';
  /** Whether a reader may find the slot blank. */
  readonly blank: 'fault' | 'absent';
}

/** One field of a message: all that domain, bit decoder and RINEX reader need to know. */
export interface MessageField {
  readonly meaning: string;
  readonly unit: BroadcastUnit;
  readonly bits: number;
  /** Two's complement where true. */
  readonly signed: boolean;
  /** Value of one step, in the broadcast unit. */
  readonly scale: number;
  /** Most significant bits first. */
  readonly place: readonly BitRun[];
  /** The same value sent a second time, for telling data sets apart. */
  readonly copy?: readonly BitRun[];
  /**
   * The range that the standard calls valid where that is less than what the bits carry, in the broadcast
   * unit.
   */
  readonly valid?: readonly [number, number];
  /** Absent where RINEX leaves the field out. */
  readonly rinex?: RinexSlot;
}

/** A closed range of values in the model's unit. */
export interface FieldRange {
  readonly min: number;
  readonly max: number;
}

/** The smallest and the largest value that the field's bits carry, in the model's unit. */
export function fieldRange(field: MessageField): FieldRange {
  const step = grid(field);
  return field.signed
    ? { min: -(2 ** (field.bits - 1)) * step, max: (2 ** (field.bits - 1) - 1) * step }
    : { min: 0, max: (2 ** field.bits - 1) * step };
}

/** The part of `fieldRange` that the standard calls valid, in the model's unit. */
export function validRange(field: MessageField): FieldRange {
  const { min, max } = fieldRange(field);
  if (field.valid === undefined) return { min, max };
  const factor = toModelUnit(field);
  return { min: Math.max(min, field.valid[0] * factor), max: Math.min(max, field.valid[1] * factor) };
}

/** The step between neighbouring values of the field, in the model's unit. */
export function grid(field: MessageField): number {
  return field.scale * toModelUnit(field);
}

/** The unit that the models and RINEX use for the field. */
export function modelUnit(field: MessageField): string {
  return field.unit.replace('semicircle', 'rad');
}

/** Factor from the broadcast unit to the model's. Source of pi: IS-GPS-200, 20.3.3.4.3. */
function toModelUnit(field: MessageField): number {
  return field.unit.startsWith('semicircle') ? GPS_PI : 1;
}
