/** A command of the command line. */
export interface Command {
  /** Help text; it starts with an example and ends with a newline. */
  readonly help: string;
  /**
   * Runs the command. Data goes to stdout, diagnostics to stderr.
   *
   * @param args the words after the command's name
   * @returns exit code: 0 good, 1 a finding
   * @throws InputError for wrong use or input (exit code 2)
   */
  run(args: readonly string[]): Promise<0 | 1>;
}
