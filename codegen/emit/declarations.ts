import type { Kernel } from '../kernel/kernel.ts';
import { stateType } from './documentation.ts';

/** The type declarations that stand beside an emitted module. */
export function emitDeclarations(kernel: Kernel, units: Readonly<Record<string, string>>): string {
  const array = stateType(kernel);
  return [
    '/** Generated file, do not edit. Elements that setup takes. */',
    'export interface Elements {',
    ...kernel.elements.flatMap((name) => {
      const { min, max } = kernel.domain[name]!;
      return [`  /** ${units[name] ?? ''}, [${min}, ${max}] */`, `  readonly ${name}: number;`];
    }),
    '}',
    '',
    '/** 0 good; 1 element outside its range or state not filled; 2 time outside its span; 3 not a finite number. */',
    'export type Status = 0 | 1 | 2 | 3;',
    '',
    '/** Words of the state array. */',
    `export declare const stateWords: ${kernel.state.length};`,
    '',
    '/** Prepares the state of one satellite. */',
    `export declare function setup(elements: Elements, state: ${array}): Status;`,
    '',
    `/** Predicts at one epoch: ${kernel.outputs.map((output, index) => `out[${index}] ${output.group === output.name ? output.name : `${output.group} ${output.name}`} in ${output.unit}`).join(', ')}. */`,
    `export declare function position(t: number, state: ${array}, out: Float64Array | number[]): Status;`,
    '',
  ].join('\n');
}
