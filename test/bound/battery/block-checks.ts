import { Graph } from '../../../codegen/formula/graph.ts';
import type { Node } from '../../../codegen/formula/node.ts';
import type { Corrector, Starter } from '../../../codegen/kernel/choices.ts';
import type { Kernel } from '../../../codegen/kernel/kernel.ts';
import { iterates } from '../../../codegen/lower/solver.ts';
import { Random } from '../../../codegen/numbers/random.ts';
import * as correctors from '../../../src/kepler/correctors.ts';
import { eccentricAnomaly } from '../../../src/kepler/eccentric-anomaly.ts';
import * as starters from '../../../src/kepler/starters.ts';
import type { Analysis } from '../faulty.ts';
import { runLines, type Subject, subject } from '../lines.ts';
import { smallSubject } from '../small-models.ts';
import { demand, Shares } from './demand.ts';
import { kernelOf } from './kernels.ts';

/** Polynomials too short for their range: how far they are off is nearly attained in every part of it. */
export function truncations({ boundSineBins, boundCosineBins }: Analysis): void {
  const parts = 8;
  for (const radius of [0.5, 1.3, 2.9]) {
    for (const [bins, value, c] of [
      [boundSineBins, Math.sin, [1, -1 / 6, 1 / 120]],
      [boundCosineBins, Math.cos, [1, -0.5, 1 / 24]],
      [boundSineBins, Math.sin, [0.9, -0.1]],
    ] as const) {
      const found = bins(c, radius, parts);
      const odd = value === Math.sin;
      for (let part = 0; part < parts; part++) {
        const shares = new Shares();
        for (let k = 0; k <= 100; k++) {
          const x = (radius * (part + k / 100)) / parts;
          const p = c.reduceRight((sum, coefficient) => coefficient + x * x * sum, 0) * (odd ? x : 1);
          const error = Math.abs(p - value(x)) * (1 - 1e-9) - 1e-15;
          shares.add(error, found[part]!, () => `a polynomial at ${x}`);
        }
        if (found[part]! > 1e-9) shares.reach(0.95, `part ${part} of ${radius}`);
      }
    }
  }
}

/** Lines that compute the sine and cosine of line 0, with results. */
interface SineCase {
  readonly name: string;
  readonly kernel: Kernel;
  readonly cos: number;
  readonly sin: number;
  readonly radius: number;
  readonly reach: number;
}

let made: readonly SineCase[] | undefined;

/** Sines of short polynomials, of a coarse half pi, and of float32: what counts is truncation, reduction, rounding. */
function sineCases(): readonly SineCase[] {
  if (made !== undefined) return made;
  const sine = kernelOf('f64', ['x', -1 / 6, ['mul', 0, 0], ['mul', 2, 1], ['mul', 0, 3], ['add', 0, 4]]);
  const cosine = kernelOf('f64', ['x', -0.5, 1, ['mul', 0, 0], ['mul', 3, 1], ['add', 2, 4]]);
  const { lowered } = smallSubject(
    { name: 'turns', body: '', returns: '{ x: Math.cos(t), y: Math.sin(t) }', ranges: { t: [-40, 40] } },
    { setup: 'f32', tick: 'f32' },
  );
  const { kernel } = lowered;
  const [cos, sin] = kernel.outputs.map((output) => output.line) as [number, number];
  const angle = kernel.lines.findIndex((line) => line.operation === 'round');
  // the angle itself comes first, and nothing else is read
  const block = { ...kernel, lines: kernel.lines.map((line, k) => (k === angle ? asInput(line) : line)) };
  const doubled = block.lines.map((line) => ({ ...line, format: 'f64' as const }));
  const quotient = doubled.findIndex((line) => line.operation === 'floor');
  const parts = doubled.filter(({ operation, args }) => operation === 'mul' && args[0] === quotient);
  // the parts of half pi stand beside the quotient, after the half that halves it
  const second = parts.filter((line) => doubled[line.args[1]!]!.value !== 0.5)[1]!.args[1]!;
  const coarse = doubled.map((line, k) => (k === second ? { ...line, value: 0.9 * line.value } : line));
  made = [
    { name: 'a short sine', kernel: sine, cos: -1, sin: 5, radius: 1, reach: 0.8 },
    { name: 'a short cosine', kernel: cosine, cos: 5, sin: -1, radius: 1, reach: 0.8 },
    { name: 'a float32 turn', kernel: block, cos, sin, radius: 40, reach: 0.6 },
    {
      name: 'coefficients of float32',
      kernel: { ...block, lines: doubled },
      cos,
      sin,
      radius: 40,
      reach: 0.7,
    },
    { name: 'a coarse half pi', kernel: { ...block, lines: coarse }, cos, sin, radius: 40, reach: 0.99 },
  ];
  return made;
}

