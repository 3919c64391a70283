import { type Node as Syntax, ts } from 'ts-morph';
import { type Finding, InputError } from '../../src/finding.ts';

/** Stable codes of everything that reading can refuse. */
export type RefusalCode =
  | 'read.mutable-binding'
  | 'read.loop'
  | 'read.branch-statement'
  | 'read.statement'
  | 'read.return'
  | 'read.assignment'
  | 'read.operator'
  | 'read.comparison'
  | 'read.literal'
  | 'read.record'
  | 'read.array'
  | 'read.function-value'
  | 'read.function-form'
  | 'read.recursion'
  | 'read.unknown-name'
  | 'read.unknown-call'
  | 'read.unknown-field'
  | 'read.property'
  | 'read.type-conversion'
  | 'read.not-a-number'
  | 'read.arguments'
  | 'read.signature'
  | 'read.import'
  | 'read.missing-function'
  | 'read.missing-file'
  | 'read.syntax';

/** Constructs outside the numeric subset: why each is refused, and what to write instead. */
const REFUSALS: Readonly<Record<RefusalCode, readonly [why: string, remedy: string]>> = {
  'read.mutable-binding': [
    'A name must stand for one value, so that it is one node of the formula.',
    'Write a const for each value.',
  ],
  'read.loop': [
    'The cost of a loop can depend on data.',
    "Write the steps out, or use eccentricAnomaly for Kepler's equation.",
  ],
  'read.branch-statement': [
    'Only expressions become a formula.',
    'Write a conditional expression: a < b ? x : y.',
  ],
  'read.statement': [
    'A function of the subset holds const bindings and ends with one return.',
    'Move the work into const bindings.',
  ],
  'read.return': [
    'The value of a function must be one expression at its end.',
    'End the function with one return of a value.',
  ],
  'read.assignment': ['Values of a formula never change.', 'Bind the new value to a const of its own.'],
  'read.operator': [
    'Only + - * / and unary minus have an exact meaning here.',
    'Write it with + - * /, Math.sqrt, Math.abs or Math.floor.',
  ],
  'read.comparison': [
    'A condition must be one comparison of numbers: < <= > >=.',
    'Nest conditional expressions in place of logic or equality.',
  ],
  'read.literal': ['Only finite numbers are values.', 'Write a number.'],
  'read.record': ['Only flat records with named numbers are values.', 'List each field as name: expression.'],
  'read.array': ['Arrays are not values of the subset.', 'Use a flat record with named fields.'],
  'read.function-value': [
    'Functions are not values of the subset.',
    'Declare a function at the top level of a file and call it by name.',
  ],
  'read.function-form': [
    'The function must be plain: named, synchronous, each parameter a name without default or rest.',
    'Declare it as: function name(a: number): number { ... }.',
  ],
  'read.recursion': ['The cost of recursion can depend on data.', 'Write the steps out.'],
  'read.unknown-name': [
    'The name is no parameter, const or import that can be read.',
    'Bind it to a const, or pass it as a parameter.',
  ],
  'read.unknown-call': [
    'Only Math.sqrt, sin, cos, atan2, abs, floor and functions of the subset can be called.',
    'Write it with those, or as a function of the subset.',
  ],
  'read.unknown-field': [
    'The record has no such number.',
    'Name a field that the record, the domain or the constants hold.',
  ],
  'read.property': ['Fields are read by their literal name.', 'Write record.field.'],
  'read.type-conversion': [
    'The value must have its type without a conversion.',
    'Leave out the assertion or conversion.',
  ],
  'read.not-a-number': ['A number is needed here.', 'Name the field that is meant.'],
  'read.arguments': [
    'A call gives each parameter one value.',
    'Give as many arguments as the function has parameters, without spread.',
  ],
  'read.signature': [
    'A model function takes (elements, constants, t).',
    'Give it these three parameters, t being a number.',
  ],
  'read.import': ['The module cannot be found or has no such export.', 'Correct the path or the name.'],
  'read.missing-function': [
    'The description of the model names a function that the file does not export.',
    'Export it, or correct the description.',
  ],
  'read.missing-file': ['The file cannot be read.', 'Correct the path.'],
  'read.syntax': ['The file is not TypeScript.', 'Mend the syntax error.'],
};

/** The error for a construct at a place in the source. */
export function refuse(code: RefusalCode, syntax: Syntax, what: string): never {
  const source = syntax.getSourceFile();
  const { line, column } = source.getLineAndColumnAtPos(syntax.getStart());
  throw new InputError(finding(code, { file: source.getBaseName(), line, column }, what));
}

/** The finding of a refusal whose place is known only as a file or a line. */
export function finding(code: RefusalCode, place: Finding['place'], what: string): Finding {
  const [why, remedy] = REFUSALS[code];
  return { code, place, what, why, remedy };
}

/** What a piece of syntax is called in messages: its kind in words and the start of its text. */
export function describe(syntax: Syntax): string {
  const kind = ts.SyntaxKind[syntax.getKind()]!.replace(/([a-z])([A-Z])/g, '$1 $2').toLowerCase();
  const text = syntax.getText().replace(/\s+/g, ' ');
  return `${kind} "${text.length > 40 ? `${text.slice(0, 37)}...` : text}"`;
}
