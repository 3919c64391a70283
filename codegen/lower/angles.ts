import type { Graph } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';
import type { Ranges } from '../formula/ranges.ts';
import type { Turn } from './rule.ts';

/** Angles of the tick up to this size are kept apart from what setup knows: their sine needs no reduction. */
const SMALL_ANGLE = Math.PI / 2;

/**
 * Exact rules for angles: after them no atan2 and no eccentric anomaly is left, sines and cosines stand only of
 * angles that are plain sums of numbers, and whatever a turn owes to setup is taken in setup.
 */
export class AngleRules {
  private readonly graph: Graph;
  private readonly ranges: Ranges;
  private readonly rewritten = new Map<Node, Node>();
  private readonly turns = new Map<Node, Turn>();

  constructor(graph: Graph, ranges: Ranges) {
    this.graph = graph;
    this.ranges = ranges;
  }

  /** The formula with all its angles as cosine and sine. */
  formula(formula: Formula): Formula {
    const outputs = formula.outputs.map((output) => ({ ...output, node: this.rewrite(output.node) }));
    const labels = new Map<Node, string>();
    for (const [node, label] of formula.labels) {
      const kept = this.rewritten.get(node);
      if (kept !== undefined && kept.args.length > 0 && !labels.has(kept)) labels.set(kept, label);
    }
    for (const [angle, turn] of this.turns) {
      const label = formula.labels.get(angle) ?? angle.name;
      if (label === '') continue;
      labels.set(turn.cos, `cos${label}`);
      labels.set(turn.sin, `sin${label}`);
    }
    return { ...formula, outputs, labels };
  }

  /** All turns that the rules made: pairs whose squares add up to one in exact arithmetic. */
  pairs(): readonly Turn[] {
    return [...this.turns.values()];
  }

  /** A node with all sines, cosines and anomalies below it rewritten. */
  rewrite(node: Node): Node {
    const known = this.rewritten.get(node);
    if (known !== undefined) return known;
    const made = this.rewriteNew(node);
    this.rewritten.set(node, made);
    return made;
  }

  private rewriteNew(node: Node): Node {
    const [x] = node.args as [Node];
    switch (node.operation) {
      case 'input':
      case 'constant':
        return node;
      case 'sin':
        return this.turn(x).sin;
      case 'cos':
        return this.turn(x).cos;
      case 'kepler':
        return this.graph.make('add', this.rewrite(x), this.offset(node));
      default:
        return this.graph.make(node.operation, ...node.args.map((arg) => this.rewrite(arg)));
    }
  }

  /** Cosine and sine of an angle. */
  turn(angle: Node): Turn {
    const known = this.turns.get(angle);
    if (known !== undefined) return known;
    const made = this.turnNew(angle);
    this.turns.set(angle, made);
    return made;
  }

  private turnNew(angle: Node): Turn {
    const [x, y] = angle.args as [Node, Node];
    switch (angle.operation) {
      case 'atan2':
        return this.direction(x, y);
      case 'kepler':
        return this.sum(this.turn(x), this.plain(this.offset(angle)));
      case 'neg':
        return this.mirror(this.turn(x));
      case 'mul':
        if (isTwo(x)) return this.double(this.turn(y));
        return isTwo(y) ? this.double(this.turn(x)) : this.plain(this.rewrite(angle));
      case 'add':
      case 'sub':
        if (holdsDirection(angle)) {
          const second = this.turn(y);
          return this.sum(this.turn(x), angle.operation === 'sub' ? this.mirror(second) : second);
        }
        return this.byStage(angle);
      default:
        return this.plain(this.rewrite(angle));
    }
  }

  /** A sum of numbers: what setup knows is turned there; the rest is turned apart when it is small. */
  private byStage(angle: Node): Turn {
    const early: Term[] = [];
    const late: Term[] = [];
    for (const term of terms(angle)) (term.node.stage === 'tick' ? late : early).push(term);
    const known = early.length === 0 ? undefined : this.total(early);
    const fresh = late.length === 0 ? undefined : this.total(late);
    if (known === undefined) return this.plain(fresh!);
    if (fresh === undefined) return this.plain(known);
    const { lo, hi } = this.ranges.of(fresh);
    if (Math.max(-lo, hi) <= SMALL_ANGLE) return this.sum(this.plain(known), this.plain(fresh));
    return this.plain(this.graph.make('add', known, fresh));
  }

  private total(list: readonly Term[]): Node {
    const [first, ...rest] = list as [Term, ...Term[]];
    const start = this.rewrite(first.node);
    return rest.reduce(
      (sum, term) => this.graph.make(term.negative ? 'sub' : 'add', sum, this.rewrite(term.node)),
      first.negative ? this.graph.make('neg', start) : start,
    );
  }

