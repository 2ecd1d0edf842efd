import type { Issue, IssueParams, Path } from '../model/issue.ts';
import { ISSUE_WORDS } from './issue-words.ts';

/** Longest param or key that is written out. */
const LONGEST = 200;

/**
 * One line for the command line: severity, code, place, words. A code without words
 * (of an engine newer than the table) stands alone with its params. Text from the
 * document is shortened and freed of control characters, which a terminal would obey.
 */
export function wordsOf({ code, severity, path, params, at }: Issue): string {
  const place = path.length > 0 ? ` at ${placeOf(path)}` : '';
  const span = at ? `, characters ${at.start + 1} to ${Math.max(at.start + 1, at.end)}` : '';
  return `${severity} ${code}${place}${span}: ${sentence(code, params)}`;
}

function sentence(code: string, params: IssueParams): string {
  const template = Object.hasOwn(ISSUE_WORDS, code) ? ISSUE_WORDS[code] : undefined;
  if (template === undefined) return safe(JSON.stringify(params));
  const whole = template.replace(/\[([^\]]*)\]/g, (_, part: string) =>
    names(part).every((name) => params[name] !== undefined) ? part : '',
  );
  return whole.replace(/\{(\w+)\}/g, (_, name: string) => safe(String(params[name] ?? '?')));
}

function names(part: string): string[] {
  return Array.from(part.matchAll(/\{(\w+)\}/g), ([, name]) => name!);
}

function placeOf(path: Path): string {
  return path.map((key) => safe(String(key))).join('.');
}

function safe(text: string): string {
  const short = text.length > LONGEST ? `${text.slice(0, LONGEST)}…` : text;
  return short.replace(/[\p{Cc}\p{Bidi_Control}\u2028\u2029]/gu, '\uFFFD');
}
