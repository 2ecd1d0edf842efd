/**
 * Hostile documents by the thousand: no uncaught error, no slow answer, every refusal
 * coded. `FUZZ_SEED=n npx vitest run tests/model/fuzz.test.ts` takes another seed.
 */
import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { hasErrors } from '../../shared/model/issue.ts';
import { MAX_ISSUES } from '../../shared/model/limits.ts';
import { type ReadResult, readDocument } from '../../shared/model/read.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';
import { Mutator } from './mutate.ts';

const SEED = Number(process.env.FUZZ_SEED ?? 20_261_201);
const ROUNDS = 20_000;
/** Every tenth document comes from an example: they are some forty times larger. */
const EXAMPLE_EVERY = 10;

const examples = readdirSync(new URL('../../shared/examples/', import.meta.url))
  .filter((name) => name.endsWith('.json'))
  .map((name) => readFileSync(new URL(`../../shared/examples/${name}`, import.meta.url), 'utf8'))
  .map((text): unknown => JSON.parse(text));

/**
 * Reads with a stopwatch: the answer has to come within `seconds` of processor time
 * (time on the wall also counts what else the machine is doing).
 */
function timed(text: string, seconds: number): ReadResult {
  const start = process.cpuUsage();
  const result = readDocument(text);
  const { user, system } = process.cpuUsage(start);
  const took = (user + system) / 1e6;
  if (took > seconds) throw new Error(`took ${took} s, more than ${seconds} s`);
  return result;
}

// Plain comparisons: a matcher a code would take longer than the reading.
function expectCoded({ document, issues }: ReadResult): void {
  const sound =
    (document === null) === hasErrors(issues) &&
    issues.length <= MAX_ISSUES + 1 &&
    issues.every(({ code }) => /^[a-zA-Z]+\.[a-zA-Z]+$/.test(code));
  if (!sound) expect.fail(`unsound answer: ${JSON.stringify(issues)}`);
}

test(`${ROUNDS} mutated documents`, { timeout: 300_000 }, () => {
  const tiny = tinyDocument();
  const codes = new Map<string, number>();
  let accepted = 0;
  for (let round = 0; round < ROUNDS; round += 1) {
    const mutator = new Mutator(SEED + round);
    const base = round % EXAMPLE_EVERY === 0 ? mutator.pick([tiny, ...examples]) : tiny;
    try {
      const result = timed(mutator.mutatedText(base), 1);
      expectCoded(result);
      if (result.document) accepted += 1;
      else for (const { code } of result.issues) codes.set(code, (codes.get(code) ?? 0) + 1);
    } catch (cause) {
      throw new Error(`seed ${SEED}, round ${round}: new Mutator(${SEED + round})`, { cause });
    }
  }
  // Work happened: both answers are common, and refusals come for many reasons.
  expect(accepted).toBeGreaterThan(ROUNDS * 0.05);
  expect(accepted).toBeLessThan(ROUNDS * 0.6);
  expect(codes.size).toBeGreaterThan(25);
  for (const code of ['document.notJson', 'document.hostileKey', 'document.tooDeep']) {
    expect([code, codes.get(code) ?? 0]).toEqual([code, expect.toSatisfy((n: number) => n > 50)]);
  }
});

describe('giants, each answered within 3 seconds of processor time', () => {
  const tiny = tinyDocument();
  const states = Array.from({ length: 1_000_000 }, (_, index) => ({ id: `s${index}` }));
  const keys = Array.from({ length: 600_000 }, (_, index) => [`k${index}`, '1']);
  const cells = Array(500).fill(1);
  const row = { id: 'r', from: 'alive', basis: 'logit', reference: 'dead', cells };

  test.each<[string, () => string, string]>([
    ['50 MB of opening brackets', () => '['.repeat(50_000_000), 'document.tooLarge'],
    ['9 MB of opening brackets', () => '['.repeat(9_000_000), 'document.tooDeep'],
    ['9 MB of brackets in keys', () => '{"a":'.repeat(1_800_000), 'document.tooDeep'],
    ['a million states', () => JSON.stringify({ ...tiny, states }), 'document.tooLarge'],
    [
      'half a million states',
      () => JSON.stringify({ ...tiny, states: states.slice(0, 500_000) }),
      'document.tooManyItems',
    ],
    [
      'a million cells of the wrong type',
      () => JSON.stringify({ ...tiny, movements: { type: 'rows', rows: Array(2_000).fill(row) } }),
      'document.invalidType',
    ],
    [
      'an object of 600,000 keys',
      () => JSON.stringify({ ...tiny, later: Object.fromEntries(keys) }),
      'document.tooManyKeys',
    ],
    ['a string without an end', () => `{"a":"${'x'.repeat(9_000_000)}`, 'document.notJson'],
    ['9 MB of backslashes', () => `{"a":"${'\\'.repeat(9_000_000)}`, 'document.notJson'],
    ['9 million lines', () => `${'\n'.repeat(9_000_000)}x`, 'document.notJson'],
    ['a number of 9 million digits', () => '1'.repeat(9_000_000), 'document.numberNotFinite'],
  ])('%s', { timeout: 30_000 }, (_, text, code) => {
    const result = timed(text(), 3);
    expectCoded(result);
    expect(result.issues[0]?.code).toBe(code);
  });

  test('a list of 4 million numbers in a field of a later version is let through', () => {
    const text = JSON.stringify({ ...tiny, later: Array(4_000_000).fill(1) });
    expect(timed(text, 3).document).not.toBeNull();
  });
});
