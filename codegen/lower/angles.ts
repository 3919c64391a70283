import type { Graph } from '../formula/graph.ts';
import type { Formula, Node } from '../formula/node.ts';
import type { Ranges } from '../formula/ranges.ts';
import {
  direction,
  doubleAngle,
  eccentricAnomaly,
  oppositeAngle,
  sumOfAngles,
  trueAnomaly,
} from './exact-rules.ts';
import type { ExactRule, Turn } from './rule.ts';

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
        return this.anomaly(node);
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

  private sum(a: Turn, b: Turn): Turn {
    return { ...this.turned(sumOfAngles, a.cos, a.sin, b.cos, b.sin), parts: [a, b] };
  }

  private mirror(a: Turn): Turn {
    return this.turned(oppositeAngle, a.cos, a.sin);
  }

  private double(a: Turn): Turn {
    return this.turned(doubleAngle, a.cos, a.sin);
  }

  /** The cosine and sine that a rule gives. */
  private turned(rule: ExactRule, ...given: readonly Node[]): Turn {
    const [cos, sin] = rule.apply(this.graph, given) as [Node, Node];
    return { cos, sin };
  }

  /** The eccentric anomaly as M and its offset from M: the offset needs the turn of M and no radians. */
  private anomaly(kepler: Node): Node {
    const [M, e] = kepler.args as [Node, Node];
    const { cos, sin } = this.turn(M);
    return eccentricAnomaly.apply(this.graph, [this.rewrite(M), cos, sin, this.rewrite(e)])[0]!;
  }

  private offset(kepler: Node): Node {
    return this.anomaly(kepler).args.find((arg) => arg.operation === 'offset')!;
  }

  /** The direction of (x, y), or the true anomaly where it is one. */
  private direction(y: Node, x: Node): Turn {
    const [sine, cosine] = [this.rewrite(y), this.rewrite(x)];
    const orbit = findTrueAnomaly(y, x);
    if (orbit === undefined) return this.turned(direction, cosine, sine);
    const E = this.turn(orbit.E);
    const e = this.rewrite(orbit.e);
    const anomaly = { E, e, root: this.rewrite(orbit.root) };
    return { ...this.turned(trueAnomaly, cosine, sine, E.cos, e), anomaly };
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
function findTrueAnomaly(y: Node, x: Node): { E: Node; e: Node; root: Node } | undefined {
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
