import { readFileSync } from 'node:fs';
import { taskOf } from '../../codegen/choose/task.ts';
import { makeVariant } from '../../codegen/choose/variant.ts';
import type { Kernel } from '../../codegen/kernel/kernel.ts';
import { folders } from '../generated/folders.ts';

/** A committed file and the kernel that its model gives. */
export interface Committed {
  readonly name: string;
  readonly text: string;
  readonly kernel: Kernel;
}

/** All committed kernels. */
export function committedKernels(): readonly Committed[] {
  return folders().map(({ name, path, certificate }) => {
    const errors = Object.fromEntries(Object.keys(certificate.error).map((key) => [key, 1]));
    const task = taskOf({ model: certificate.model, domain: certificate.domain.name, error: errors }, path);
    const { kernel } = makeVariant(task, certificate.choices);
    return { name, text: readFileSync(`${path}/kernel.js`, 'utf8'), kernel };
  });
}
