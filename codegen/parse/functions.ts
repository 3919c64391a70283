import {
  ASSIGNMENTS,
  CHECK,
  CLEAR,
  CLOSE,
  type Form,
  GUARD,
  LOAD,
  OUTPUT,
  POSITION,
  READ,
  RETURN,
  ROUND,
  ROUNDED_CHECK,
  SETUP,
  STORE,
} from './forms.ts';
import type { Lines } from './lines.ts';
import { literalOf } from './literal.ts';
import type { Mark, ParsedInput, ParsedLine, ParsedOutput, ParsedWord } from './parsed.ts';
import type { Token } from './tokens.ts';
import type { Values } from './values.ts';

type Stage = ParsedLine['stage'];

/** Status for an input outside its range. */
const OUTSIDE: Readonly<Record<Stage, number>> = { setup: 1, tick: 2 };

/** Status for an input that is not a finite number. */
const NOT_FINITE = 3;

/** Status for a state that setup did not fill. */
const NOT_FILLED = 1;

/** What setup does beside its lines. */
export interface ParsedSetup {
  readonly elements: readonly ParsedInput[];
  readonly state: readonly ParsedWord[];
  readonly guard: number;
  readonly end: Mark;
}

/** What position does beside its lines. */
export interface ParsedPosition {
  readonly time: ParsedInput;
  readonly outputs: readonly ParsedOutput[];
  readonly end: Mark;
}

/** Parses one function after the other; all values are in one list. */
export class Functions {
  private readonly lines: Lines;
  private readonly values: Values;

  constructor(lines: Lines, values: Values) {
    this.lines = lines;
    this.values = values;
  }

  /** Setup clears the guard, reads and checks the elements, computes, and stores the state. */
  setup(): ParsedSetup {
    const { lines, values } = this;
    lines.demand(SETUP, 'parse.form');
    values.enter();
    const clear = lines.take(CLEAR);
    const elements: ParsedInput[] = [];
    for (let read = lines.take(READ); read !== undefined; read = lines.take(READ)) {
      const [name, field] = read.filled as [Token, Token];
      elements.push(this.input(name, field.text, 'setup'));
    }
    this.assignments('setup');
    const state = this.stores(STORE, (name) => values.named(name));
    const end = this.end([STORE]);
    const guard = clear === undefined ? -1 : this.number(clear.filled[0]!);
    if (clear !== undefined && state[guard] === undefined)
      lines.refuse('parse.guard', clear, `the guard stands in slot ${guard}, which setup does not fill`);
    return { elements, state, guard, end };
  }

  /** Position checks the time, loads the state, checks the guard, computes, and writes the outputs. */
  position({ state, guard }: ParsedSetup): ParsedPosition {
    const { lines, values } = this;
    const head = lines.demand(POSITION, 'parse.form');
    values.enter();
    const time = this.input({ ...head, text: 't', kind: 'name' }, 't', 'tick');
    const names = state.map(({ value }, slot) => {
      const [name, index] = lines.demand(LOAD, 'parse.index').filled as [Token, Token];
      this.place(index, slot);
      values.define(name, value);
      return name;
    });
    this.guard(names[guard]);
    this.assignments('tick');
    const outputs = this.stores(OUTPUT, (token) => values.argument(token));
    return { time, outputs, end: this.end([OUTPUT]) };
  }

  /** An input that was just read: perhaps its rounding to float32, then the check of its range. */
  private input(name: Token, field: string, stage: Stage): ParsedInput {
    const { lines, values } = this;
    const input = values.input(name, stage);
    const rounding = lines.take(ROUND);
    const [checked, source] = rounding === undefined ? [name, name] : (rounding.filled as [Token, Token]);
    this.same(source, name);
    const rounded =
      rounding && values.assign({ form: ROUND, operation: 'round', rounded: true }, stage, rounding);
    const check = lines.demand(rounding === undefined ? CHECK : ROUNDED_CHECK, 'parse.check');
    const [above, min, below, max, left, right, outside, notFinite] = check.filled as TokensOfCheck;
    for (const token of [above, below, left, right]) this.same(token, checked);
    this.status(outside, OUTSIDE[stage]);
    this.status(notFinite, NOT_FINITE);
    const { line, column } = check;
    return { field, input, rounded, min: this.number(min), max: this.number(max), line, column };
  }

  /** The check of the word that setup clears, by the name it was loaded under; none where setup clears none. */
  private guard(word: Token | undefined): void {
    const { lines } = this;
    const taken = word === undefined ? lines.take(GUARD) : lines.demand(GUARD, 'parse.guard');
    if (taken === undefined) return;
    const [name, status] = taken.filled as [Token, Token];
    if (name.text !== word?.text)
      lines.refuse('parse.guard', name, `setup does not clear the slot of ${name.text}`);
    this.status(status, NOT_FILLED);
  }

  private assignments(stage: Stage): void {
    const next = () => {
      for (const assignment of ASSIGNMENTS) {
        const taken = this.lines.take(assignment.form);
        if (taken !== undefined) return this.values.assign(assignment, stage, taken);
      }
      return undefined;
    };
    while (next() !== undefined);
  }

  /** Stores to the places of an array from 0 on. */
  private stores<T>(form: Form, read: (token: Token) => T): readonly (Mark & { readonly value: T })[] {
    const stores: (Mark & { readonly value: T })[] = [];
    for (let taken = this.lines.take(form); taken !== undefined; taken = this.lines.take(form)) {
      const [index, value] = taken.filled as [Token, Token];
      this.place(index, stores.length);
      stores.push({ value: read(value), line: taken.line, column: taken.column });
    }
    return stores;
  }

  /** The end of a function: before it only assignments and the given forms can stand. */
  private end(others: readonly Form[]): Mark {
    const forms = ASSIGNMENTS.map((assignment) => assignment.form);
    const taken = this.lines.demand(RETURN, 'parse.form', [...forms, ...others]);
    this.status(taken.filled[0]!, 0);
    this.lines.demand(CLOSE, 'parse.form');
    return { line: taken.line, column: taken.column };
  }

  private same(token: Token, due: Token): void {
    if (token.text !== due.text)
      this.lines.refuse('parse.check', token, `${token.text} stands where ${due.text} is due`);
  }

  private status(token: Token, due: number): void {
    if (!Object.is(this.number(token), due))
      this.lines.refuse('parse.status', token, `the status is ${token.text} where ${due} is due`);
  }

  private place(token: Token, due: number): void {
    if (!Object.is(this.number(token), due))
      this.lines.refuse('parse.index', token, `the index is ${token.text} where ${due} is due`);
  }

  private number(token: Token): number {
    return literalOf(this.lines, token);
  }
}

type TokensOfCheck = [Token, Token, Token, Token, Token, Token, Token, Token];
