/** What an emitted file exports. */
export interface KernelModule {
  readonly stateWords: number;
  setup(elements: Readonly<Record<string, number>>, state: Float64Array): number;
  position(t: number, state: Float64Array, out: Float64Array): number;
}

/**
 * Imports emitted code as the module it is: the file's own text is what runs.
 *
 * @param code text of the emitted file
 */
export async function importKernel(code: string): Promise<KernelModule> {
  const url = `data:text/javascript;base64,${Buffer.from(code).toString('base64')}`;
  return (await import(/* @vite-ignore */ url)) as KernelModule;
}
