import { InputError } from '../../src/finding.ts';
import { Evaluator } from '../formula/evaluate.ts';
import { inOrder } from '../formula/graph.ts';
import type { Node } from '../formula/node.ts';
import type { Format } from '../kernel/choices.ts';
import type { Kernel } from '../kernel/kernel.ts';
import type { Lowered } from '../lower/lower.ts';
import { LineTape } from './line-tape.ts';
import type { Entry, OrbitFrame, ProductErrors, RealKind, SineErrors, SolverErrors, Tape } from './tape.ts';
import { findPolar, findRotation, findTurns, type Turn } from './turns.ts';

/** Where the local errors of blocks come from. */
export interface Blocks {
  sine(turn: Turn): SineErrors;
  solver(offset: Node): SolverErrors;
}

/** What a builder may stop at: nodes that are inputs of the analysis, by name. */
export type Stops = ReadonlyMap<Node, string>;

type Stage = 'setup' | 'tick';

/**
 * Builds tapes from the exact formula of a lowered kernel: every node that a line computes becomes an entry with that
 * line's rounding; sines, cosines and Kepler's equation become single entries with the proven error of their block.
 * Without blocks the tape is of the formula itself, without any rounding.
 */
export class Builder {
  readonly entries: Entry[] = [];
  private readonly lowered: Lowered;
  private readonly blocks: Blocks | null;
  private readonly stops: Stops;
  private readonly given: ReadonlyMap<Turn, SineErrors>;
  private readonly turns: readonly Turn[];
  private readonly turnOf = new Map<Node, Turn>();
  private readonly memo = new Map<string, number>();
  private readonly ids = new Map<object, number>();

  /**
   * @param lowered the kernel with its exact formula
   * @param blocks local errors of blocks; null for an analysis of the formula alone
   * @param nodes nodes of the exact formula among which turns are looked for
   * @param stops nodes that are inputs of the analysis
   * @param given turns that are inputs too, with their distance from the unit circle as errors
   */
  constructor(
    lowered: Lowered,
    blocks: Blocks | null,
    nodes: readonly Node[],
    stops: Stops = new Map(),
    given: ReadonlyMap<Turn, SineErrors> = new Map(),
  ) {
    this.lowered = lowered;
    this.blocks = blocks;
    this.stops = stops;
    this.turns = findTurns(lowered.graph, nodes, lowered.pairs);
    this.given = given;
    for (const turn of [...this.turns, ...given.keys()]) {
      if (turn.angle === undefined && turn.factors === undefined) continue; // such a pair is read as the two numbers it is
      this.turnOf.set(turn.cos, turn);
      this.turnOf.set(turn.sin, turn);
    }
  }

  /** The tape of one output group of the kernel. */
  static ofGroup(lowered: Lowered, blocks: Blocks, group: string): Tape {
    const outputs = lowered.exact.outputs
      .filter((output) => output.group === group)
      .map((output) => output.node);
    const builder = new Builder(lowered, blocks, inOrder(lowered.exact.outputs.map((output) => output.node)));
    const rotation =
      outputs.length === 3 ? findRotation(lowered.graph, builder.turns, outputs[0]!, outputs[1]!) : undefined;
    if (rotation === undefined) return builder.tape(outputs.map((node) => builder.real(node, 'tick')));
    const nodes = [rotation.X, rotation.Y, outputs[2]!] as const;
    const [X, Y, Z] = nodes.map((node) => builder.real(node, 'tick')) as [number, number, number];
    const node = { X, Y, turn: builder.turn(rotation.turn, 'tick'), format: lowered.kernel.choices.tick };
    return { ...builder.tape([X, Y, Z]), node, orbit: builder.orbit(nodes, Z) };
  }

  /** The chain of rotations below X, Y and Z, if it is one. */
  private orbit([X, Y, Z]: readonly [Node, Node, Node], entryZ: number): OrbitFrame | null {
    const incline = findPolar(this.turns, Y, Z);
    const plane = incline && findPolar(this.turns, X, incline.R);
    if (incline === undefined || plane === undefined) return null;
    return {
      r: this.real(plane.R, 'tick'),
      u: this.turn(plane.turn, 'tick'),
      i: this.turn(incline.turn, 'tick'),
      y: this.real(incline.R, 'tick'),
      Z: entryZ,
    };
  }

  tape(outputs: readonly number[]): Tape {
    return { entries: this.entries, outputs, node: null, orbit: null };
  }