function asInput(line: Kernel['lines'][number]): Kernel['lines'][number] {
  return { ...line, operation: 'input', args: [], name: 'x' };
}

/** Blocks of a sine and cosine: no error is above the bound of its angle, and some come near. */
export function sines({ sineErrors }: Analysis): void {
  const random = new Random(101);
  for (const { name, kernel, cos, sin, radius, reach } of sineCases()) {
    const angle = kernel.lines.findIndex((line) => line.name === 'x');
    const errors = sineErrors(kernel, { angle, cos, sin }, radius);
    const float32 = kernel.lines.some(
      (line, k) => k > angle && line.format === 'f32' && line.operation === 'mul',
    );
    const shares = [new Shares(), new Shares()] as const;
    for (let n = 0; n < 6000; n++) {
      const plain = (2 * random.next() - 1) * radius * 0.999;
      const x = float32 ? Math.fround(plain) : plain;
      const values = runLines(kernel, { x });
      const width = n % 3 === 0 ? 0.3 * random.next() : 0;
      const from = Math.max(-radius, x - width);
      for (const [line, exact, bound, share] of [
        [cos, Math.cos(x), errors.cos(from, x), shares[0]],
        [sin, Math.sin(x), errors.sin(from, x), shares[1]],
      ] as const)
        if (line >= 0)
          share.add(Math.abs(values[line]! - exact) * (1 - 1e-6), bound, () => `${name} at ${x}`);
      const both = Math.hypot(
        cos < 0 ? 0 : values[cos]! - Math.cos(x),
        sin < 0 ? 0 : values[sin]! - Math.sin(x),
      );
      demand(both * (1 - 1e-6) <= errors.both(from, x), () => `${name} at ${x}: both at once`);
    }
    if (cos >= 0) shares[0].reach(reach, `${name}, cosine`);
    if (sin >= 0) shares[1].reach(reach, `${name}, sine`);
    demand(!(errors.cos(-2 * radius, 2 * radius) < 1e-300) || cos < 0, () => `${name} promises too much`);
  }
}

/** Exact arithmetic of the capped solver: its starters and steps come as near as they are said to, nearly exactly. */
export function convergence({ KeplerConvergence }: Analysis): void {
  const random = new Random(102);
  for (const [starter, corrector] of [
    ['firstOrder', 'newton'],
    ['secondOrder', 'halley'],
    ['thirdOrder', 'quartic'],
  ] as const satisfies readonly (readonly [Starter, Corrector])[]) {
    const graph = new Graph();
    const [sinM, cosM, e] = ['sinM', 'cosM', 'e'].map((name) => graph.input(name, 'tick')) as [
      Node,
      Node,
      Node,
    ];
    const choices = { setup: 'f64', tick: 'f64', starter, corrector, cap: 0 } as const;
    const [guess] = iterates(graph, graph.make('offset', sinM, cosM, e), choices) as [Node];
    const solver = new KeplerConvergence({ graph, sinM, cosM, e, guess }, corrector);
    const [start, step] = [new Shares(), new Shares()];
    for (let n = 0; n < 1500; n++) {
      const [m, ecc] = [2 * Math.PI * random.next() - Math.PI, 0.02 + 0.6 * random.next()];
      const wide = n % 3 === 0 ? 0.05 : 0;
      const M = { lo: m - wide * random.next(), hi: m + wide * random.next() };
      const range = { lo: ecc - 0.3 * wide, hi: ecc + 0.3 * wide };
      const D = eccentricAnomaly(m, ecc) - m;
      const [s, c] = [Math.sin(m), Math.cos(m)];
      const exact = solver.exact(M, range);
      demand(exact.lo <= D + 1e-14 && D - 1e-14 <= exact.hi, () => `E - M at M = ${m}, e = ${ecc}`);
      within(
        starters[starter](s, c, ecc) - D,
        solver.start(M, range, exact),
        wide === 0 ? start : null,
        `${starter} at M = ${m}, e = ${ecc}`,
      );
      const x = (random.next() < 0.5 ? -1 : 1) * 10 ** (-1.2 - 1.5 * random.next());
      const error = { lo: Math.min(x, n % 2 === 0 ? x : -x), hi: Math.max(x, n % 2 === 0 ? x : -x) };
      const after = correctors[corrector](D + x, s, c, ecc) - D;
      within(
        after,
        solver.step(M, range, exact, error),
        wide === 0 ? step : null,
        `${corrector} at M = ${m}, e = ${ecc}, ${x} off`,
      );
    }
    start.reach(0.9, starter);
    step.reach({ newton: 0.9, halley: 0.35, quartic: 0.2 }[corrector], corrector);
  }
}

