import type { Finding, SourceFile } from './source-files.ts';
import { parseSource } from './source-files.ts';

/** A barrel: a file that only hands on what other files export. */
export function barrelFindings(file: SourceFile): Finding[] {
  const { body } = parseSource(file).program;
  const handsOn = body.filter(
    (one) =>
      one.type === 'ExportAllDeclaration' ||
      (one.type === 'ExportNamedDeclaration' && one.declaration == null),
  );
  const imports = body.filter((one) => one.type === 'ImportDeclaration');
  if (handsOn.length === 0 || handsOn.length + imports.length < body.length) return [];
  return [{ code: 'barrel', path: file.path, line: 1, detail: 'only re-exports' }];
}
