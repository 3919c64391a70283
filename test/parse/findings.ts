import type { Kernel } from '../../codegen/kernel/kernel.ts';
import { compareKernel } from '../../codegen/parse/compare.ts';
import { parseKernel } from '../../codegen/parse/parse.ts';
import { type Finding, InputError } from '../../src/finding.ts';

/** What is found in a text that should be a kernel: the refusal, or the differences. */
export function findingsOf(text: string, kernel: Kernel): readonly Finding[] {
  try {
    return compareKernel(parseKernel('kernel.js', text), kernel, 'kernel.js');
  } catch (error) {
    if (error instanceof InputError) return error.findings;
    throw error;
  }
}
