import { laterStage, type Node, OPERATIONS, type Operation, type Stage } from './node.ts';

/** Makes nodes so that equal expressions are one object, and only exact identities with 0 and 1 are simplified. */
export class Graph {
  private readonly nodes = new Map<string, Node>();
  private readonly numbers = new Map<Node, number>();

  /** An input of the given stage. */
  input(name: string, stage: Stage): Node {
    return this.intern({ operation: 'input', args: [], stage, value: 0, name }, `input ${name}`);
  }

  /** A float64 number, taken as exact. */
  constant(value: number): Node {
    if (!Number.isFinite(value)) throw new RangeError(`a constant must be finite, not ${value}`);
    const key = Object.is(value, -0) ? '0' : String(value);
    return this.intern(
      { operation: 'constant', args: [], stage: 'constant', value: value + 0, name: '' },
      `constant ${key}`,
    );
  }

  /** Any other operation. The order of the arguments of sums and products does not matter for sharing. */
  make(operation: Operation, ...args: readonly Node[]): Node {
    if (args.length !== OPERATIONS[operation])
      throw new RangeError(`${operation} takes ${OPERATIONS[operation]} arguments`);
    return (
      this.simplify(operation, args) ?? this.intern(this.plain(operation, args), this.key(operation, args))
    );
  }

  private plain(operation: Operation, args: readonly Node[]): Node {
    const stage = args.reduce<Stage>((latest, arg) => laterStage(latest, arg.stage), 'constant');
    return { operation, args, stage, value: 0, name: '' };
  }

  private key(operation: Operation, args: readonly Node[]): string {
    const numbers = args.map((arg) => this.numbers.get(arg) ?? this.foreign());
    if (operation === 'add' || operation === 'mul') numbers.sort((a, b) => a - b);
    return `${operation} ${numbers.join(' ')}`;
  }

  private foreign(): never {
    throw new Error('a node of another graph was used');
  }

  private intern(node: Node, key: string): Node {
    const known = this.nodes.get(key);
    if (known !== undefined) return known;
    this.nodes.set(key, node);
    this.numbers.set(node, this.numbers.size);
    return node;
  }

  /** x + 0 = x, x - 0 = x, 0 - x = -x, x 1 = x, x 0 = 0, x / 1 = x, -(-x) = x, x + (-y) = x - y, x - (-y) = x + y. */
  private simplify(operation: Operation, args: readonly Node[]): Node | undefined {
    const [x, y] = args as [Node, Node];
    const is = (node: Node, value: number) => node.operation === 'constant' && node.value === value;
    switch (operation) {
      case 'neg':
        if (x.operation === 'constant') return this.constant(-x.value);
        return x.operation === 'neg' ? x.args[0] : undefined;
      case 'add':
        if (is(x, 0)) return y;
        if (is(y, 0)) return x;
        if (y.operation === 'neg') return this.make('sub', x, y.args[0]!);
        return x.operation === 'neg' ? this.make('sub', y, x.args[0]!) : undefined;
      case 'sub':
        if (is(y, 0)) return x;
        if (is(x, 0)) return this.make('neg', y);
        return y.operation === 'neg' ? this.make('add', x, y.args[0]!) : undefined;
      case 'mul':
        if (is(x, 1)) return y;
        if (is(y, 1)) return x;
        return is(x, 0) || is(y, 0) ? this.constant(0) : undefined;
      case 'div':
        return is(y, 1) ? x : undefined;
      default:
        return undefined;
    }
  }
}

/**
 * Nodes that the given ones depend on, themselves included, every argument before its user.
 *
 * @param roots where to begin
 * @param leaves nodes whose own arguments are left out
 */
export function inOrder(roots: readonly Node[], leaves: readonly Node[] = []): readonly Node[] {
  const seen = new Set<Node>();
  const order: Node[] = [];
  const visit = (node: Node): void => {
    if (seen.has(node)) return;
    seen.add(node);
    if (!leaves.includes(node)) for (const arg of node.args) visit(arg);
    order.push(node);
  };
  for (const root of roots) visit(root);
  return order;
}
