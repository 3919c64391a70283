/** A kind of operation that is counted. */
export type Counted =
  | 'add'
  | 'sub'
  | 'mul'
  | 'div'
  | 'neg'
  | 'sqrt'
  | 'abs'
  | 'floor'
  | 'compare'
  | 'select'
  | 'round'
  | 'load'
  | 'store';

/** Kinds that are arithmetic: they make up the total. A comparison is each of < <= > >= === !==; a select is a conditional expression. */
export const ARITHMETIC: readonly Counted[] = [
  'add',
  'sub',
  'mul',
  'div',
  'neg',
  'sqrt',
  'abs',
  'floor',
  'compare',
  'select',
];

/** All kinds; roundings to float32, loads and stores are listed beside the total. */
export const COUNTED: readonly Counted[] = [...ARITHMETIC, 'round', 'load', 'store'];

/** How often each kind of operation happens on the worst path of a function. */
export type Operations = Readonly<Record<Counted, number>> & { readonly total: number };
