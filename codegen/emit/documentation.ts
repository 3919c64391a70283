import { arithmeticName } from '../kernel/choices.ts';
import type { Kernel } from '../kernel/kernel.ts';

/** What the doc blocks of an emitted file say beside the code. */
export interface Claims {
  /** One line on what the model computes. */
  readonly title: string;
  /** Published source of the equations. */
  readonly source: string;
  /** Digest of the formula that the kernel was lowered from. */
  readonly formulaDigest: string;
  readonly domainName: string;
  /** Units of the elements, by name. */
  readonly units: Readonly<Record<string, string>>;
  /** One sentence a group of outputs on its error; empty while a kernel is still being tried. */
  readonly errors: readonly string[];
  /** What is known of lines, by line: stands beside them. */
  readonly notes: ReadonlyMap<number, string>;
}

/** Doc blocks of an emitted file. */
interface Documentation {
  readonly file: string;
  readonly stateWords: string;
  readonly setup: string;
  readonly tick: string;
}

/** Writes the doc blocks: shapes, units, domain, status values, errors. No date, host, path or version. */
export function documentation(kernel: Kernel, claims: Claims): Documentation {
  const array = stateType(kernel);
  return {
    file: block([
      'Generated file, do not edit: change the budget or the model and generate again.',
      '',
      `${claims.title}.`,
      `Model ${kernel.model}: ${claims.source}; formula sha256 ${claims.formulaDigest}.`,
      `Domain ${claims.domainName}. Choices: ${describeChoices(kernel)}.`,
      ...claims.errors,
      ...(claims.notes.size === 0
        ? []
        : [
            'Beside each line: the range of its value over the domain, and its share of the certified error.',
          ]),
      '',
      'Not certified for safety of life. The interface documents, local rules and licensed practice decide.',
    ]),
    stateWords: block(['Words of the state array.']),
    setup: block([
      'Prepares the state of one satellite; call it once for each upload of elements.',
      '',
      `@param elements record of numbers: ${kernel.elements.join(', ')}; ranges and units:`,
      ...kernel.elements.map((name) =>
        `  ${name} [${kernel.domain[name]!.min}, ${kernel.domain[name]!.max}] ${claims.units[name] ?? ''}`.trimEnd(),
      ),
      `@param {${array}} state stateWords words, written`,
      '@returns 0 good; 1 an element outside its range; 3 an element that is not a finite number.',
      '  After any other status than 0 the state is void, and position returns 1.',
    ]),
    tick: block([
      'Predicts at one epoch, in the same operations for every input.',
      '',
      `@param t time since the reference epoch of the elements, s, in [${kernel.domain['t']!.min}, ${kernel.domain['t']!.max}]`,
      `@param {${array}} state the words that setup wrote`,
      '@param out array of numbers, written only with status 0:',
      ...kernel.outputs.map(
        (output, index) =>
          `  out[${index}] ${output.group === output.name ? output.name : `${output.group} ${output.name}`}, ${output.unit}`,
      ),
      '@returns 0 good; 1 a state that setup did not fill; 2 t outside its span; 3 t not a finite number.',
    ]),
  };
}

/** The typed array that holds the state without loss. */
export function stateType(kernel: Kernel): 'Float64Array' | 'Float32Array' {
  return kernel.state.every((line) => kernel.lines[line]!.format === 'f32') ? 'Float32Array' : 'Float64Array';
}

function describeChoices(kernel: Kernel): string {
  const { starter, corrector, cap } = kernel.choices;
  return `arithmetic ${arithmeticName(kernel.choices)}, Kepler starter ${starter}, corrector ${corrector}, cap ${cap}`;
}

function block(lines: readonly string[]): string {
  if (lines.length === 1) return `/** ${lines[0]} */`;
  return ['/**', ...lines.map((line) => ` * ${line}`.trimEnd()), ' */'].join('\n');
}
