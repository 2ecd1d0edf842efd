/**
 * Mutated documents through the whole engine: whatever can be read is refused with
 * coded errors or runs to numbers and coded problems; nothing else is thrown, nothing
 * hangs. `FUZZ_SEED=n npx vitest run tests/engine/fuzz.test.ts` takes another seed.
 */
import { expect, test } from 'vitest';
import { prepare } from '../../shared/engine/engine.ts';
import { DocumentError } from '../../shared/model/issue.ts';
import { readDocument } from '../../shared/model/read.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';
import { Mutator } from '../model/mutate.ts';

const SEED = Number(process.env.FUZZ_SEED ?? 20_261_202);
const ROUNDS = 6_000;
const SECONDS = 2;
const settings = { samples: 3, seed: 1, plan: 'plain' } as const;

type Ending = 'unread' | 'refused' | 'ran' | 'ranWithProblems';

function endingOf(text: string): Ending {
  const { document } = readDocument(text);
  if (!document) return 'unread';
  try {
    const engine = prepare(document);
    const { problems } = engine.base({ trace: true });
    const draws = engine.draws(settings, 0, settings.samples);
    return problems.length + draws.problems.length > 0 ? 'ranWithProblems' : 'ran';
  } catch (thrown) {
    if (thrown instanceof DocumentError && thrown.issues.length > 0) return 'refused';
    throw thrown;
  }
}

test(`${ROUNDS} mutated documents through the engine`, { timeout: 300_000 }, () => {
  const endings: Record<Ending, number> = { unread: 0, refused: 0, ran: 0, ranWithProblems: 0 };
  for (let round = 0; round < ROUNDS; round++) {
    const text = new Mutator(SEED + round).mutatedText(tinyDocument());
    const before = process.cpuUsage();
    try {
      endings[endingOf(text)]++;
    } catch (cause) {
      throw new Error(`seed ${SEED}, round ${round}: new Mutator(${SEED + round})`, { cause });
    }
    const { user, system } = process.cpuUsage(before);
    if ((user + system) / 1e6 > SECONDS) expect.fail(`round ${round} took over ${SECONDS} s`);
  }
  // The work did happen: some were refused by the engine's checks, many ran.
  expect(endings.ran).toBeGreaterThan(ROUNDS / 20);
  expect(endings.refused).toBeGreaterThan(0);
  expect(endings.unread).toBeGreaterThan(0);
});
