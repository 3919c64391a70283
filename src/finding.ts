/** Where a finding stands. Lines and columns count from 1. */
export interface Place {
  readonly file: string;
  readonly line?: number;
  readonly column?: number;
}

/**
 * One diagnostic: what is wrong, where, why it matters and what to do.
 * `code` is stable across releases and has the form `room.rule`, in lower case with hyphens.
 */
export interface Finding {
  readonly code: string;
  readonly place: Place;
  readonly what: string;
  readonly why: string;
  readonly remedy: string;
}

/** Wrong use or wrong input: the command line prints the findings and leaves with exit code 2. */
export class InputError extends Error {
  readonly findings: readonly Finding[];

  constructor(...findings: Finding[]) {
    super(findings.map(formatFinding).join('\n'));
    this.name = 'InputError';
    this.findings = findings;
  }
}

/** `file:line:column` with the parts that are known. */
export function formatPlace(place: Place): string {
  const line = place.line === undefined ? '' : `:${place.line}`;
  const column = place.line === undefined || place.column === undefined ? '' : `:${place.column}`;
  return `${place.file}${line}${column}`;
}

/** One finding as two lines of text: place, code and fault; then reason and remedy. */
export function formatFinding(finding: Finding): string {
  return `${formatPlace(finding.place)}: ${finding.code}: ${finding.what}\n    ${finding.why} ${finding.remedy}`;
}
