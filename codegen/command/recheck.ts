import { formatFinding } from '../../src/finding.ts';
import { recheck as recheckFolder } from '../certificate/recheck.ts';
import { parseArguments, usageError } from './arguments.ts';
import type { Command } from './command.ts';

const help = `bound-orbit recheck generated/tide-gauge

Lowers the model again and compares code, counts, sizes, digests and worst inputs with what stands in the folder.
Exit code 1 when anything differs.

  --json  the findings as JSON
`;

/** The command that checks the folders of variants from scratch. */
export const recheck: Command = {
  help,
  async run(args) {
    const { values, positionals } = parseArguments('recheck', args, { json: { type: 'boolean' } });
    if (positionals.length === 0) throw usageError('recheck', 'at least one folder is needed');
    const results: { folder: string; findings: Awaited<ReturnType<typeof recheckFolder>> }[] = [];
    for (const folder of positionals) results.push({ folder, findings: await recheckFolder(folder) });
    if (values.json) {
      process.stdout.write(`${JSON.stringify({ folders: results }, null, 2)}\n`);
    } else {
      for (const { folder, findings } of results) {
        process.stdout.write(
          findings.length === 0 ? `${folder}: as certified\n` : `${findings.map(formatFinding).join('\n')}\n`,
        );
      }
    }
    return results.some(({ findings }) => findings.length > 0) ? 1 : 0;
  },
};
