import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { Proof } from '../../codegen/bound/proof.ts';
import { ERROR_KEY_OF_GROUP } from '../../codegen/certificate/certificate.ts';
import { taskOf } from '../../codegen/choose/task.ts';
import { makeVariant } from '../../codegen/choose/variant.ts';
import { Random } from '../../codegen/numbers/random.ts';
import { Judge } from '../../codegen/observe/judge.ts';
import { importKernel } from '../../codegen/observe/module.ts';
import { type Point, Points } from '../../codegen/observe/points.ts';
import { compareKernel } from '../../codegen/parse/compare.ts';
import { parseKernel } from '../../codegen/parse/parse.ts';
import type { Domain } from '../../src/models/description.ts';
import { folders } from '../generated/folders.ts';

/** Points of each committed kernel. */
const POINTS = 100_000;

describe.each(folders())('generated/$name', ({ path, certificate }) => {
  const code = readFileSync(`${path}/kernel.js`, 'utf8');
  const kept = JSON.parse(readFileSync(`${path}/worst.json`, 'utf8')) as Record<string, { point: Point }[]>;
  const limits = Object.fromEntries(
    Object.entries(certificate.error).map(([key, { allowed }]) => [key, allowed]),
  );
  const task = taskOf({ model: certificate.model, domain: certificate.domain.name, error: limits }, 'budget');
  const { lowered, kernel } = makeVariant(task, certificate.choices);

  test('at every point error <= bound at the point <= certified bound', async () => {
    expect(compareKernel(parseKernel('kernel.js', code), kernel, 'kernel.js')).toEqual([]);
    const judge = new Judge(task.formula, await importKernel(code), task.model.frameRate);
    const groups = judge.groups.map((group) => {
      const proof = new Proof(lowered, group);
      return { group, proof, certified: certificate.error[ERROR_KEY_OF_GROUP[group]!]!.certified };
    });
    const draw = drawer(
      task.domain,
      Object.values(kept).flatMap((list) => list.map(({ point }) => point)),
    );
    const nearest = groups.map(() => 0);
    const wrong: unknown[] = [];
    for (let k = 0; k < POINTS; k++) {
      const point = draw();
      const errors = judge.errors(point);
      for (const [index, { group, proof, certified }] of groups.entries()) {
        const error = errors.get(group)!.size;
        const bound = proof.boundAt(point);
        if (!(error <= bound && bound <= certified)) wrong.push({ group, error, bound, certified, point });
        nearest[index] = Math.max(nearest[index]!, error / bound);
      }
    }
    expect(wrong.slice(0, 3)).toEqual([]);
    for (const near of nearest) expect(near).toBeGreaterThan(0.3); // the bounds are no mere ceilings
  });
});

/** Points inside and on faces, corners of the domain, and the neighbourhoods of the worst points that are known. */
function drawer(domain: Domain, worst: readonly Point[]): () => Point {
  const random = new Random(71);
  const names = Object.keys(domain);
  const inside = new Points(domain, names, random);
  const near = ({ min, max }: { min: number; max: number }, x: number): number =>
    Math.min(Math.max(x + (max - min) * 2 ** (-4 - 40 * random.next()) * (2 * random.next() - 1), min), max);
  return () => {
    const kind = random.below(4);
    if (kind > 1) return inside.draw();
    const start = worst[random.below(worst.length)]!;
    return Object.fromEntries(
      names.map((name) => {
        const range = domain[name]!;
        const end = random.below(2) === 0 ? range.min : range.max;
        return [name, kind === 0 ? end : near(range, start[name] ?? end)];
      }),
    );
  };
}
