import { expect, test } from 'vitest';
import { addCovariate } from '../../../shared/formula/edit/add-covariate.ts';
import { DOCUMENTS, soundAfter } from '../../model/edit/after.ts';

test.each(DOCUMENTS)('%s: every profile has a value of it', (_, document) => {
  const { id, edits } = addCovariate(document, {
    label: 'Distance to a clinic',
    unit: 'km',
    value: 5,
  });
  const { covariates, profiles } = soundAfter(document, edits);
  expect(covariates.at(-1)).toMatchObject({ id, symbol: 'distance_to_a_clinic', unit: 'km' });
  expect(profiles.every((profile) => profile.covariates[id] === 5)).toBe(true);
});
