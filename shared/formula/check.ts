/**
 * Everything that can be said about a document's formulas without running it: they
 * parse, their names are known, their definitions run in no circle, and their kinds
 * fit each other and the place they stand in.
 */
import type { ModelDocument } from '../model/document.ts';
import { error, type Issue } from '../model/issue.ts';
import { definitionsIn } from './definitions.ts';
import type { Expr } from './expr.ts';
import { inferKind } from './kinds.ts';
import { checkNames, namesIn, placeOf } from './names.ts';
import { parseFormula } from './parse.ts';
import { checkPlace, type Setting } from './places.ts';
import { checkValues } from './ranges.ts';
import { buildScope, type Scope } from './scope.ts';
import { formulaSites, type Site, type SiteText, textsOf } from './sites.ts';
import { type StrategyKinds, strategyKinds } from './strategy-kinds.ts';
import { checkUnused } from './unused.ts';

/** Issues reported of one document; errors come before warnings where there are more. */
const MOST_ISSUES = 1_000;

class FormulaCheck {
  private readonly issues: Issue[] = [];
  private readonly said = new Set<string>();
  private readonly used = new Set<string>();
  private readonly document: ModelDocument;
  private readonly scope: Scope;
  private readonly setting: Setting;
  private byStrategy: ReadonlyMap<string, StrategyKinds> = new Map();

  constructor(document: ModelDocument) {
    this.document = document;
    const { question } = document;
    this.setting = { measure: question.outcome.measure, cycleLength: question.cycleLength };
    const { scope, issues } = buildScope(document);
    this.scope = scope;
    for (const issue of issues) this.report(issue);
  }

  run(): Issue[] {
    this.byStrategy = this.kindsByStrategy(definitionsIn(this.document));
    this.checkScenarioCycles();
    for (const site of formulaSites(this.document)) {
      for (const text of textsOf(site)) this.checkText(site, text);
    }
    for (const issue of checkValues(this.document)) this.report(issue);
    for (const issue of checkUnused(this.document, this.used)) this.report(issue);
    return this.issues.length > MOST_ISSUES ? worstOf(this.issues) : this.issues;
  }

  /** The same mistake is said once, whichever strategies it is made under. */
  private report(issue: Issue): void {
    const key = JSON.stringify([issue.code, issue.path, issue.at, issue.params]);
    if (this.said.has(key)) return;
    this.said.add(key);
    this.issues.push(issue);
  }

  /** Shared where no variable differs by strategy. */
  private kindsByStrategy(
    definitions: ReturnType<typeof definitionsIn>,
  ): ReadonlyMap<string, StrategyKinds> {
    const differs = definitions.some(({ formula }) => typeof formula !== 'string');
    let shared: StrategyKinds | undefined;
    const kinds = new Map<string, StrategyKinds>();
    for (const { id } of this.document.strategies) {
      const own = shared ?? strategyKinds(definitions, id, this.scope);
      if (!differs) shared = own;
      for (const issue of own.issues) this.report(issue);
      kinds.set(id, own);
    }
    return kinds;
  }

  /** A scenario's formulas can close a circle that the document's own do not. */
  private checkScenarioCycles(): void {
    for (const scenario of this.document.scenarios) {
      if (!scenario.overrides.some(({ type }) => type === 'variable')) continue;
      this.kindsByStrategy(definitionsIn(this.document, scenario));
    }
  }

  private checkText(site: Site, { text, path, strategies }: SiteText): void {
    const parsed = parseFormula(text);
    const report = (issue: Issue) => this.report({ ...issue, path: [...path, ...issue.path] });
    if (!parsed.expr) {
      parsed.issues.forEach(report);
      return;
    }
    const { expr } = parsed;
    for (const name of namesIn(expr)) this.used.add(name);
    checkNames(expr, this.scope, site).forEach(report);
    const known = new Set(strategies.flatMap((id) => this.byStrategy.get(id) ?? []));
    for (const variables of known) {
      const { kind, issues } = inferKind(expr, this.scope, variables.kinds);
      issues.forEach(report);
      checkPlace(expr, kind, site.place, this.setting).forEach(report);
      if (!site.timeInState) timedVariables(expr, variables).forEach(report);
    }
  }
}

/** Variables that need a time in state, named where there is none. */
function timedVariables(expr: Expr, { timed }: StrategyKinds): Issue[] {
  const names = [...namesIn(expr)].filter((name) => timed.has(name));
  return names.map((name) =>
    error('formula.noTimeInState', [], { variable: name }, placeOf(expr, name)),
  );
}

function worstOf(issues: readonly Issue[]): Issue[] {
  const errors = issues.filter(({ severity }) => severity === 'error');
  const warnings = issues.filter(({ severity }) => severity === 'warning');
  return [...errors, ...warnings].slice(0, MOST_ISSUES);
}

/**
 * What is wrong with the formulas of a document whose references hold
 * (shared/model/references.ts), with full paths to the formula's text: the issues of
 * parse.ts, scope.ts, names.ts, order.ts, kinds.ts, places.ts, ranges.ts and unused.ts.
 * At most 1,000.
 */
export function checkFormulas(document: ModelDocument): Issue[] {
  return new FormulaCheck(document).run();
}
