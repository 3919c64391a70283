import { readFileSync, statSync } from 'node:fs';
import { Project, ts } from 'ts-morph';
import { type Finding, InputError } from '../../src/finding.ts';

/** Files above this size are refused: 4 MiB, far more than any source that people or tools should read. */
const largestFile = 4 * 1024 * 1024;

/** The endings of TypeScript and JavaScript files, with the ending to parse them under. */
const ending = /\.[cm]?[jt]sx?$/;

/** A parsed file with a checker that knows this file alone: no library, no imports. */
export interface ParsedSource {
  /** The file's name as the caller gave it. */
  readonly file: string;
  readonly source: ts.SourceFile;
  readonly checker: ts.TypeChecker;
}

/**
 * Reads a TypeScript or JavaScript file as text.
 *
 * @throws InputError when the file is missing, cannot be read, is above 4 MiB or is not UTF-8 text
 */
export function readSource(path: string): string {
  let bytes: Buffer;
  try {
    const size = statSync(path).size;
    if (size > largestFile) throw hugeFile(path, size);
    bytes = readFileSync(path);
  } catch (error) {
    if (error instanceof InputError) throw error;
    throw unreadableFile(path, error);
  }
  if (bytes.includes(0)) throw binaryFile(path, 'it holds zero bytes');
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    throw binaryFile(path, 'its bytes are not UTF-8');
  }
}

/**
 * Parses a TypeScript or JavaScript text.
 *
 * @param file name for messages; its ending says which language and which module form the text has
 * @throws InputError when the ending is another one, or for syntax errors, each with its place
 */
export function parseSource(file: string, text: string): ParsedSource {
  const extension = ending.exec(file)?.[0];
  if (extension === undefined) throw otherLanguage(file);
  const project = new Project({
    useInMemoryFileSystem: true,
    skipLoadingLibFiles: true,
    compilerOptions: {
      target: ts.ScriptTarget.ESNext,
      module: ts.ModuleKind.ESNext,
      moduleResolution: ts.ModuleResolutionKind.Bundler,
      jsx: ts.JsxEmit.Preserve,
      allowJs: true,
      noLib: true,
      noResolve: true,
      types: [],
    },
  });
  const source = project.createSourceFile(`/inspected${extension}`, text).compilerNode;
  const program = project.getProgram().compilerObject;
  const errors = program.getSyntacticDiagnostics(source);
  if (errors.length > 0) throw new InputError(...errors.map((error) => syntaxError(file, source, error)));
  return { file, source, checker: program.getTypeChecker() };
}

function syntaxError(file: string, source: ts.SourceFile, error: ts.Diagnostic): Finding {
  const position = source.getLineAndCharacterOfPosition(error.start ?? 0);
  return {
    code: 'inspect.syntax',
    place: { file, line: position.line + 1, column: position.character + 1 },
    what: ts.flattenDiagnosticMessageText(error.messageText, ' '),
    why: 'A file that does not parse cannot be inspected.',
    remedy: 'Mend the syntax at this place.',
  };
}

function otherLanguage(file: string): InputError {
  return refusal({
    code: 'inspect.language',
    place: { file },
    what: 'the name does not end in .ts, .js, .mts, .mjs, .cts, .cjs, .tsx or .jsx',
    why: 'The ending decides how the text is parsed.',
    remedy: 'Give a TypeScript or JavaScript file.',
  });
}

function unreadableFile(path: string, error: unknown): InputError {
  const system = error as NodeJS.ErrnoException;
  const missing = system.code === 'ENOENT' || system.code === 'ENOTDIR';
  return refusal({
    code: missing ? 'inspect.missing-file' : 'inspect.unreadable-file',
    place: { file: path },
    what: missing ? 'there is no such file' : `the file cannot be read (${system.code ?? system.message})`,
    why: 'Inspection needs the text of the file.',
    remedy: missing ? 'Check the path.' : 'Give a regular file that you may read.',
  });
}

function hugeFile(path: string, size: number): InputError {
  return refusal({
    code: 'inspect.huge-file',
    place: { file: path },
    what: `the file has ${size} bytes, more than ${largestFile}`,
    why: 'The syntax tree of such a file takes gigabytes.',
    remedy: 'Inspect the sources it was bundled from, or split it.',
  });
}

function binaryFile(path: string, sign: string): InputError {
  return refusal({
    code: 'inspect.binary-file',
    place: { file: path },
    what: `the file is not text: ${sign}`,
    why: 'Only UTF-8 source text can be parsed.',
    remedy: 'Give a TypeScript or JavaScript source file in UTF-8.',
  });
}

/**
 * The refusal of a text whose nesting outgrows the stack, at parsing or later.
 *
 * @param file name for messages
 */
export function nestingError(file: string): InputError {
  return refusal({
    code: 'inspect.nesting',
    place: { file },
    what: 'expressions or statements are nested too deep to be followed',
    why: 'The tree is walked recursively and the stack ran out.',
    remedy: 'Name intermediate results, so that no expression has thousands of levels.',
  });
}

function refusal(finding: Finding): InputError {
  return new InputError(finding);
}
