import type { Entry, Tape } from '../../../codegen/bound/tape.ts';
import type { Kernel } from '../../../codegen/kernel/kernel.ts';

/** Operations that round. */
const ROUNDING: readonly string[] = ['add', 'sub', 'mul', 'div', 'sqrt', 'round'];

/**
 * Lines that round on the way to a group's outputs and have no part in its proof: names of the lines that are neither
 * computed by an entry nor inside a block whose error an entry has.
 */
export function uncovered(kernel: Kernel, tape: Tape, group: string): readonly string[] {
  const { lines } = kernel;
  const { entries, node } = tape;
  const owners = new Map<number, Entry[]>();
  for (const entry of entries)
    for (const line of 'sinLine' in entry ? [entry.line, entry.sinLine] : [entry.line])
      if (line >= 0 && entry.kind !== 'leaf') owners.set(line, [...(owners.get(line) ?? []), entry]);
  const missing: string[] = [];
  const seen = new Set<number>();
  /** Lines that an entry is made of; through entries that no line computes to those below them. */
  const linesOf = (k: number): readonly number[] => {
    const entry = entries[k]!;
    if (entry.line >= 0) return 'sinLine' in entry ? [entry.line, entry.sinLine] : [entry.line];
    if (entry.kind === 'leaf') return linesOf(entry.of);
    return 'args' in entry ? entry.args.flatMap(linesOf) : 'turn' in entry ? linesOf(entry.turn) : [];
  };
  const visit = (line: number): void => {
    if (line < 0 || seen.has(line)) return;
    seen.add(line);
    for (const next of below(line)) visit(next);
  };
  const below = (line: number): readonly number[] => {
    const { operation, args, name } = lines[line]!;
    const own = owners.get(line) ?? [];
    for (const entry of own) {
      if (entry.kind === 'turn') return linesOf(entry.angle);
      if (entry.kind === 'rounded-turn') return linesOf(entry.turn);
      if (entry.kind === 'offset') return [...linesOf(entry.turn), ...linesOf(entry.e)];
      // two products and a sum for each of the two numbers; lines in another order have what they read
      if (entry.kind === 'product' && entry.errors === null)
        return args.flatMap((product) => lines[product]!.args);
      if (entry.kind === 'product' && entry.errors !== null)
        return entry.errors.reads.flatMap(({ entry: k }) => linesOf(k));
    }
    const counted = own.some((entry) => 'format' in entry && entry.format !== 'exact');
    if (ROUNDING.includes(operation) && !counted) missing.push(name);
    return args;
  };
  const outputs = kernel.outputs.filter((output) => output.group === group).map((output) => output.line);
  if (node === null) outputs.forEach(visit);
  else {
    // the rotation to the outputs has an error of its own: two products and a sum for each
    for (const output of outputs.slice(0, 2))
      for (const product of lines[output]!.args) lines[product]!.args.forEach(visit);
    visit(outputs[2]!);
  }
  return missing;
}
