import { operationText } from '../formula/operation-text.ts';
import { isRounded, type Kernel, type Line } from '../kernel/kernel.ts';

/** The right-hand side of a line: one operation, with its rounding to float32 where the line is float32. */
export function expression(kernel: Kernel, line: Line): string {
  const args = line.args.map((arg) => operand(kernel.lines[arg]!));
  const text = operation(line, args);
  return line.format === 'f32' && isRounded(line.operation) ? `fround(${text})` : text;
}

/** How a line is written where it is used: constants by their value, all others by name. */
export function operand(line: Line): string {
  return line.operation === 'constant' ? literal(line.value) : line.name;
}

/** The shortest decimal that reads back as the same float64 number. */
export function literal(value: number): string {
  return Object.is(value, -0) ? '-0' : String(value);
}

function operation(line: Line, args: readonly string[]): string {
  switch (line.operation) {
    case 'round':
      return `fround(${args[0]})`;
    case 'input':
    case 'constant':
      throw new Error(`a line of kind ${line.operation} has no expression`);
    default:
      return operationText(line.operation, args);
  }
}
