import { type ParseArgsConfig, parseArgs } from 'node:util';
import { InputError } from '../../src/finding.ts';

type Options = NonNullable<ParseArgsConfig['options']>;

/**
 * Parses a command's words with util.parseArgs and turns its complaints into findings.
 *
 * @param command name of the command, for messages
 * @param args words after the command's name
 * @param options options as util.parseArgs takes them; every command also knows --json
 * @throws InputError with code command.usage
 */
export function parseArguments<const O extends Options>(
  command: string,
  args: readonly string[],
  options: O,
): ReturnType<typeof parseArgs<{ options: O; allowPositionals: true; strict: true }>> {
  try {
    return parseArgs({ args: [...args], options, allowPositionals: true, strict: true });
  } catch (error) {
    throw usageError(command, error instanceof Error ? error.message : String(error));
  }
}

/** A finding for words that the command cannot use. */
export function usageError(command: string, what: string): InputError {
  return new InputError({
    code: 'command.usage',
    place: { file: 'command line' },
    what,
    why: `The command is called as its help shows.`,
    remedy: `Run bound-orbit ${command} --help.`,
  });
}
