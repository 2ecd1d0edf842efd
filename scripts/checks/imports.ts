import { lineOf, parseSource, type SourceFile } from './source-files.ts';

export interface Import {
  /** As written, without a query such as `?worker`. */
  readonly specifier: string;
  readonly line: number;
}

/**
 * Every module a file imports: static, re-exported, type-only, dynamic, and workers
 * named by `new URL('...', import.meta.url)`.
 */
export function importsOf(file: SourceFile): Import[] {
  const { module } = parseSource(file);
  const requests = [
    ...module.staticImports.map((one) => one.moduleRequest),
    ...module.staticExports.flatMap((one) => one.entries.map((entry) => entry.moduleRequest)),
    ...module.dynamicImports.map((one) => one.moduleRequest),
  ].filter((request) => request != null);
  const written = requests.map(({ start, end }) => ({
    specifier: unquote(file.text.slice(start, end)),
    line: lineOf(file.text, start),
  }));
  return distinct([...written, ...urlsOf(file)]);
}

/** Of a module, such as a worker's; a folder or a data file is no import. */
const URL_OF_MODULE = /new URL\(\s*['"`]([^'"`]+\.[mc]?[jt]sx?)['"`]\s*,\s*import\.meta\.url/g;

function urlsOf(file: SourceFile): Import[] {
  return [...file.text.matchAll(URL_OF_MODULE)].map((match) => ({
    specifier: unquote(match[1] ?? ''),
    line: lineOf(file.text, match.index),
  }));
}

function unquote(specifier: string): string {
  return specifier.replace(/^['"`]|['"`]$/g, '').replace(/\?.*$/, '');
}

function distinct(imports: readonly Import[]): Import[] {
  const seen = new Map(imports.map((one) => [`${one.specifier} ${one.line}`, one]));
  return [...seen.values()].sort((a, b) => a.line - b.line);
}