  /** The entry of a node as a line of the given stage reads it. */
  real(node: Node, stage: Stage): number {
    const stop = this.stops.get(node);
    if (stop !== undefined) return this.once(`stop ${stop}`, () => ({ kind: 'input', name: stop, line: -1 }));
    if (node.stage === 'constant') return this.constant(node, this.formatOf(stage));
    const turn = this.turnOf.get(node);
    if (turn !== undefined) {
      const of = this.turn(turn, stage);
      const kind = node === turn.cos ? 'cosine' : 'sine';
      return this.once(`${kind} ${of}`, () => ({ kind, turn: of, line: this.line(node) }));
    }
    const own = this.own(node);
    const format = node.operation === 'input' ? 'f64' : this.formatOf(stageOf(node));
    if (this.blocks === null || format === this.formatOf(stage)) return own;
    return this.once(`round ${own}`, () => ({
      kind: 'round',
      args: [own],
      format: 'f32',
      line: this.roundLine(node),
    }));
  }

  /** The entry of a turn as a line of the given stage reads it. */
  turn(turn: Turn, stage: Stage): number {
    const own = this.ownTurn(turn);
    if (this.blocks === null || this.formatOf(stageOf(turn.cos)) === this.formatOf(stage)) return own;
    const [line, sinLine] = [this.roundLine(turn.cos), this.roundLine(turn.sin)];
    return this.once(`round ${own}`, () => ({ kind: 'rounded-turn', turn: own, line, sinLine }));
  }

  /** The entry of a node before any rounding to another format. */
  private unrounded(node: Node): number {
    return this.real(node, stageOf(node));
  }

  private own(node: Node): number {
    const stage = stageOf(node);
    return this.once(`node ${this.id(node)}`, () => {
      if (node.operation === 'input') return { kind: 'input', name: node.name, line: this.line(node) };
      if (node.operation === 'offset') return this.offset(node, stage);
      const kind = realKind(node);
      const line = this.line(node);
      // a node that no line computes stands for its exact value, made of the values of its arguments before any rounding
      if (line < 0 || this.blocks === null)
        return { kind, args: node.args.map((arg) => this.unrounded(arg)), format: 'exact', line };
      return {
        kind,
        args: node.args.map((arg, k) => this.constantRead(arg, line, k) ?? this.real(arg, stage)),
        format: this.formatOf(stage),
        line,
      };
    });
  }

  private ownTurn(turn: Turn): number {
    const stage = stageOf(turn.cos);
    return this.once(`turn ${this.id(turn.cos)}`, () => {
      const [line, sinLine] = [this.line(turn.cos), this.line(turn.sin)];
      const format = this.blocks === null ? 'exact' : this.formatOf(stage);
      if (turn.factors !== undefined && turn.direct) {
        const args = turn.factors.map((factor) => this.turn(factor, stage)) as unknown as [number, number];
        return { kind: 'product', args, format, line, sinLine, errors: null };
      }
      if (turn.factors !== undefined) {
        const args = turn.factors.map((factor) => this.ownTurn(factor)) as unknown as [number, number];
        return {
          kind: 'product',
          args,
          format,
          line,
          sinLine,
          errors: this.blocks === null ? null : this.productErrors(turn, args),
        };
      }
      if (turn.anomaly !== undefined) {
        const { E, e, root } = turn.anomaly;
        const leaves = new Map<Node, number>([
          [E.cos, this.leaf(this.ownTurn(E), 'value', E.cos)],
          [E.sin, this.leaf(this.ownTurn(E), 'sine', E.sin)],
          [e, this.leaf(this.real(e, stage), 'value', e)],
          [root, this.leaf(this.real(root, stage), 'value', root)],
        ]);
        const lines = [turn.cos, turn.sin].map((node) => this.loose(node, stage, leaves));
        return {
          kind: 'anomaly',
          turn: this.ownTurn(E),
          e: this.real(e, stage),
          root: this.real(root, stage),
          lines: lines as unknown as [number, number],
          line,
        };
      }
      if (turn.angle === undefined)
        return { kind: 'pair', args: [this.unrounded(turn.cos), this.unrounded(turn.sin)], line };
      const errors = this.given.get(turn) ?? this.blocks?.sine(turn) ?? null;
      return { kind: 'turn', angle: this.real(turn.angle, stage), errors, line, sinLine };
    });
  }

  /** The value of an entry, for lines whose own errors are wanted but not those of what they read. */
  private leaf(of: number, component: 'value' | 'sine', node: Node): number {
    return this.once(`leaf ${of} ${component}`, () => ({
      kind: 'leaf',
      of,
      component,
      line: this.line(node),
    }));
  }

  /** The entry of a node whose lines are followed down to leaves, apart from all other entries. */
  private loose(node: Node, stage: Stage, leaves: ReadonlyMap<Node, number>): number {
    const leaf = leaves.get(node);
    if (leaf !== undefined) return leaf;
    if (node.stage === 'constant') return this.constant(node, this.formatOf(stage));
    return this.once(`loose ${this.id(node)}`, () => {
      const line = this.line(node);
      const args = node.args.map(
        (arg, k) => this.constantRead(arg, line, k) ?? this.loose(arg, stage, leaves),
      );
      return {
        kind: realKind(node),
        args,
        format: line < 0 || this.blocks === null ? 'exact' : this.formatOf(stage),
        line,
      };
    });
  }

