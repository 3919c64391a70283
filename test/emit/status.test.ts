import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { Random } from '../../codegen/numbers/random.ts';
import { importKernel, type KernelModule } from '../../codegen/observe/module.ts';
import { Points } from '../../codegen/observe/points.ts';
import { MODELS } from '../../src/systems/catalogue.ts';
import { type Folder, folders } from '../generated/folders.ts';

async function kernelOf(folder: Folder): Promise<KernelModule> {
  return importKernel(readFileSync(`${folder.path}/kernel.js`, 'utf8'));
}

describe.each(folders())('$name: status values', (folder) => {
  const domain = MODELS[folder.certificate.model]!.domains[folder.certificate.domain.name]!;
  const names = Object.keys(folder.certificate.domain.ranges);
  const elements = names.filter((name) => name !== 't');
  const good = new Points(domain, names, new Random(31)).draw();
  const outputs = () => new Float64Array(8).fill(-7);

  test('0 over the whole domain, ends of ranges included', async () => {
    const kernel = await kernelOf(folder);
    const points = new Points(domain, names, new Random(32));
    const state = new Float64Array(kernel.stateWords);
    for (let k = 0; k < 2000; k++) {
      const point = points.draw();
      expect(kernel.setup(point, state)).toBe(0);
      expect(kernel.position(point['t']!, state, outputs())).toBe(0);
    }
  });

  test.each(elements)(
    '1 for %s outside its range, 3 for no finite number; the state is void after that',
    async (name) => {
      const kernel = await kernelOf(folder);
      const { min, max } = domain[name]!;
      const beyond = (max - min) * 1e-3;
      for (const [value, status] of [
        [max + beyond, 1],
        [min - beyond, 1],
        [Number.NaN, 3],
        [Number.POSITIVE_INFINITY, 3],
        [Number.NEGATIVE_INFINITY, 3],
      ] as const) {
        const state = new Float64Array(kernel.stateWords);
        expect(kernel.setup(good, state)).toBe(0);
        expect(kernel.setup({ ...good, [name]: value }, state)).toBe(status);
        const out = outputs();
        expect(kernel.position(0, state, out)).toBe(1);
        expect([...out]).toEqual([...outputs()]);
      }
    },
  );

  test('2 for a time outside the span, 3 for no finite number; the outputs stay', async () => {
    const kernel = await kernelOf(folder);
    const state = new Float64Array(kernel.stateWords);
    kernel.setup(good, state);
    for (const [t, status] of [
      [7200.01, 2],
      [-7200.01, 2],
      [1e30, 2],
      [Number.NaN, 3],
      [Number.POSITIVE_INFINITY, 3],
      [Number.NEGATIVE_INFINITY, 3],
    ] as const) {
      const out = outputs();
      expect(kernel.position(t, state, out)).toBe(status);
      expect([...out]).toEqual([...outputs()]);
    }
  });

  test('a state that was never filled gives 1, a missing element 3', async () => {
    const kernel = await kernelOf(folder);
    const state = new Float64Array(kernel.stateWords);
    expect(kernel.position(0, state, outputs())).toBe(1);
    const { [elements[0]!]: _, ...rest } = good;
    expect(kernel.setup(rest, state)).toBe(3);
  });
});
