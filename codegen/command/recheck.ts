import { type Finding, formatFinding } from '../../src/finding.ts';
import { recheck as recheckFolder } from '../certificate/recheck.ts';
import { parseArguments, usageError } from './arguments.ts';
import type { Command } from './command.ts';
import { ProgressLine } from './progress.ts';

const help = `bound-orbit recheck generated/tide-gauge

Reads the emitted file back, compares it with the model lowered again, proves the error of the lines that stand in the
file, and compares bounds, counts, sizes, digests and worst inputs with the certificate.
Exit code 1 when anything differs.

  --json  the findings as JSON
`;

/** The command that checks the folders of variants from scratch. */
export const recheck: Command = {
  help,
  async run(args) {
    const { values, positionals } = parseArguments('recheck', args, { json: { type: 'boolean' } });
    if (positionals.length === 0) throw usageError('recheck', 'at least one folder is needed');
    const progress = new ProgressLine();
    const results: { folder: string; findings: readonly Finding[] }[] = [];
    for (const folder of positionals) {
      const start = performance.now();
      const { findings, proofs } = await recheckFolder(folder, (share) => progress.show(folder, share));
      progress.end();
      results.push({ folder, findings });
      if (values.json) continue;
      const seconds = (performance.now() - start) / 1000;
      const proven = proofs.map(
        ({ group, bound, boxes }) => `${group} certified ${bound.toExponential(2)} in ${boxes} boxes`,
      );
      for (const finding of findings) process.stdout.write(`${formatFinding(finding)}\n`);
      const verdict = findings.length === 0 ? 'as certified' : 'not as certified';
      process.stdout.write(`${[`${folder}: ${verdict}`, ...proven].join('; ')}; ${seconds.toFixed(1)} s\n`);
    }
    if (values.json) process.stdout.write(`${JSON.stringify({ folders: results }, null, 2)}\n`);
    return results.some(({ findings }) => findings.length > 0) ? 1 : 0;
  },
};
