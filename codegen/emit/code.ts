import type { Kernel, Line } from '../kernel/kernel.ts';
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
    ...assignments(kernel, 'setup', claims.notes),
    ...kernel.state.map((line, slot) => `  state[${slot}] = ${kernel.lines[line]!.name};`),
    '  return 0;',
    '}',
    '',
    doc.tick,
    'export function position(t, state, out) {',
    ...checkTime(kernel),
    ...kernel.state.map((line, slot) => `  const ${kernel.lines[line]!.name} = state[${slot}];`),
    ...(kernel.guard < 0
      ? []
      : [`  if (!(${kernel.lines[kernel.state[kernel.guard]!]!.name} > 0)) return 1;`]),
    ...assignments(kernel, 'tick', claims.notes),
    ...kernel.outputs.map((output, index) => `  out[${index}] = ${operand(kernel.lines[output.line]!)};`),
    '  return 0;',
    '}',
    '',
  ].join('\n');
}

/** Reads one element and checks its range. */
function readElement(kernel: Kernel, name: string): readonly string[] {
  const input = kernel.lines.findIndex(
    (line) => line.stage === 'setup' && line.operation === 'input' && line.name === name,
  );
  return [`  const ${name} = elements.${name};`, ...checkRange(kernel, input, 1)];
}

function checkTime(kernel: Kernel): readonly string[] {
  return checkRange(
    kernel,
    kernel.lines.findIndex((line) => line.stage === 'tick' && line.operation === 'input'),
    2,
  );
}

/**
 * Checks the range of an input as its stage carries it: in a float32 stage the rounded value against the rounded
 * range, which every value of the range passes. The difference of a number with itself is 0 only when it is finite.
 */
function checkRange(kernel: Kernel, input: number, status: 1 | 2): readonly string[] {
  const { name, stage } = kernel.lines[input]!;
  const { min, max } = kernel.domain[name]!;
  const rounded = roundedInput(kernel, input);
  const check = (value: string, bound: (x: number) => string, finite: string) =>
    `  if (!(${value} >= ${bound(min)} && ${value} <= ${bound(max)})) return ${finite} === 0 ? ${status} : 3;`;
  if (rounded === undefined || kernel.choices[stage as 'setup' | 'tick'] === 'f64')
    return [check(name, literal, `${name} - ${name}`)];
  return [
    `  const ${rounded.name} = fround(${name});`,
    check(rounded.name, (x) => literal(Math.fround(x)), `fround(${rounded.name} - ${rounded.name})`),
  ];
}

/** The line that rounds an input to float32, if there is one. */
function roundedInput(kernel: Kernel, input: number): Line | undefined {
  return kernel.lines.find((line) => line.operation === 'round' && line.args[0] === input);
}

function assignments(
  kernel: Kernel,
  stage: 'setup' | 'tick',
  notes: ReadonlyMap<number, string>,
): readonly string[] {
  const checked = (line: Line) =>
    line.operation === 'round' &&
    kernel.choices[stage] === 'f32' &&
    kernel.lines[line.args[0]!]!.operation === 'input';
  return [...kernel.lines.entries()]
    .filter(([, line]) => line.stage === stage && line.operation !== 'input' && !checked(line))
    .map(([k, line]) => {
      const note = notes.get(k);
      return `  const ${line.name} = ${expression(kernel, line)};${note === undefined ? '' : ` // ${note}`}`;
    });
}
