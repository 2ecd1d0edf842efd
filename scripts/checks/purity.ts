import { Visitor } from 'oxc-parser';
import { type Finding, lineOf, parseSource, type SourceFile } from './source-files.ts';

/** Chance and time are parameters in shared/; the command line may read the clock. */
const CHANCE_AND_TIME = new Set(['Math.random', 'Date.now', 'performance.now']);

/**
 * Text run as code anywhere in the product (the page's policy forbids it), and chance
 * or the clock read in shared/.
 */
export function purityFindings(file: SourceFile): Finding[] {
  const found: Finding[] = [];
  const pure = file.path.startsWith('shared/') && !file.path.startsWith('shared/cli/');
  const text = (node: { start: number; end: number }) => file.text.slice(node.start, node.end);
  const add = (code: string, detail: string, start: number) =>
    found.push({ code, path: file.path, line: lineOf(file.text, start), detail });
  const call = (callee: string, args: number, start: number) => {
    if (callee === 'eval' || callee === 'Function') add('purity.code', callee, start);
    if (pure && callee === 'Date' && args === 0) add('purity.clock', 'Date()', start);
  };
  new Visitor({
    MemberExpression(node) {
      const name = text(node).replace(/\s/g, '');
      if (pure && CHANCE_AND_TIME.has(name)) add('purity.clock', name, node.start);
    },
    CallExpression(node) {
      call(text(node.callee), node.arguments.length, node.start);
    },
    NewExpression(node) {
      call(text(node.callee), node.arguments.length, node.start);
    },
  }).visit(parseSource(file).program);
  return found;
}
