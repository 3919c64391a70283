import type { Stage } from '../formula/node.ts';
import type { Kernel } from '../kernel/kernel.ts';
import { type Claims, documentation } from './documentation.ts';
import { expression, literal, operand } from './expression.ts';

/**
 * A kernel as an ECMAScript module: one assignment a line, the same text for the same kernel to the byte.
 *
 * @param kernel the kernel
 * @param claims what the doc blocks say beside the code
 */
export function emitCode(kernel: Kernel, claims: Claims): string {
  const doc = documentation(kernel, claims);
  const float32 = kernel.lines.some((line) => line.format === 'f32');
  return [
    doc.file,
    ...(float32 ? ['const fround = Math.fround;', ''] : []),
    doc.stateWords,
    `export const stateWords = ${kernel.state.length};`,
    '',
    doc.setup,
    'export function setup(elements, state) {',
    ...(kernel.guard < 0 ? [] : [`  state[${kernel.guard}] = 0;`]),
    ...kernel.elements.flatMap((name) => readElement(kernel, name)),
    ...assignments(kernel, 'setup'),
    ...kernel.state.map((line, slot) => `  state[${slot}] = ${kernel.lines[line]!.name};`),
    '  return 0;',
    '}',
    '',
    doc.tick,
    'export function position(t, state, out) {',
    ...checkTime(kernel),
    ...kernel.state.map((line, slot) => `  const ${kernel.lines[line]!.name} = state[${slot}];`),
    ...(kernel.guard < 0 ? [] : [`  if (!(${kernel.lines[kernel.state[kernel.guard]!]!.name} > 0)) return 1;`]),
    ...assignments(kernel, 'tick'),
    ...kernel.outputs.map((output, index) => `  out[${index}] = ${operand(kernel.lines[output.line]!)};`),
    '  return 0;',
    '}',
    '',
  ].join('\n');
}

/** Reads one element and checks its range; the difference of a number with itself is 0 only when it is finite. */
function readElement(kernel: Kernel, name: string): readonly string[] {
  const { min, max } = kernel.domain[name]!;
  return [
    `  const ${name} = elements.${name};`,
    `  if (!(${name} >= ${literal(min)} && ${name} <= ${literal(max)})) return ${name} - ${name} === 0 ? 1 : 3;`,
  ];
}

function checkTime(kernel: Kernel): readonly string[] {
  const { min, max } = kernel.domain['t']!;
  return [`  if (!(t >= ${literal(min)} && t <= ${literal(max)})) return t - t === 0 ? 2 : 3;`];
}

function assignments(kernel: Kernel, stage: Stage): readonly string[] {
  return kernel.lines
    .filter((line) => line.stage === stage && line.operation !== 'input')
    .map((line) => `  const ${line.name} = ${expression(kernel, line)};`);
}
