import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { inspectSource } from '../../codegen/inspect/inspection.ts';
import { fromCounts, type OperationKind, type Operations, sum } from '../../codegen/inspect/operations.ts';

/** A statement of a generated body. Tests compare, and each may go either way. */
type Statement =
  | { readonly form: 'one'; readonly text: string; readonly kind: OperationKind }
  | { readonly form: 'if'; readonly yes: readonly Statement[]; readonly no: readonly Statement[] }
  | { readonly form: 'loop'; readonly rounds: number; readonly body: readonly Statement[] }
  | { readonly form: 'return' | 'break' | 'continue' };

const one = fc.constantFrom<Statement>(
  { form: 'one', text: 'x = a * a;', kind: 'mul' },
  { form: 'one', text: 'x = a + a;', kind: 'add' },
  { form: 'one', text: 'x = p[0];', kind: 'load' },
  { form: 'one', text: 'p[0] = a;', kind: 'store' },
  { form: 'one', text: 'x = Math.fround(a);', kind: 'round' },
);

function block(depth: number, inLoop: boolean): fc.Arbitrary<Statement[]> {
  const jumps: Statement[] = inLoop
    ? [{ form: 'return' }, { form: 'break' }, { form: 'continue' }]
    : [{ form: 'return' }];
  const statements: fc.Arbitrary<Statement>[] = [one, one, one, fc.constantFrom(...jumps)];
  if (depth > 0) {
    statements.push(
      fc.record({
        form: fc.constant('if' as const),
        yes: block(depth - 1, inLoop),
        no: block(depth - 1, inLoop),
      }),
      fc.record({ form: fc.constant('loop' as const), rounds: fc.nat(3), body: block(depth - 1, true) }),
    );
  }
  return fc.array(fc.oneof(...statements), { maxLength: 3 });
}

function print(statements: readonly Statement[], level = 0): string {
  return statements
    .map((statement) => {
      if (statement.form === 'one') return statement.text;
      if (statement.form === 'if') {
        return `if (a < 1) { ${print(statement.yes, level + 1)} } else { ${print(statement.no, level + 1)} }`;
      }
      if (statement.form !== 'loop') return `${statement.form};`;
      const index = `i${level}`;
      const loop = `for (let ${index} = 0; ${index} < ${statement.rounds}; ${index}++)`;
      return `${loop} { ${print(statement.body, level + 1)} }`;
    })
    .join(' ');
}

/** One way to run: what it counted, and how it ended. */
interface Path {
  readonly counts: Operations;
  readonly end: 'through' | 'return' | 'break' | 'continue';
}

const single = (kind: OperationKind): Operations => fromCounts({ [kind]: 1 });

/** Runs `next` after each path that falls through; equal paths are kept once, so that their number stays small. */
function extend(paths: readonly Path[], next: () => readonly Path[]): Path[] {
  const ahead = next();
  const all = paths.flatMap((path) =>
    path.end === 'through'
      ? ahead.map(({ counts, end }) => ({ counts: sum(path.counts, counts), end }))
      : [path],
  );
  return [...new Map(all.map((path) => [JSON.stringify(path), path])).values()];
}

function go(...kinds: OperationKind[]): Path[] {
  return [{ counts: sum(...kinds.map(single)), end: 'through' }];
}

/** Every path through statements, loops run round by round. */
function pathsOf(statements: readonly Statement[]): Path[] {
  return statements.reduce<Path[]>((paths, statement) => extend(paths, () => pathsOfOne(statement)), go());
}

function pathsOfOne(statement: Statement): Path[] {
  if (statement.form === 'one') return go(statement.kind);
  if (statement.form === 'if') {
    return extend(go('compare'), () => [...pathsOf(statement.yes), ...pathsOf(statement.no)]);
  }
  if (statement.form !== 'loop') return [{ counts: sum(), end: statement.form }];
  let paths = go();
  const left: Path[] = [];
  for (let round = 0; round < statement.rounds; round++) {
    const after = extend(
      extend(paths, () => go('compare')),
      () => pathsOf(statement.body),
    );
    left.push(...after.filter(({ end }) => end === 'return'));
    left.push(
      ...after
        .filter(({ end }) => end === 'break')
        .map(({ counts }) => ({ counts, end: 'through' as const })),
    );
    const on = after.filter(({ end }) => end === 'through' || end === 'continue');
    paths = on.map(({ counts }) => ({ counts: sum(counts, single('add')), end: 'through' }));
    if (paths.length === 0) return left;
  }
  return [...left, ...extend(paths, () => go('compare'))];
}

function weight({ total, load, store, round }: Operations): readonly number[] {
  return [total, load + store, round];
}

function byWeight(a: Operations, b: Operations): number {
  const [first, second] = [weight(a), weight(b)];
  return first.map((value, index) => value - second[index]!).find((difference) => difference !== 0) ?? 0;
}

describe('the worst path', () => {
  it('is one of all paths, and none is worse', () => {
    fc.assert(
      fc.property(block(3, false), (statements) => {
        const text = `export function f(a, p) { let x = 0; ${print(statements)} }`;
        const counted = inspectSource('paths.js', text).functions[0]!.operations!;
        const all = pathsOf(statements).map(({ counts }) => counts);
        expect(all).toContainEqual(counted);
        expect(Math.max(...all.map((counts) => byWeight(counts, counted)))).toBe(0);
      }),
      { numRuns: 300 },
    );
  });
});