  /** The lines of a product that was put in another order: they read what the factors are made of. */
  private productErrors(turn: Turn, args: readonly [number, number]): ProductErrors {
    const reads: { entry: number; component: 'value' | 'sine'; line: number }[] = [];
    const collect = (index: number): void => {
      const entry = this.entries[index]!;
      if (entry.kind === 'pair') entry.args.forEach(collect);
      else if (entry.kind === 'anomaly') entry.lines.forEach(collect);
      else if (entry.kind === 'turn' || entry.kind === 'product' || entry.kind === 'rounded-turn') {
        reads.push(
          { entry: index, component: 'value', line: entry.line },
          { entry: index, component: 'sine', line: entry.sinLine },
        );
      } else if (entry.line >= 0) reads.push({ entry: index, component: 'value', line: entry.line });
      else if ('args' in entry) entry.args.forEach(collect);
    };
    args.forEach(collect);
    const distinct = reads.filter(
      ({ line }, k) => line >= 0 && reads.findIndex((other) => other.line === line) === k,
    );
    const { kernel } = this.lowered;
    const tape = new LineTape(
      kernel,
      distinct.map(({ line }) => line),
      [this.line(turn.cos), this.line(turn.sin)],
    );
    return { reads: distinct, errors: (lo, hi) => tape.errors(lo, hi) };
  }

  private offset(node: Node, stage: Stage): Entry {
    const [sinM, cosM, e] = node.args as [Node, Node, Node];
    const turn = this.turnOf.get(sinM);
    if (turn === undefined || turn.sin !== sinM || turn.cos !== cosM) {
      throw unsupported("Kepler's equation of a mean anomaly whose sine and cosine are no turn");
    }
    return {
      kind: 'offset',
      turn: this.turn(turn, stage),
      e: this.real(e, stage),
      format: this.formatOf(stage),
      errors: this.blocks?.solver(node) ?? null,
      line: this.line(node),
    };
  }

  /** The constant that a line reads as its argument: its value is the one that stands in the line, whatever the formula says. */
  private constantRead(node: Node, line: number, argument: number): number | undefined {
    if (node.stage !== 'constant' || line < 0 || this.blocks === null) return undefined;
    const { lines } = this.lowered.kernel;
    const read = lines[lines[line]!.args[argument]!];
    return read?.operation === 'constant' ? this.constantOf(node, read.value) : undefined;
  }

  private constant(node: Node, format: Format): number {
    const { hi } = exactValue(node);
    return this.constantOf(node, format === 'f32' && this.blocks !== null ? Math.fround(hi) : hi);
  }

  private constantOf(node: Node, value: number): number {
    return this.once(`constant ${value} ${this.id(node)}`, () => {
      const { hi, lo } = exactValue(node);
      return { kind: 'constant', value, error: Math.abs(value - hi - lo) * (1 + 2 ** -50), line: -1 };
    });
  }

  private once(key: string, make: () => Entry): number {
    const known = this.memo.get(key);
    if (known !== undefined) return known;
    const entry = make();
    const index = this.entries.push(entry) - 1;
    this.memo.set(key, index);
    return index;
  }

  private id(object: object): number {
    const known = this.ids.get(object) ?? this.ids.size;
    this.ids.set(object, known);
    return known;
  }

  private formatOf(stage: Stage): Format {
    return this.lowered.kernel.choices[stage];
  }

  private line(node: Node): number {
    return this.lowered.lineOf.get(node) ?? -1;
  }

  private roundLine(node: Node): number {
    return roundLineOf(this.lowered.kernel, this.line(node));
  }
}

/** The line that rounds another to float32, or -1. */
export function roundLineOf(kernel: Kernel, line: number): number {
  return kernel.lines.findIndex((candidate) => candidate.operation === 'round' && candidate.args[0] === line);
}

/** The value of a node that depends on nothing, in double-double arithmetic. */
function exactValue(node: Node): { readonly hi: number; readonly lo: number } {
  const evaluator = new Evaluator([node]);
  evaluator.run({});
  return evaluator.value(node);
}

function stageOf(node: Node): Stage {
  return node.stage === 'tick' ? 'tick' : 'setup';
}

const REAL_KINDS: readonly string[] = ['add', 'sub', 'mul', 'div', 'neg', 'sqrt', 'abs', 'select'];

function realKind(node: Node): RealKind {
  if (!REAL_KINDS.includes(node.operation))
    throw unsupported(`the operation ${node.operation} outside a block`);
  return node.operation as RealKind;
}

function unsupported(what: string): InputError {
  return new InputError({
    code: 'bound.unsupported',
    place: { file: 'kernel' },
    what: `the proof does not cover ${what}`,
    why: 'Every line of a kernel must have a proven error.',
    remedy: 'Write the model without it, or leave the output without a certified error.',
  });
}
