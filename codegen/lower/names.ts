import type { Formula, Node } from '../formula/node.ts';
import type { Line } from '../kernel/kernel.ts';

/** Names that emitted files use for other things. */
const TAKEN = ['elements', 'state', 'out', 'setup', 'position', 'fround', 'stateWords', 'Math'];

/** Names every line uniquely in the whole file: by the reference's own name where there is one, else by a number. */
export function nameLines(formula: Formula, lines: readonly Line[]): readonly Line[] {
  const used = new Set([...TAKEN, ...formula.inputs.map((input) => input.name)]);
  let count = 0;
  const take = (wish: string | undefined): string => {
    let name = wish;
    while (name === undefined || used.has(name)) name = `v${++count}`;
    used.add(name);
    return name;
  };
  const names: string[] = [];
  for (const line of lines)
    names.push(line.operation === 'constant' ? '' : nameOf(line, formula.labels, names, take));
  return lines.map((line, index) => ({ ...line, name: names[index]! }));
}

function nameOf(
  line: Line,
  labels: ReadonlyMap<Node, string>,
  names: readonly string[],
  take: (wish: string | undefined) => string,
): string {
  if (line.operation === 'input') return line.node.name;
  if (line.operation === 'round') {
    const wide = names[line.args[0]!]!;
    return take(/^v\d+$/.test(wide) ? undefined : `${wide}32`);
  }
  return take(labels.get(line.node));
}
