import { type Filled, type Form, fitLine, isFilled, type Misfit } from './forms.ts';
import type { Mark } from './parsed.ts';
import { type RefusalCode, refuse } from './refusal.ts';
import { type Token, tokensOf } from './tokens.ts';

/** A line that was taken from a file: where it stands and what fills the holes of its form. */
export interface Taken extends Mark {
  readonly filled: Filled;
}

/** The lines of a file that hold more than comments, taken one after the other. */
export class Lines {
  readonly file: string;
  private readonly lines: readonly (readonly Token[])[];
  private next = 0;

  /**
   * @param file its name, for messages
   * @param text its text
   */
  constructor(file: string, text: string) {
    this.file = file;
    const lines: Token[][] = [];
    for (const token of tokensOf(text)) {
      const last = lines.at(-1);
      if (last?.[0]?.line === token.line) last.push(token);
      else lines.push([token]);
    }
    this.lines = lines;
  }

  /** Takes the next line if it fits the form. */
  take(form: Form): Taken | undefined {
    const tokens = this.lines[this.next];
    if (tokens === undefined) return undefined;
    const filled = fitLine(form, tokens);
    if (!isFilled(filled)) return undefined;
    this.next++;
    const { line, column } = tokens[0]!;
    return { filled, line, column };
  }

  /**
   * Takes the next line, which must fit the form.
   *
   * @param others further forms that could stand here, for the message
   * @throws InputError with the first token that fits none of the forms
   */
  demand(form: Form, code: RefusalCode, others: readonly Form[] = []): Taken {
    return this.take(form) ?? this.misfit(code, [form, ...others]);
  }

  /** Makes sure that nothing is left. */
  end(): void {
    const rest = this.lines[this.next];
    if (rest !== undefined) this.refuse('parse.form', rest[0]!, `${quote(rest[0]!)} stands behind the end`);
  }

  refuse(code: RefusalCode, mark: Mark, what: string): never {
    return refuse(code, this.file, mark, what);
  }

  private misfit(code: RefusalCode, forms: readonly Form[]): never {
    const tokens = this.lines[this.next] ?? [];
    const misfits = forms
      .map((form) => fitLine(form, tokens))
      .filter((result): result is Misfit => !isFilled(result));
    const at = Math.max(...misfits.map((misfit) => misfit.at));
    const due = [...new Set(misfits.filter((misfit) => misfit.at === at).map((misfit) => misfit.due))];
    const token = tokens[at];
    const what = token === undefined ? 'nothing stands' : `${quote(token)} stands`;
    return this.refuse(code, token ?? this.behind(tokens), `${what} where ${due.join(' or ')} is due`);
  }

  /** The place behind a line, or behind the last one. */
  private behind(tokens: readonly Token[]): Mark {
    const last = tokens.at(-1) ?? this.lines.at(-1)?.at(-1);
    return last === undefined
      ? { line: 1, column: 1 }
      : { line: last.line, column: last.column + last.text.length };
  }
}

function quote(token: Token): string {
  return token.text.length > 40 ? `"${token.text.slice(0, 40)}..."` : `"${token.text}"`;
}
