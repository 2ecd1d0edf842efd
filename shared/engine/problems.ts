/**
 * What only running shows, such as a remainder below 0 in some draw: counted, with
 * the place of the first, and never mended in silence.
 */
import type { ModelDocument } from '../model/document.ts';
import type { Issue } from '../model/issue.ts';
import type { Check } from './movement/row.ts';

interface Problem {
  readonly check: Check;
  count: number;
  readonly draw: number;
  readonly cycle: number;
  readonly profile: number;
  readonly value: number;
}

export class ProblemLog {
  /** Index of the profile being simulated. */
  profile = 0;
  private readonly byKey = new Map<string, Problem>();

  /** @param firstDraw number of the block's first draw in the whole plan */
  constructor(
    private readonly document: ModelDocument,
    private readonly firstDraw: number,
  ) {}

  add(
    check: Check,
    count: number,
    cycle: number,
    memory: Float64Array,
    at: number,
    length: number,
  ): void {
    const key = `${check.code} ${check.path.join('.')} ${check.strategy}`;
    const known = this.byKey.get(key);
    if (known) {
      known.count += count;
      return;
    }
    let first = 0;
    while (first < length - 1 && isInside(memory[at + first]!, check)) first++;
    const value = memory[at + first]!;
    const draw = this.firstDraw + first;
    this.byKey.set(key, { check, count, draw, cycle, profile: this.profile, value });
  }

  /** As issues: errors in the base case, warnings in draws. */
  issues(severity: Issue['severity']): Issue[] {
    return [...this.byKey.values()].map(({ check, count, draw, cycle, profile, value }) => ({
      code: check.code,
      severity,
      path: check.path,
      params: {
        count,
        draw,
        cycle,
        value: Number.isFinite(value) ? value : String(value),
        strategy: check.strategy,
        profile: this.document.profiles[profile]!.id,
      },
    }));
  }
}

function isInside(value: number, { low, high }: Check): boolean {
  return value >= low && value <= high;
}

/** The problems of several blocks as one list: counts add up, the first place stays. */
export function mergeProblems(blocks: readonly (readonly Issue[])[]): Issue[] {
  const merged = new Map<string, Issue>();
  for (const issue of blocks.flat()) {
    const key = `${issue.code} ${issue.path.join('.')} ${issue.params.strategy}`;
    const known = merged.get(key);
    const count = Number(known?.params.count ?? 0) + Number(issue.params.count ?? 1);
    const first = known && Number(known.params.draw) <= Number(issue.params.draw) ? known : issue;
    merged.set(key, { ...first, params: { ...first.params, count } });
  }
  return [...merged.values()];
}
