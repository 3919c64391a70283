import { describe, expect, test } from 'vitest';
import { KernelBlocks } from '../../codegen/bound/blocks.ts';
import { roundLineOf } from '../../codegen/bound/build.ts';
import { findTurns } from '../../codegen/bound/turns.ts';
import { inOrder } from '../../codegen/formula/graph.ts';
import { Pairs, set } from '../../codegen/numbers/double-double.ts';
import { keplerOffset, sinCos } from '../../codegen/numbers/double-double-functions.ts';
import { Random } from '../../codegen/numbers/random.ts';
import { runLines, subject } from './lines.ts';

const SUBJECTS = [
  subject('gps-lnav', 'flown', {}),
  subject('gps-lnav', 'flown', { tick: 'f32', cap: 1 }),
  subject('gps-lnav', 'flown', { setup: 'f32', tick: 'f32', cap: 1 }),
  subject('earth-orbit', 'near-circular', {}),
];

describe.each(SUBJECTS)('$name: proven errors of blocks hold', ({ lowered, task }) => {
  const { kernel, lineOf, graph, exact } = lowered;
  const nodes = inOrder(exact.outputs.map((output) => output.node));
  const blocks = new KernelBlocks(lowered);

  test('every sine and cosine, at angles all over its range', () => {
    const pairs = new Pairs(3);
    const random = new Random(51);
    let nearest = 0;
    for (const turn of findTurns(graph, nodes, []).filter((turn) => turn.angle !== undefined)) {
      const errors = blocks.sine(turn);
      const radius = (lowered.replacements.get(turn.cos) ?? lowered.replacements.get(turn.sin))!.radius!;
      const format = kernel.choices[turn.cos.stage === 'tick' ? 'tick' : 'setup'];
      const own = lineOf.get(turn.angle!)!;
      const angle = kernel.lines[own]!.format === format ? own : roundLineOf(kernel, own);
      for (let k = 0; k < 1500; k++) {
        const plain = (2 * random.next() - 1) * radius * 0.999;
        const x = format === 'f32' ? Math.fround(plain) : plain;
        const values = runLines(kernel, {}, new Map(), new Map([[angle, x]]));
        set(pairs, 0, x);
        sinCos(pairs, 1, 2, 0);
        for (const [node, register, bound] of [
          [turn.sin, 1, errors.sin(x, x)],
          [turn.cos, 2, errors.cos(x, x)],
        ] as const) {
          const line = lineOf.get(node);
          if (line === undefined) continue;
          const error = Math.abs(values[line]! - pairs.hi[register]! - pairs.lo[register]!);
          expect(error).toBeLessThanOrEqual(bound);
          nearest = Math.max(nearest, error / bound);
        }
      }
    }
    expect(nearest).toBeGreaterThan(0.4); // the bounds are no mere ceilings
  });

  test('the capped solver, over mean anomaly and eccentricity', () => {
    const offset = nodes.find((node) => node.operation === 'offset')!;
    const errors = blocks.solver(offset);
    const f32 = kernel.choices.tick === 'f32';
    const lines = offset.args.map((node, k) => {
      const own = lineOf.get(node)!;
      return k === 2 && f32 && kernel.choices.setup === 'f64' ? roundLineOf(kernel, own) : own;
    });
    const elsewhere = kernel.choices.setup === 'f32' ? roundLineOf(kernel, lines[2]!) : lines[2]!;
    const pairs = new Pairs(4);
    const random = new Random(52);
    const { max } = task.domain['e']!;
    for (let k = 0; k < 3000; k++) {
      const M = (2 * random.next() - 1) * Math.PI;
      const wide = k % 5 === 0 ? max : random.next() * max;
      const [s, c, e] = [Math.sin(M), Math.cos(M), wide].map((x) => (f32 ? Math.fround(x) : x)) as [
        number,
        number,
        number,
      ];
      const given = new Map([
        [lines[0]!, s],
        [lines[1]!, c],
        [elsewhere, e],
      ]);
      const values = runLines(kernel, {}, new Map(), given);
      for (const [register, value] of [s, c, e].entries()) set(pairs, register, value);
      keplerOffset(pairs, 3, 0, 1, 2);
      const error = Math.abs(values[lineOf.get(offset)!]! - pairs.hi[3]! - pairs.lo[3]!);
      expect(error).toBeLessThanOrEqual(errors.offset({ lo: M, hi: M }, { lo: e, hi: e }));
    }
  });

  test('beyond the range of a block nothing is promised', () => {
    const [turn] = findTurns(graph, nodes, []).filter(
      ({ angle, cos }) => angle !== undefined && !blocksAll(blocks.sine({ cos, sin: cos, angle })),
    );
    if (turn !== undefined) expect(blocks.sine(turn).cos(0, 50)).toBe(Infinity);
    const solver = blocks.solver(nodes.find((node) => node.operation === 'offset')!);
    expect(solver.offset({ lo: 0, hi: 1 }, { lo: 0, hi: 0.99 })).toBe(Infinity);
  });
});

function blocksAll(errors: { readonly periodic: boolean }): boolean {
  return errors.periodic;
}
