import { expect, test } from 'vitest';
import { documentSchema } from '../../shared/model/document.ts';
import { plainIssues } from '../../shared/model/plain.ts';
import { shapeIssues } from '../../shared/model/shape.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';
import { Mutator } from './mutate.ts';

/** Issues of the tiny document with the value at `path` replaced. */
function changed(path: (string | number)[], value: unknown) {
  const document = structuredClone(tinyDocument()) as unknown;
  let here = document as Record<string | number, unknown>;
  for (const key of path.slice(0, -1)) here = here[key] as typeof here;
  here[path.at(-1)!] = value;
  return shapeIssues(documentSchema, document, 100);
}

test('a sound document has no issue', () => {
  expect(shapeIssues(documentSchema, tinyDocument(), 100)).toEqual([]);
});

test('names the place of what is wrong', () => {
  const path = ['question', 'thresholds', 0, 'value'];
  expect(changed(path, -1)).toMatchObject([{ code: 'document.tooSmall', path }]);
});

test('an unknown alternative is told what there is', () => {
  const path = ['parameters', 0, 'distribution', 'type'];
  const [issue] = changed(path, 'cauchy');
  expect(issue).toMatchObject({ code: 'document.invalidValue', path, params: { got: 'cauchy' } });
  expect(issue!.params.allowed).toContain('beta, gamma');
});

test('an alternative without its discriminating field is told that it is missing', () => {
  expect(changed(['movements'], {})).toMatchObject([
    { code: 'document.missing', path: ['movements', 'type'] },
  ]);
});

test('the fault inside the alternative that was meant', () => {
  expect(changed(['parameters', 0, 'distribution', 'alpha'], 'ten')).toMatchObject([
    {
      code: 'document.invalidType',
      path: ['parameters', 0, 'distribution', 'alpha'],
      params: { expected: 'number', got: 'string' },
    },
  ]);
});

test('a formula is text or by strategy: the fault of the one that was meant', () => {
  const path = ['variables', 0, 'formula'];
  expect(changed(path, '')).toMatchObject([{ code: 'document.textTooShort', path }]);
  expect(changed(path, {})).toMatchObject([
    { code: 'document.missing', path: [...path, 'byStrategy'] },
  ]);
  expect(changed(path, 3)).toMatchObject([
    { code: 'document.invalidType', path, params: { expected: 'string, object', got: 'number' } },
  ]);
  expect(changed(path, { byStrategy: { 'no id': 'x', treatment: 1 } })).toMatchObject([
    { code: 'document.invalidKey', path: [...path, 'byStrategy', 'no id'] },
    { code: 'document.invalidType', path: [...path, 'byStrategy', 'treatment'] },
  ]);
});

test('a list that is too long is one issue, its items are not looked at', () => {
  expect(changed(['states'], Array(501).fill({}))).toMatchObject([
    { code: 'document.tooManyItems', path: ['states'], params: { maximum: 500 } },
  ]);
  expect(changed(['strategies'], [])).toMatchObject([
    { code: 'document.tooFewItems', path: ['strategies'], params: { minimum: 1 } },
  ]);
});

test('stops at the limit', () => {
  expect(shapeIssues(documentSchema, { parameters: Array(2_000).fill(1) }, 7).length).toBe(7);
});

test('gives zod’s verdict on 1,000 mutated documents', () => {
  const seed = 20_261_201;
  const mutator = new Mutator(seed);
  let refused = 0;
  for (let round = 0; round < 1_000; round += 1) {
    const value = mutator.mutated(tinyDocument());
    // Unsafe values never get as far as the schema.
    if (plainIssues(value).length > 0) continue;
    const ours = shapeIssues(documentSchema, value, 100).length === 0;
    expect({ seed, round, sound: ours }).toEqual({
      seed,
      round,
      sound: documentSchema.safeParse(value).success,
    });
    if (!ours) refused += 1;
  }
  expect(refused).toBeGreaterThan(200);
  expect(refused).toBeLessThan(950);
});
