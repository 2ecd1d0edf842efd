/** The command line's words: `appraise FILE [options]` or `appraise --example SLUG`. */
import { parseArgs } from 'node:util';
import { error, type Issue } from '../model/issue.ts';

export interface Options {
  /** Where the document is; exactly one of the two. */
  readonly file: string | null;
  readonly example: string | null;
  readonly scenario: string | null;
  /** Undefined: as the document says. */
  readonly samples?: number;
  readonly seed?: number;
  readonly plan?: 'plain' | 'lhs' | 'sobol';
  readonly threshold?: number;
  readonly trace: boolean;
  /** File that draws and outcomes are written to. */
  readonly draws: string | null;
  readonly help: boolean;
}

export const USAGE = `Usage: npm run --silent appraise -- FILE [options]
       npm run --silent appraise -- --example SLUG [options]

Reads a model document and prints one JSON object: base case, incremental analysis
and, where samples are drawn, the probabilistic analysis.

  --samples N      draws (0: base case only; default: as the document says)
  --seed N         seed of the draws, 0 to 4294967295
  --plan PLAN      plain, lhs or sobol
  --threshold X    money per unit of outcome
  --scenario ID    apply one of the document's scenarios first
  --trace          add the share of the cohort in each state at every cycle
  --draws FILE     write every draw's parameters, costs and outcomes as CSV

Errors go to stderr as coded messages; the exit code is then 2.`;

const MOST_SAMPLES = 1_000_000;
const LARGEST_SEED = 4_294_967_295;

export type Parsed =
  | { readonly options: Options; readonly issues: readonly [] }
  | { readonly options: null; readonly issues: readonly Issue[] };

export function parseOptions(args: readonly string[]): Parsed {
  const raw = rawOptions(args);
  if (!raw) return { options: null, issues: [error('command.unknownOption')] };
  const { values, positionals } = raw;
  const issues: Issue[] = [];
  const number = (name: 'samples' | 'seed' | 'threshold', most: number, whole: boolean) => {
    const text = values[name];
    if (text === undefined) return undefined;
    const value = Number(text);
    const fits = text.trim() !== '' && value >= 0 && value <= most;
    if (fits && (!whole || Number.isInteger(value))) return value;
    issues.push(error('command.badNumber', [], { option: name, text, most }));
    return undefined;
  };
  const samples = number('samples', MOST_SAMPLES, true);
  const seed = number('seed', LARGEST_SEED, true);
  const threshold = number('threshold', Number.MAX_VALUE, false);
  const plan = values.plan;
  if (plan !== undefined && !isPlan(plan)) {
    issues.push(error('command.badPlan', [], { text: plan }));
  }
  const example = values.example ?? null;
  const file = positionals[0] ?? null;
  const sources = positionals.length + (example === null ? 0 : 1);
  if (sources !== 1 && !values.help) issues.push(error('command.oneDocument'));
  if (issues.length > 0) return { options: null, issues };
  const options = {
    file,
    example,
    scenario: values.scenario ?? null,
    samples,
    seed,
    threshold,
    plan: plan as Options['plan'],
    trace: values.trace ?? false,
    draws: values.draws ?? null,
    help: values.help ?? false,
  };
  return { options, issues: [] };
}

function rawOptions(args: readonly string[]) {
  try {
    return parseArgs({
      args: [...args],
      allowPositionals: true,
      options: {
        example: { type: 'string' },
        scenario: { type: 'string' },
        samples: { type: 'string' },
        seed: { type: 'string' },
        plan: { type: 'string' },
        threshold: { type: 'string' },
        trace: { type: 'boolean' },
        draws: { type: 'string' },
        help: { type: 'boolean', short: 'h' },
      },
    });
  } catch {
    return null;
  }
}

function isPlan(text: string): text is 'plain' | 'lhs' | 'sobol' {
  return text === 'plain' || text === 'lhs' || text === 'sobol';
}
