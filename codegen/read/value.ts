import type { Node as Syntax } from 'ts-morph';
import type { Node } from '../formula/node.ts';
import { describe, refuse } from './refusal.ts';

/** A flat record of the subset: fields are found by name; undefined means there is no such field. */
export interface RecordValue {
  readonly field: (name: string) => Node | undefined;
  readonly names: readonly string[];
}

/** What an expression of the subset stands for: a number (a node of the formula) or a flat record of numbers. */
export type Value = Node | RecordValue;

/** Whether a value is a record. */
export function isRecord(value: Value): value is RecordValue {
  return 'field' in value;
}

/** A record with the given fields. */
export function record(fields: ReadonlyMap<string, Node>): RecordValue {
  return { field: (name) => fields.get(name), names: [...fields.keys()] };
}

/** The value as a number; refuses records. */
export function asNumber(value: Value, syntax: Syntax): Node {
  if (isRecord(value)) return refuse('read.not-a-number', syntax, `${describe(syntax)} is a record`);
  return value;
}