function within(
  error: number,
  { lo, hi }: { lo: number; hi: number },
  shares: Shares | null,
  what: string,
): void {
  const room = 1e-14 + Math.abs(error) * 2 ** -34; // rounding of the comparison itself
  demand(
    lo - room <= error && error <= hi + room,
    () => `${what}: the error ${error} is outside ${lo}, ${hi}`,
  );
  if (Math.abs(error) > 1e-9) shares?.add(Math.abs(error) * (1 - 1e-6), Math.max(-lo, hi), () => what);
}

let solvers: readonly Subject[] | undefined;

/** The lines of capped solvers: float32, with caps that leave something to be seen and that leave nothing. */
export function cappedSolvers({ KernelBlocks }: Analysis): void {
  solvers ??= [
    subject('gps-lnav', 'flown', { setup: 'f32', tick: 'f32', cap: 1, starter: 'firstOrder' }),
    subject('earth-orbit', 'near-circular', { setup: 'f32', tick: 'f32', cap: 1 }),
    subject('earth-orbit', 'near-circular', { setup: 'f32', tick: 'f32', cap: 2 }),
  ];
  const random = new Random(103);
  for (const { name, lowered, task } of solvers) {
    const { kernel, lineOf, replacements } = lowered;
    const offset = [...replacements.keys()].find((node) => node.operation === 'offset')!;
    const errors = new KernelBlocks(lowered).solver(offset);
    const float32 = kernel.choices.tick === 'f32';
    const lines = offset.args.map((node, k) => {
      const own = lineOf.get(node)!;
      return k === 2 && float32
        ? kernel.lines.findIndex((line) => line.operation === 'round' && line.args[0] === own)
        : own;
    });
    const shares = new Shares();
    const rounded = (x: number) => (float32 ? Math.fround(x) : x);
    for (let n = 0; n < 4000; n++) {
      const M = rounded((2 * random.next() - 1) * Math.PI);
      const e = rounded(
        n % 3 === 0 ? task.domain['e']!.max * 0.9999999 : random.next() * task.domain['e']!.max,
      );
      const values = [Math.sin(M), Math.cos(M), e].map(rounded);
      const given = new Map(values.map((value, k) => [lines[k]!, value]));
      const found = runLines(kernel, {}, new Map(), given)[lineOf.get(offset)!]!;
      // the turn is that of the numbers read, which is not quite that of M and not quite on the circle
      const m = Math.atan2(values[0]!, values[1]!);
      const size = Math.hypot(values[0]!, values[1]!);
      const exact = eccentricAnomaly(m, e * size) - m;
      const bound = errors.offset({ lo: m, hi: m }, { lo: e, hi: e });
      shares.add(
        Math.abs(found - exact) - 2e-15,
        bound,
        () => `${name}, cap ${kernel.choices.cap}, M = ${M}, e = ${e}`,
      );
    }
    shares.reach(0.45, `${name}, cap ${kernel.choices.cap}`);
  }
}
