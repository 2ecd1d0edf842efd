/**
 * Walks of random edits, operations, undos and redos through each example: the document
 * is always answered for, and undoing all brings the first one back, to the digest.
 * `WALK_STEPS=5000 WALK_SEED=n npx vitest run tests/model/edit/walk.test.ts` goes further.
 */
import { expect, test } from 'vitest';
import { addCovariate } from '../../../shared/formula/edit/add-covariate.ts';
import { addParameter } from '../../../shared/formula/edit/add-parameter.ts';
import { duplicate } from '../../../shared/formula/edit/duplicate.ts';
import { removalOf } from '../../../shared/formula/edit/remove.ts';
import { renameSymbol } from '../../../shared/formula/edit/rename-symbol.ts';
import { isNamed } from '../../../shared/formula/edit/symbols.ts';
import { digestOf } from '../../../shared/model/digest.ts';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { addProfile } from '../../../shared/model/edit/add-profile.ts';
import { addState } from '../../../shared/model/edit/add-state.ts';
import { addStrategy } from '../../../shared/model/edit/add-strategy.ts';
import { applyEdits } from '../../../shared/model/edit/apply.ts';
import type { Edit } from '../../../shared/model/edit/edit.ts';
import { itemsOf, type Target } from '../../../shared/model/edit/target.ts';
import { DocumentError, hasErrors } from '../../../shared/model/issue.ts';
import { checkDocument, type ReadResult } from '../../../shared/model/read.ts';
import { DOCUMENTS } from './after.ts';
import { Dice, randomEdit } from './random-edits.ts';

const SEED = Number(process.env.WALK_SEED ?? 20_261_201);
const STEPS = Number(process.env.WALK_STEPS ?? 1_000);

const KINDS = [
  'strategy',
  'state',
  'profile',
  'covariate',
  'parameter',
  'group',
  'table',
  'variable',
  'payoff',
  'scenario',
  'threshold',
] as const;

interface Counts {
  edits: number;
  operations: number;
  undos: number;
  redos: number;
  valid: number;
  explained: number;
}

class Walk {
  readonly counts: Counts = { edits: 0, operations: 0, undos: 0, redos: 0, valid: 0, explained: 0 };
  private readonly done: Edit[][] = [];
  private readonly undone: Edit[][] = [];
  private answer: ReadResult;

  constructor(
    public document: ModelDocument,
    private readonly dice: Dice,
  ) {
    this.answer = checkDocument(document);
  }

  step(): void {
    // People take back what broke the model, more often than not.
    const regret = this.answer.document ? 0.1 : 0.6;
    const thrown = this.dice.next();
    if (thrown < regret && this.done.length > 0) this.undo();
    else if (thrown < regret + 0.1 && this.undone.length > 0) this.redo();
    else this.change();
    this.answer = checkDocument(this.document);
    this.judge(this.answer);
  }

  undo(): void {
    const inverse = this.done.pop() ?? [];
    this.undone.push(this.apply(inverse));
    this.counts.undos += 1;
  }

  get isAtStart(): boolean {
    return this.done.length === 0;
  }

  private redo(): void {
    const edits = this.undone.pop() ?? [];
    this.done.push(this.apply(edits));
    this.counts.redos += 1;
  }

  private change(): void {
    // Operations are offered where the shape of the document is sound, as in the app.
    const sound = this.answer.document ?? ('draft' in this.answer ? this.answer.draft : null);
    const operate = sound !== null && isWhole(this.document) && this.dice.next() < 0.5;
    const edits = operate
      ? operation(this.document, this.dice)
      : [randomEdit(this.document, this.dice)];
    this.counts[operate ? 'operations' : 'edits'] += 1;
    this.done.push(this.apply(edits));
    this.undone.length = 0;
  }

  private apply(edits: readonly Edit[]): Edit[] {
    const { document, inverse } = applyEdits(this.document, edits);
    this.document = document;
    return inverse;
  }

  private judge({ document, issues }: ReadResult): void {
    const isSound =
      (document === null) === hasErrors(issues) &&
      issues.every(({ code }) => /^[a-zA-Z]+\.[a-zA-Z]+$/.test(code));
    if (!isSound) expect.fail(`unsound answer: ${JSON.stringify(issues)}`);
    this.counts[document ? 'valid' : 'explained'] += 1;
  }
}

/** A list that was unset reads as empty, but there is none to put anything into. */
function isWhole(document: ModelDocument): boolean {
  return KINDS.every((what) => Array.isArray(itemsOf(document, what)));
}

function anyTarget(document: ModelDocument, dice: Dice): Target {
  const kinds = KINDS.filter((what) => itemsOf(document, what).length > 0);
  const what = dice.pick(kinds);
  return { what, id: dice.pick(itemsOf(document, what)).id };
}

function operation(document: ModelDocument, dice: Dice): Edit[] {
  const target = anyTarget(document, dice);
  const label = `Thing ${dice.below(100)}`;
  switch (dice.below(8)) {
    case 0:
      return addStrategy(document, { label }).edits;
    case 1:
      return addState(document, { label, type: dice.pick(['ordinary', 'absorbing', 'timed']) })
        .edits;
    case 2:
      return addProfile(document, { label }).edits;
    case 3:
      return addParameter(document, { label }).edits;
    case 4:
      return addCovariate(document, { label }).edits;
    case 5: {
      const { what, id } = target;
      return what === 'group' ? [] : duplicate(document, { what, id }, label).edits;
    }
    case 6:
      return isNamed(target)
        ? renamed(() => renameSymbol(document, target, `name_${dice.below(100)}`))
        : [];
    default: {
      const removal = removalOf(document, target, { replace: dice.next() < 0.5 });
      return removal.possible ? removal.edits : [];
    }
  }
}

/** No edits where the symbol is taken: said, and nothing done. */
function renamed(rename: () => Edit[]): Edit[] {
  try {
    return rename();
  } catch (thrown) {
    if (thrown instanceof DocumentError) return [];
    throw thrown;
  }
}

test.each(DOCUMENTS)(`%s: ${STEPS} steps, and back`, { timeout: 600_000 }, (_, example) => {
  const first = digestOf(example);
  const walk = new Walk(example, new Dice(SEED));
  for (let step = 0; step < STEPS; step += 1) {
    try {
      walk.step();
    } catch (cause) {
      throw new Error(`WALK_SEED=${SEED}, step ${step}`, { cause });
    }
  }
  expect(digestOf(walk.document)).not.toBe(first);
  while (!walk.isAtStart) walk.undo();
  expect(digestOf(walk.document)).toBe(first);
  // Work happened, of every sort.
  for (const count of Object.values(walk.counts)) expect(count).toBeGreaterThan(STEPS / 100);
});
