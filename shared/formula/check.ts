/**
 * Everything that can be said about a document's formulas without running it: they
 * parse, their names are known, their definitions run in no circle, and their kinds
 * fit each other and the place they stand in.
 */
import type { ModelDocument } from '../model/document.ts';
import { error, hasErrors, type Issue } from '../model/issue.ts';
import { type Definition, definitionsIn, type FormulaText, textsOf } from './definitions.ts';
import type { Expr } from './expr.ts';
import { inferKind } from './kinds.ts';
import { checkNames, namesIn, placeOf } from './names.ts';
import { type Budget, orderForAll, orderVariables } from './order.ts';
import { parseFormula } from './parse.ts';
import { checkPlace, type Setting } from './places.ts';
import { checkValues } from './ranges.ts';
import { buildScope, type Scope } from './scope.ts';
import { formulaSites, type Site } from './sites.ts';
import { checkUnused } from './unused.ts';
import { type VariableFacts, variableFacts } from './variable-facts.ts';

/** Issues reported of one document; errors come before warnings where there are more. */
const MOST_ISSUES = 1_000;
/** Characters of all formulas of a document together. */
const MOST_TEXT = 1_000_000;
/** Names followed in search of circles, over all strategies and scenarios. */
const MOST_STEPS = 10_000_000;

/** Collects issues; the same mistake is said once, whichever strategies it is made under. */
class Report {
  readonly issues: Issue[] = [];
  private readonly said = new Set<string>();

  add(issue: Issue): void {
    const key = JSON.stringify([issue.code, issue.path, issue.at, issue.params]);
    if (this.said.has(key)) return;
    this.said.add(key);
    this.issues.push(issue);
  }

  worst(): Issue[] {
    if (this.issues.length <= MOST_ISSUES) return this.issues;
    const errors = this.issues.filter(({ severity }) => severity === 'error');
    const warnings = this.issues.filter(({ severity }) => severity === 'warning');
    return [...errors, ...warnings].slice(0, MOST_ISSUES);
  }
}

/** Circles under any strategy, of the document as it is and under each scenario. */
function checkCircles(document: ModelDocument, report: Report): void {
  const budget: Budget = { left: MOST_STEPS };
  const check = (definitions: readonly Definition[]): void => {
    if (!orderForAll(definitions, budget).isCircular) return;
    for (const { id } of document.strategies) {
      for (const issue of orderVariables(definitions, id, budget).issues) report.add(issue);
    }
  };
  check(definitionsIn(document));
  for (const scenario of document.scenarios) {
    if (hasErrors(report.issues) || budget.left < 0) break;
    if (scenario.overrides.some(({ type }) => type === 'variable')) {
      check(definitionsIn(document, scenario));
    }
  }
  if (budget.left < 0)
    report.add(error('formula.tooMuchWork', ['variables'], { limit: MOST_STEPS }));
}

class FormulaCheck {
  private readonly used = new Set<string>();
  private readonly setting: Setting;
  private readonly facts: VariableFacts;
  private readonly scope: Scope;
  private readonly report: Report;

  constructor(document: ModelDocument, scope: Scope, report: Report) {
    const { question, strategies } = document;
    this.scope = scope;
    this.report = report;
    this.setting = { measure: question.outcome.measure, cycleLength: question.cycleLength };
    const { order } = orderForAll(definitionsIn(document));
    this.facts = variableFacts(
      order,
      strategies.map(({ id }) => id),
      scope,
    );
  }

  /** Names that the sites' formulas use. */
  run(sites: readonly Site[]): ReadonlySet<string> {
    for (const site of sites) {
      for (const text of textsOf(site.formula, site.path, site.strategies)) this.text(site, text);
    }
    return this.used;
  }

  private text(site: Site, formula: FormulaText): void {
    for (const issue of this.issuesOf(site, formula)) {
      this.report.add({ ...issue, path: [...formula.path, ...issue.path] });
    }
  }

  private issuesOf(site: Site, { text, strategies }: FormulaText): readonly Issue[] {
    const parsed = parseFormula(text);
    if (!parsed.expr) return parsed.issues;
    const { expr } = parsed;
    for (const name of namesIn(expr)) this.used.add(name);
    const { kind, issues } = inferKind(expr, this.scope, this.facts.kinds);
    return [
      ...checkNames(expr, this.scope, site),
      ...issues,
      ...checkPlace(expr, kind, site.place, this.setting),
      ...(site.timeInState ? [] : this.timedVariables(expr, strategies)),
    ];
  }

  /** Variables that need a time in state, named where there is none. */
  private timedVariables(expr: Expr, strategies: readonly string[]): Issue[] {
    const needs = (name: string) => {
      const timed = this.facts.timed.get(name);
      return timed !== undefined && strategies.some((id) => timed.has(id));
    };
    const names = [...namesIn(expr)].filter(needs);
    return names.map((name) =>
      error('formula.noTimeInState', [], { variable: name }, placeOf(expr, name)),
    );
  }
}

function textLength(sites: readonly Site[]): number {
  const texts = sites.flatMap(({ formula, path }) => textsOf(formula, path, []));
  return texts.reduce((total, { text }) => total + text.length, 0);
}

/**
 * What is wrong with the formulas of a document whose references hold
 * (shared/model/references.ts), with full paths to the formula's text: the issues of
 * parse.ts, scope.ts, names.ts, order.ts, kinds.ts, places.ts, ranges.ts and unused.ts,
 * and `formula.tooMuchText` and `formula.tooMuchWork` (params limit) where a document
 * is past what can be checked in a moment. At most 1,000.
 */
export function checkFormulas(document: ModelDocument): Issue[] {
  const sites = formulaSites(document);
  const length = textLength(sites);
  if (length > MOST_TEXT) {
    return [error('formula.tooMuchText', [], { length, limit: MOST_TEXT })];
  }
  const report = new Report();
  const { scope, issues } = buildScope(document);
  for (const issue of issues) report.add(issue);
  checkCircles(document, report);
  const used = new FormulaCheck(document, scope, report).run(sites);
  for (const issue of checkValues(document)) report.add(issue);
  for (const issue of checkUnused(document, used)) report.add(issue);
  return report.worst();
}
