import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Certificate } from '../codegen/certificate/certificate.ts';
import { readBudget } from '../codegen/choose/budget.ts';
import { variantName } from '../codegen/choose/choose.ts';
import { taskOf } from '../codegen/choose/task.ts';
import { judgeOf, makeVariant, type Task, type Variant } from '../codegen/choose/variant.ts';
import { ProgressLine } from '../codegen/command/progress.ts';
import { formatTable } from '../codegen/command/table.ts';
import { FULL_EFFORT, type Observed, observe } from '../codegen/observe/observe.ts';
import type { Point } from '../codegen/observe/points.ts';
import type { NavigationRecord } from '../src/messages/navigation-record.ts';
import { readRinexNavigation } from '../src/messages/rinex/read.ts';

const BUDGET = fileURLToPath(new URL('../generated/tide-gauge/budget.json', import.meta.url));
const NAVIGATION = fileURLToPath(
  new URL('../test/vectors/BRDC00IGS_R_20220010000_01D_GN.trim.rnx', import.meta.url),
);

/** Time step over each record's span, s. */
const STEP = 300;

/** Committed variants of the same model that are run beside it; their certificates hold the proven bounds. */
const FOLDERS = ['tide-gauge', 'drift-buoy', 'ice-tag'];

function certificateOf(folder: string): Certificate {
  return JSON.parse(
    readFileSync(new URL(`../generated/${folder}/certificate.json`, import.meta.url), 'utf8'),
  ) as Certificate;
}

/** Largest error of a variant on real records, over the two hours on each side of every reference time. */
async function runOnRecords(
  task: Task,
  variant: Variant,
  records: readonly NavigationRecord[],
): Promise<{ runs: number; size: number }> {
  const judge = await judgeOf(task, variant);
  let runs = 0;
  let size = 0;
  for (const { elements } of records) {
    for (let t = task.domain['t']!.min; t <= task.domain['t']!.max; t += STEP, runs++) {
      size = Math.max(size, judge.errors({ ...elements, t }).get('position')!.size);
    }
  }
  return { runs, size };
}

/** Where the largest error was seen, in a few words. */
function place(at: Point): string {
  return ['e', 'M0', 'omega', 't'].map((name) => `${name} = ${Number(at[name]!.toPrecision(4))}`).join(', ');
}

async function main(): Promise<void> {
  const budget = readBudget(BUDGET);
  const task = taskOf(budget, BUDGET);
  const records: NavigationRecord[] = [];
  for await (const record of readRinexNavigation(NAVIGATION)) records.push(record);
  const healthy = records.filter((record) => record.health === 0);
  const satellites = new Set(healthy.map((record) => record.satellite));
  process.stdout.write(`A tide gauge on the Skerry coast: ${task.model.title}.\n`);
  process.stdout.write(
    `${healthy.length} healthy records of ${satellites.size} satellites, IGS merged broadcast ephemeris of 2022-01-01.\n`,
  );
  process.stdout.write(
    `Domain ${task.domainName}; errors against the model in 30-digit arithmetic; certified as in generated/.\n\n`,
  );
  const progress = new ProgressLine();
  const rows: (string | number)[][] = [];
  for (const certificate of FOLDERS.map(certificateOf)) {
    const { choices } = certificate;
    const variant = makeVariant(task, choices);
    const real = await runOnRecords(task, variant, healthy);
    const names = task.formula.inputs.map((input) => input.name);
    const [worst] = observe(
      await judgeOf(task, variant),
      variant.kernel,
      task.domain,
      names,
      FULL_EFFORT,
      (share) => progress.show(variantName(choices), share),
    ) as [Observed];
    const { bytes, minified_bytes } = certificate.code;
    rows.push([
      variantName(choices),
      variant.cost.tick.total,
      variant.cost.setup.total,
      `${variant.kernel.state.length} (${variant.stateBytes} bytes)`,
      `${bytes} (${minified_bytes} minified)`,
      real.size.toExponential(2),
      worst.size.toExponential(2),
      certificate.error.position_m!.certified.toExponential(2),
      place(worst.at),
    ]);
    progress.end();
  }
  process.stdout.write(
    formatTable(
      [
        'variant',
        'operations/tick',
        'operations/setup',
        'state words',
        'code bytes',
        'real records, m',
        'largest observed, m',
        'certified, m',
        'where the largest error is',
      ],
      rows,
    ),
  );
}

await main();