  /** cos and sin of a number that is no sum of turns. */
  private plain(angle: Node): Turn {
    return { cos: this.graph.make('cos', angle), sin: this.graph.make('sin', angle) };
  }

  /** cos(a + b) = cos a cos b - sin a sin b, sin(a + b) = sin a cos b + cos a sin b. */
  private sum(a: Turn, b: Turn): Turn {
    const { graph } = this;
    return {
      cos: graph.make('sub', graph.make('mul', a.cos, b.cos), graph.make('mul', a.sin, b.sin)),
      sin: graph.make('add', graph.make('mul', a.sin, b.cos), graph.make('mul', a.cos, b.sin)),
      parts: [a, b],
    };
  }

  /** cos(-a) = cos a, sin(-a) = -sin a. */
  private mirror(a: Turn): Turn {
    return { cos: a.cos, sin: this.graph.make('neg', a.sin) };
  }

  /** sin 2a = (2 sin a) cos a, cos 2a = 1 - (2 sin a) sin a. */
  private double(a: Turn): Turn {
    const { graph } = this;
    const twice = graph.make('add', a.sin, a.sin);
    return {
      cos: graph.make('sub', graph.constant(1), graph.make('mul', twice, a.sin)),
      sin: graph.make('mul', twice, a.cos),
    };
  }

  /** E - M by its own equation, D = e sin(M + D): it needs the turn of M and no radians. */
  private offset(kepler: Node): Node {
    const [M, e] = kepler.args as [Node, Node];
    const turn = this.turn(M);
    return this.graph.make('offset', turn.sin, turn.cos, this.rewrite(e));
  }

  /**
   * The direction of (x, y): cos = x / h, sin = y / h with h = sqrt(x^2 + y^2).
   * For the true anomaly h needs no root: (sqrt(1 - e^2) sin E)^2 + (cos E - e)^2 = (1 - e cos E)^2.
   */
  private direction(y: Node, x: Node): Turn {
    const { graph } = this;
    const [sine, cosine] = [this.rewrite(y), this.rewrite(x)];
    const orbit = trueAnomaly(y, x);
    const length =
      orbit === undefined
        ? graph.make(
            'sqrt',
            graph.make('add', graph.make('mul', cosine, cosine), graph.make('mul', sine, sine)),
          )
        : graph.make(
            'sub',
            graph.constant(1),
            graph.make('mul', this.rewrite(orbit.e), this.turn(orbit.E).cos),
          );
    const inverse = graph.make('div', graph.constant(1), length);
    const turn = { cos: graph.make('mul', cosine, inverse), sin: graph.make('mul', sine, inverse) };
    if (orbit === undefined) return turn;
    const E = this.turn(orbit.E);
    const scaled = graph.make('mul', E.sin, inverse);
    return {
      ...turn,
      anomaly: { E, e: this.rewrite(orbit.e), root: this.rewrite(orbit.root), sine: scaled },
    };
  }
}

interface Term {
  readonly node: Node;
  readonly negative: boolean;
}

/** The terms of a sum. */
function terms(node: Node, negative = false): Term[] {
  const [x, y] = node.args as [Node, Node];
  if (node.operation === 'add') return [...terms(x, negative), ...terms(y, negative)];
  if (node.operation === 'sub') return [...terms(x, negative), ...terms(y, !negative)];
  if (node.operation === 'neg') return terms(x, !negative);
  return [{ node, negative }];
}

function isTwo(node: Node): boolean {
  return node.operation === 'constant' && node.value === 2;
}

/** Whether a sum has a term that is known only as a direction. */
function holdsDirection(angle: Node): boolean {
  return terms(angle).some(({ node }) => node.operation === 'atan2' || node.operation === 'kepler');
}

/** Recognises y = sqrt(1 - e e) sin E and x = cos E - e. */
function trueAnomaly(y: Node, x: Node): { E: Node; e: Node; root: Node } | undefined {
  if (x.operation !== 'sub' || x.args[0]?.operation !== 'cos' || y.operation !== 'mul') return undefined;
  const E = x.args[0].args[0]!;
  const e = x.args[1]!;
  const isRoot = (node: Node) => {
    const [one, square] = node.operation === 'sqrt' ? (node.args[0]?.args ?? []) : [];
    return (
      node.args[0]?.operation === 'sub' &&
      one?.value === 1 &&
      square?.operation === 'mul' &&
      square.args.every((factor) => factor === e)
    );
  };
  const isSine = (node: Node) => node.operation === 'sin' && node.args[0] === E;
  const [a, b] = y.args as [Node, Node];
  if (isRoot(a) && isSine(b)) return { E, e, root: a };
  return isRoot(b) && isSine(a) ? { E, e, root: b } : undefined;
}
