import type { Domain } from '../../src/models/description.ts';
import { digest } from '../files/digest.ts';
import { Random } from '../numbers/random.ts';
import type { Judge } from '../observe/judge.ts';
import { Points } from '../observe/points.ts';

const COUNT = 1024;

/** Digest of a kernel's outputs over fixed inputs of its domain: the same on every engine that computes the same bits. */
export function outputsDigest(judge: Judge, domain: Domain, names: readonly string[]): string {
  const points = new Points(domain, names, new Random(2));
  const width = judge.outputs.length;
  const bits = new Float64Array(COUNT * width);
  for (let k = 0; k < COUNT; k++) {
    judge.run(points.draw());
    bits.set(judge.outputs, k * width);
  }
  return digest(new Uint8Array(bits.buffer));
}
