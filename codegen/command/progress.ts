/** A line of progress on a terminal; nothing when stderr is no terminal. */
export class ProgressLine {
  private shown = '';

  /** Shows what is being done and the share of it, from 0 to 1. */
  readonly show = (what: string, share: number): void => {
    if (!process.stderr.isTTY) return;
    const text = `${what} ${Math.floor(share * 100)} %`;
    if (text === this.shown) return;
    this.shown = text;
    process.stderr.write(`\r\x1b[K${text}`);
  };

  /** Clears the line. */
  end(): void {
    if (this.shown !== '') process.stderr.write('\r\x1b[K');
    this.shown = '';
  }
}
