import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, test } from 'vitest';
import type { Certificate } from '../../codegen/certificate/certificate.ts';
import { taskOf } from '../../codegen/choose/task.ts';
import { makeVariant } from '../../codegen/choose/variant.ts';
import { inspectSource } from '../../codegen/inspect/inspection.ts';
import { Judge } from '../../codegen/observe/judge.ts';
import { importKernel } from '../../codegen/observe/module.ts';
import { observe } from '../../codegen/observe/observe.ts';

/** What catches a fault: a finding of inspection, counts that differ, or an observed error above the certificate's. */
type Catch = 'inspection' | 'counts' | 'observed';

interface Case {
  readonly name: string;
  readonly folder: 'tide-gauge' | 'drift-buoy';
  readonly by: Catch;
  /** Changes the text of the kernel; must change something. */
  readonly spoil: (code: string) => string;
}

/** Replaces the first match. */
const replace = (pattern: RegExp, by: string) => (code: string) => code.replace(pattern, by);

/** Puts a line before the last return of position. */
const insert = (line: string) => (code: string) => {
  const at = code.lastIndexOf('  out[0]');
  return `${code.slice(0, at)}  ${line}\n${code.slice(at)}`;
};

const CASES: readonly Case[] = [
  {
    name: 'an object is made',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('const extra = { x: 1 };'),
  },
  {
    name: 'an array is made',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('const extra = [t, t];'),
  },
  {
    name: 'a closure is made',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('const extra = () => t;'),
  },
  {
    name: 'a string is built',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('const extra = `at ${t}`;'),
  },
  {
    name: 'a typed array is made',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('const extra = new Float64Array(3);'),
  },
  {
    name: 'a loop runs as long as the data want',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('for (let k = 0; k < t; k++) out[0] = k;'),
  },
  {
    name: 'a while loop waits for convergence',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('while (out[0] > 1e-9) out[0] = out[0] / 2;'),
  },
  {
    name: 'the function calls itself',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('if (t > 7199) position(0, state, out);'),
  },
  {
    name: "the engine's sine is called",
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: replace(/const cosM = .*;/, 'const cosM = Math.cos(t);'),
  },
  {
    name: 'an error is thrown',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('if (t > 7199) throw t;'),
  },
  {
    name: 'a rounding to float32 is missing',
    folder: 'drift-buoy',
    by: 'inspection',
    spoil: replace(/const cosM = fround\((.*)\);/, 'const cosM = $1;'),
  },
  {
    name: 'two operations share one rounding',
    folder: 'drift-buoy',
    by: 'inspection',
    spoil: replace(/const cosM = fround\((.*)\);/, 'const cosM = fround($1 + 1);'),
  },
  {
    name: 'a name of the function is used again inside a block',
    folder: 'tide-gauge',
    by: 'inspection',
    spoil: insert('if (t > 0) { const cosM = 1; out[0] = cosM; }'),
  },
  {
    name: 'a line is computed twice',
    folder: 'tide-gauge',
    by: 'counts',
    spoil: insert('const extra = t * t;'),
  },
  { name: 'one correction more than the cap', folder: 'tide-gauge', by: 'counts', spoil: oneCorrectionMore },
  {
    name: 'a range check is gone',
    folder: 'tide-gauge',
    by: 'counts',
    spoil: replace(/ {2}if \(!\(e >= .*\n/, ''),
  },
  {
    name: 'an output is not written',
    folder: 'tide-gauge',
    by: 'counts',
    spoil: replace(/ {2}out\[2\] = .*\n/, ''),
  },
  {
    name: 'one correction less than the cap',
    folder: 'tide-gauge',
    by: 'observed',
    spoil: skipLastCorrection,
  },
  { name: 'sine and cosine are swapped', folder: 'tide-gauge', by: 'observed', spoil: swapTurn },
  {
    name: 'a sign is wrong',
    folder: 'tide-gauge',
    by: 'observed',
    spoil: replace(/const cosM = (\w+) - (\w+);/, 'const cosM = $1 + $2;'),
  },
  {
    name: 'a coefficient loses its last digits',
    folder: 'tide-gauge',
    by: 'observed',
    spoil: (code) => code.replaceAll('0.041666666666666664', '0.04166666'),
  },
  {
    name: "the rate of the Earth is the sidereal day's of another system",
    folder: 'tide-gauge',
    by: 'observed',
    spoil: (code) => code.replaceAll('0.000072921151467', '0.00007292115'),
  },
  {
    name: 'two outputs are exchanged',
    folder: 'tide-gauge',
    by: 'observed',
    spoil: (code) =>
      code
        .replace('  out[0] =', '  out[9] =')
        .replace('  out[1] =', '  out[0] =')
        .replace('  out[9] =', '  out[1] ='),
  },
  {
    name: 'two words of the state are exchanged',
    folder: 'tide-gauge',
    by: 'observed',
    spoil: (code) => code.replace('  const e = state[3];', '  const e = state[8];'),
  },
  {
    name: 'a harmonic correction is left out',
    folder: 'drift-buoy',
    by: 'observed',
    spoil: (code) => code.replace(/const v(\d+) = fround\(Crs32 \* (\w+)\);/, 'const v$1 = fround(0 * $2);'),
  },
];

/** Exchanges the words of the state that hold the sine and cosine of the argument of perigee. */
function swapTurn(code: string): string {
  const [sine, cosine] = ['sinomega', 'cosomega'].map(
    (name) => new RegExp(`const ${name} = state\\[(\\d+)\\]`).exec(code)![1]!,
  );
  return code
    .replace(`sinomega = state[${sine}]`, `sinomega = state[${cosine}]`)
    .replace(`cosomega = state[${cosine}]`, `cosomega = state[${sine}]`);
}

/** Repeats the last division and its subtraction once more. */
function oneCorrectionMore(code: string): string {
  const last = [
    ...code.matchAll(/ {2}const (v\d+) = v\d+ \/ v\d+;.*\n {2}const (v\d+) = v\d+ - v\d+;.*\n/g),
  ].at(-1)!;
  return code.replace(
    last[0],
    `${last[0]}  const again = ${last[1]} / ${last[1]};\n  const more = ${last[2]} - again;\n`,
  );
}

/** Makes the last division of the solver give nothing: the correction is computed and lost. */
function skipLastCorrection(code: string): string {
  const lines = code.split('\n');
  const divisions = lines.flatMap((line, index) =>
    /^ {2}const v\d+ = v\d+ \/ v\d+;/.test(line) ? [index] : [],
  );
  const last = divisions.at(-1)!;
  lines[last] = lines[last]!.replace(/ = (v\d+) \/ (v\d+);/, ' = ($1 - $1) / $2;');
  return lines.join('\n');
}

const read = (folder: string, name: string) =>
  readFileSync(fileURLToPath(new URL(`../../generated/${folder}/${name}`, import.meta.url)), 'utf8');

async function caughtBy(folder: string, code: string): Promise<readonly Catch[]> {
  const certificate = JSON.parse(read(folder, 'certificate.json')) as Certificate;
  const inspection = inspectSource('kernel.js', code, {
    float32: folder === 'drift-buoy' ? ['position'] : [],
  });
  if (inspection.findings.length > 0) return ['inspection'];
  const counts = ['setup', 'position'].some((name) => {
    const { operations } = inspection.functions.find((entry) => entry.name === name)!;
    if (operations === null) return true;
    const stated = certificate.operations[name === 'setup' ? 'setup' : 'tick'];
    return (
      operations.total !== stated.total ||
      operations.store !== stated.store ||
      operations.load !== stated.load ||
      operations.round !== stated.round
    );
  });
  const task = taskOf(
    { model: certificate.model, domain: certificate.domain.name, error: { position_m: 1 } },
    'budget',
  );
  const judge = new Judge(task.formula, await importKernel(code), task.model.frameRate);
  const [seen] = observe(
    judge,
    makeVariant(task, certificate.choices).kernel,
    task.domain,
    task.formula.inputs.map((input) => input.name),
    { points: 3000, places: 0, draws: 0, pool: 1, steps: 0, seed: 41 },
  );
  return [
    ...(counts ? ['counts' as const] : []),
    ...(seen!.size > certificate.error.position_m!.observed ? ['observed' as const] : []),
  ];
}

describe('seeded faults are caught', () => {
  test.each(CASES)('$name ($by)', async ({ folder, by, spoil }) => {
    const code = read(folder, 'kernel.js');
    const spoiled = spoil(code);
    expect(spoiled).not.toBe(code);
    expect(await caughtBy(folder, spoiled)).toContain(by);
  });

  test.each(['tide-gauge', 'drift-buoy'])('the kernel of %s itself is clean', async (folder) => {
    expect(await caughtBy(folder, read(folder, 'kernel.js'))).toEqual([]);
  });
});
