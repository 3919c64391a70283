import { dirname } from 'node:path';
import type { Certificate } from '../certificate/certificate.ts';
import { FILES, variantFiles } from '../certificate/files.ts';
import { readBudget } from '../choose/budget.ts';
import { choose, type Excess, type Trial, variantName } from '../choose/choose.ts';
import { taskOf } from '../choose/task.ts';
import { writeTogether } from '../files/write.ts';
import { parseArguments, usageError } from './arguments.ts';
import type { Command } from './command.ts';
import { ProgressLine } from './progress.ts';
import { formatTable } from './table.ts';

const help = `bound-orbit generate generated/tide-gauge/budget.json

Finds the cheapest variant that fits the budget and writes kernel.js, kernel.d.ts, certificate.json and worst.json.
Nothing is written when none fits: the limits that bind are named and the exit code is 1.

  --output FOLDER  where to write; the budget's own folder when not given
  --json           the certificate, or the trials when none fits, as JSON
`;

/** The command that generates a kernel within a budget. */
export const generate: Command = {
  help,
  async run(args) {
    const { values, positionals } = parseArguments('generate', args, {
      output: { type: 'string' },
      json: { type: 'boolean' },
    });
    const [file, ...more] = positionals;
    if (file === undefined || more.length > 0) throw usageError('generate', 'one budget file is needed');
    const budget = readBudget(file);
    const task = taskOf(budget, file);
    const progress = new ProgressLine();
    const trials = await choose(task, budget, progress.show);
    progress.end();
    const last = trials.at(-1)!;
    if (last.excesses.length > 0) {
      process.stdout.write(
        values.json ? `${JSON.stringify({ trials: trials.map(summary) }, null, 2)}\n` : formatTrials(trials),
      );
      process.stderr.write(`${file}: budget.no-fit: no variant fits the budget\n    ${nearest(trials)}\n`);
      return 1;
    }
    const folder = values.output ?? dirname(file);
    const files = await variantFiles(task, budget, last);
    writeTogether(folder, files);
    process.stdout.write(values.json ? files.get(FILES.certificate)! : formatTrials(trials));
    if (!values.json)
      process.stdout.write(
        `\n${describe(JSON.parse(files.get(FILES.certificate)!) as Certificate, folder)}\n`,
      );
    return 0;
  },
};

/** The trials as a table: what each costs, and which limit it breaks. */
export function formatTrials(trials: readonly Trial[]): string {
  return formatTable(
    [
      'variant',
      'operations/tick',
      'operations/setup',
      'state bytes',
      'error observed',
      'error certified',
      'proof',
      'verdict',
    ],
    trials.map(({ choices, variant, observed, proofs, excesses, seconds }) => [
      variantName(choices),
      variant.cost.tick.total,
      variant.cost.setup.total,
      variant.stateBytes,
      observed.map((entry) => `${entry.group} ${entry.size.toExponential(2)}`).join(', '),
      proofs.map((entry) => `${entry.group} ${entry.bound.toExponential(2)}`).join(', '),
      proofs.length === 0
        ? ''
        : `${proofs.reduce((sum, { boxes }) => sum + boxes, 0)} boxes, ${seconds.toFixed(1)} s`,
      excesses.length === 0 ? 'fits' : excesses.map(formatExcess).join('; '),
    ]),
  );
}

function formatExcess({ limit, allowed, found }: Excess): string {
  return `${limit} ${Number(found.toPrecision(3))} > ${allowed}`;
}

function summary({ choices, variant, observed, excesses }: Trial): unknown {
  return { choices, operations: variant.cost, state_bytes: variant.stateBytes, observed, excesses };
}

/** The trial whose worst excess is the smallest, and what would make it fit. */
function nearest(trials: readonly Trial[]): string {
  const factor = (trial: Trial) => Math.max(...trial.excesses.map(({ found, allowed }) => found / allowed));
  const best = trials.reduce((a, b) => (factor(b) < factor(a) ? b : a));
  return `Nearest is ${variantName(best.choices)}; it would fit with ${best.excesses.map(({ limit, found }) => `${limit} at ${Number(found.toPrecision(3))}`).join(' and ')}.`;
}

function describe(certificate: Certificate, folder: string): string {
  const errors = Object.entries(certificate.error).map(
    ([key, entry]) =>
      `${key} certified ${entry.certified.toExponential(2)} in ${entry.boxes} boxes, observed ${entry.observed.toExponential(2)}`,
  );
  return `written to ${folder}: ${certificate.code.bytes} bytes of code (${certificate.code.minified_bytes} minified); error ${errors.join(', ')}`;
}
