#!/usr/bin/env node
import { styleText } from 'node:util';
import { formatFinding, InputError } from '../../src/finding.ts';
import type { Command } from './command.ts';

/** Commands are loaded when they are called, so that help is instant. */
const commands: Readonly<Record<string, { purpose: string; load: () => Promise<Command> }>> = {
  generate: {
    purpose: 'the cheapest kernel that fits a budget, with its certificate',
    load: async () => (await import('./generate.ts')).generate,
  },
  recheck: {
    purpose: 'a kernel and its certificate checked from scratch',
    load: async () => (await import('./recheck.ts')).recheck,
  },
  evaluate: {
    purpose: 'reference positions from a navigation file',
    load: async () => (await import('./evaluate.ts')).evaluate,
  },
  inspect: {
    purpose: 'static analysis of an emitted or hand-written file',
    load: async () => (await import('./inspect.ts')).inspect,
  },
};

function overview(): string {
  const width = Math.max(...Object.keys(commands).map((name) => name.length));
  const rows = Object.entries(commands).map(([name, entry]) => `  ${name.padEnd(width)}  ${entry.purpose}`);
  return [
    'bound-orbit evaluate station.rnx --at 2022-01-01T06:00:00',
    '',
    'Satellite prediction of fixed cost and known error for JavaScript on microcontrollers.',
    '',
    ...rows,
    '',
    'bound-orbit COMMAND --help tells more. Exit codes: 0 good, 1 a finding, 2 wrong use or input, 3 internal fault.',
    '',
  ].join('\n');
}

async function main(args: readonly string[]): Promise<number> {
  const [name, ...rest] = args;
  if (name === undefined || name === '--help' || name === '-h') {
    process.stdout.write(overview());
    return name === undefined ? 2 : 0;
  }
  const entry = Object.hasOwn(commands, name) ? commands[name] : undefined;
  if (entry === undefined) {
    throw new InputError({
      code: 'command.unknown',
      place: { file: 'command line' },
      what: `there is no command "${name}"`,
      why: `The commands are ${Object.keys(commands).join(', ')}.`,
      remedy: 'Run bound-orbit --help.',
    });
  }
  const command = await entry.load();
  if (rest.includes('--help') || rest.includes('-h')) {
    process.stdout.write(command.help);
    return 0;
  }
  return command.run(rest);
}

/** Prints an error as the exit code it stands for. */
function fail(error: unknown): number {
  if (error instanceof InputError) {
    for (const finding of error.findings) process.stderr.write(`${formatFinding(finding)}\n`);
    return 2;
  }
  const text = error instanceof Error ? (error.stack ?? error.message) : String(error);
  process.stderr.write(`${styleText('red', 'internal fault', { stream: process.stderr })}: ${text}\n`);
  return 3;
}

process.stdout.on('error', (error: NodeJS.ErrnoException) => {
  if (error.code === 'EPIPE') process.exit(0);
  throw error;
});
process.exitCode = await main(process.argv.slice(2)).catch(fail);
