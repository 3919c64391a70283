import { existsSync } from 'node:fs';
import { Project, type SourceFile, ts } from 'ts-morph';
import { InputError } from '../../src/finding.ts';
import { finding } from './refusal.ts';

/**
 * Opens a TypeScript file for reading. No libraries are loaded: the reader needs syntax and imports, not types.
 *
 * @param path path of the file
 * @param text its text, when it does not stand on disk
 * @throws InputError with code read.missing-file or read.syntax
 */
export function openSource(path: string, text?: string): SourceFile {
  if (text === undefined && !existsSync(path)) {
    throw new InputError(finding('read.missing-file', { file: path }, 'there is no such file'));
  }
  const project = new Project({
    skipAddingFilesFromTsConfig: true,
    skipLoadingLibFiles: true,
    compilerOptions: {
      target: ts.ScriptTarget.ESNext,
      module: ts.ModuleKind.ESNext,
      moduleResolution: ts.ModuleResolutionKind.Bundler,
      allowImportingTsExtensions: true,
      noLib: true,
      types: [],
    },
  });
  const source =
    text === undefined ? project.addSourceFileAtPath(path) : project.createSourceFile(path, text);
  const [fault] = project.getProgram().getSyntacticDiagnostics(source);
  if (fault !== undefined) {
    const { line, column } = source.getLineAndColumnAtPos(fault.getStart());
    const message = ts.flattenDiagnosticMessageText(fault.compilerObject.messageText, ' ');
    throw new InputError(finding('read.syntax', { file: source.getBaseName(), line, column }, message));
  }
  return source;
}
