import type { Graph } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import type { Anomaly } from '../lower/rule.ts';

/**
 * An angle known by its cosine and sine, found in a formula: of a number of radians, a product of two others, or else
 * a pair of numbers that the rules of lowering made so that their squares add up to one.
 */
export interface Turn {
  readonly cos: Node;
  readonly sin: Node;
  /** The angle in radians, for a turn that a sine and cosine of a number make. */
  readonly angle?: Node;
  /** The two turns whose product this is: cos = cos cos - sin sin, sin = sin cos + cos sin. */
  readonly factors?: readonly [Turn, Turn];
  /** Whether its lines are the two products and the sum of the factors as they stand, not the same in another order. */
  readonly direct?: boolean;
  /** For a true anomaly: what it is made of. */
  readonly anomaly?: Anomaly<Turn>;
}

/** A pair that the rules of lowering made, with the turns that it is the product of, if any. */
export interface Pair {
  readonly cos: Node;
  readonly sin: Node;
  readonly parts?: readonly [Pair, Pair];
  readonly anomaly?: Anomaly<Pair>;
}

/**
 * Finds the turns of a formula: cosine and sine of the same number; products of turns, again and again; and what is left
 * of the pairs, one at a time, since the next may be a product of it. Equal expressions of a graph are one object, so a
 * product is recognised by making it.
 *
 * @param graph graph of the nodes
 * @param nodes all nodes of the formula, arguments before users
 * @param pairs pairs that are known to be cosine and sine of one angle
 */
export function findTurns(graph: Graph, nodes: readonly Node[], pairs: readonly Pair[]): readonly Turn[] {
  const present = new Set(nodes);
  const angles = new Set(
    nodes.filter((node) => node.operation === 'sin' || node.operation === 'cos').map((node) => node.args[0]!),
  );
  const turns: Turn[] = [...angles].map((angle) => ({
    cos: graph.make('cos', angle),
    sin: graph.make('sin', angle),
    angle,
  }));
  const order = new Map(nodes.map((node, index) => [node, index]));
  const left = pairs
    .filter(({ cos, sin }) => present.has(cos) && present.has(sin))
    .sort((a, b) => order.get(a.cos)! - order.get(b.cos)!);
  const tried = new Set<string>();
  for (;;) {
    addProducts(graph, present, turns, tried);
    const next = left.find((pair) => !turns.some((turn) => turn.cos === pair.cos || turn.cos === pair.sin));
    if (next === undefined) return turns;
    turns.push(
      next.parts === undefined
        ? partOf(turns, next)
        : { ...next, factors: [partOf(turns, next.parts[0]), partOf(turns, next.parts[1])] },
    );
  }
}

/** A part of a pair: a turn of the formula, or a pair that the formula holds in another form only. */
function partOf(turns: readonly Turn[], part: Pair): Turn {
  const known = turns.find((turn) => turn.cos === part.cos && turn.sin === part.sin);
  if (known !== undefined) return known;
  const { cos, sin, anomaly } = part;
  return anomaly === undefined
    ? { cos, sin }
    : { cos, sin, anomaly: { ...anomaly, E: partOf(turns, anomaly.E) } };
}

/** Adds products of turns until there are no new ones. */
function addProducts(graph: Graph, present: ReadonlySet<Node>, turns: Turn[], tried: Set<string>): void {
  for (let grown = true; grown; ) {
    grown = false;
    for (const [i, a] of [...turns.entries()]) {
      for (const [j, b] of [...turns.entries()]) {
        if (tried.has(`${i} ${j}`)) continue;
        tried.add(`${i} ${j}`);
        const product = multiply(graph, a, b);
        if (!present.has(product.cos) || !present.has(product.sin)) continue;
        if (turns.some((turn) => turn.cos === product.cos)) continue;
        turns.push(product);
        grown = true;
      }
    }
  }
}

function multiply(graph: Graph, a: Turn, b: Turn): Turn {
  return {
    cos: graph.make('sub', graph.make('mul', a.cos, b.cos), graph.make('mul', a.sin, b.sin)),
    sin: graph.make('add', graph.make('mul', a.sin, b.cos), graph.make('mul', a.cos, b.sin)),
    factors: [a, b],
    direct: true,
  };
}

/** Two outputs that a turn makes of two numbers: x = X cos - Y sin, y = X sin + Y cos. */
export interface Rotation {
  readonly turn: Turn;
  readonly X: Node;
  readonly Y: Node;
}

/** Recognises the rotation that makes a pair of outputs. */
export function findRotation(graph: Graph, turns: readonly Turn[], x: Node, y: Node): Rotation | undefined {
  if (x.operation !== 'sub' || y.operation !== 'add') return undefined;
  const [first, second] = x.args as [Node, Node];
  if (first.operation !== 'mul' || second.operation !== 'mul') return undefined;
  for (const turn of turns) {
    const X = cofactor(first, turn.cos);
    const Y = cofactor(second, turn.sin);
    if (X === undefined || Y === undefined) continue;
    if (graph.make('add', graph.make('mul', X, turn.sin), graph.make('mul', Y, turn.cos)) === y)
      return { turn, X, Y };
  }
  return undefined;
}

/** A pair of numbers that a turn makes of one: first = R cos, second = R sin. */
export interface Polar {
  readonly turn: Turn;
  readonly R: Node;
}

/** Recognises a number turned into a pair. */
export function findPolar(turns: readonly Turn[], first: Node, second: Node): Polar | undefined {
  if (first.operation !== 'mul' || second.operation !== 'mul') return undefined;
  for (const turn of turns) {
    const R = cofactor(first, turn.cos);
    if (R !== undefined && cofactor(second, turn.sin) === R) return { turn, R };
  }
  return undefined;
}

function cofactor(product: Node, factor: Node): Node | undefined {
  if (product.args[0] === factor) return product.args[1];
  return product.args[1] === factor ? product.args[0] : undefined;
}
