import type { ts } from 'ts-morph';
import type { Finding } from '../../src/finding.ts';
import { anchor } from './syntax.ts';

/** What a rule always says; what differs from place to place is in the fault. */
export interface Rule {
  /** Stable code, `inspect.rule`. */
  readonly code: string;
  readonly why: string;
  readonly remedy: string;
}

/** A rule broken at a place in the syntax tree. */
export interface Fault {
  readonly rule: Rule;
  /** The node that breaks it; the finding stands at its anchor. */
  readonly at: ts.Node;
  readonly what: string;
}

/** Turns a fault into a finding of a file, with line and column counted from 1. */
export function toFinding(fault: Fault, file: string): Finding {
  const source = fault.at.getSourceFile();
  const position = source.getLineAndCharacterOfPosition(anchor(fault.at).getStart(source));
  return {
    code: fault.rule.code,
    place: { file, line: position.line + 1, column: position.character + 1 },
    what: fault.what,
    why: fault.rule.why,
    remedy: fault.rule.remedy,
  };
}
