import { expect, test } from 'vitest';
import type { ModelDocument } from '../../../shared/model/document.ts';
import { issuesOf, said } from './codes.ts';

const survival = (states: string[], last: string) => {
  return (document: ModelDocument): void => {
    const curves = states.map((state, index) => ({ id: `c${index}`, state, formula: '1' }));
    document.movements = { type: 'survival', curves, last };
  };
};

test('curves and the last state name every state once', () => {
  expect(said(survival(['alive'], 'dead'))).toEqual([]);
  expect(issuesOf(survival(['alive'], 'alive'))).toMatchObject([
    { code: 'movements.stateInTwoCurves', params: { state: 'alive' } },
    { code: 'movements.stateWithoutCurve', params: { state: 'dead' } },
  ]);
});

test('states named are known', () => {
  expect(said(survival(['alive', 'ill'], 'dead'))).toEqual([
    'states.unknown movements.curves.1.state',
  ]);
  expect(said(survival(['alive', 'dead'], 'gone'))).toEqual(['states.unknown movements.last']);
});

test('no state under curves is timed', () => {
  expect(
    said((document) => {
      survival(['alive'], 'dead')(document);
      Object.assign(document.states[0]!, { type: 'timed', cycles: 3 });
    }),
  ).toEqual(['movements.timedUnderCurves states.0.type']);
});

test('curves by strategy cover every strategy', () => {
  expect(
    said((document) => {
      const formula = { byStrategy: { usual: '1' } };
      const curves = [{ id: 'c', state: 'alive', formula }];
      document.movements = { type: 'survival', curves, last: 'dead' };
    }),
  ).toEqual(['formula.missingForStrategy movements.curves.0.formula']);
});
