import { expect, test } from 'vitest';
import { isSettingValue, withSetting } from '../../shared/model/setting.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

const { question } = tinyDocument();

test('each setting has its domain', () => {
  expect(isSettingValue('horizon', 20)).toBe(true);
  expect(isSettingValue('horizon', 0)).toBe(false);
  expect(isSettingValue('horizon', '20')).toBe(false);
  expect(isSettingValue('discountCosts', 0)).toBe(true);
  expect(isSettingValue('discountOutcomes', -1)).toBe(false);
  expect(isSettingValue('counting', 'simpson')).toBe(true);
  expect(isSettingValue('counting', 'middle')).toBe(false);
  expect(isSettingValue('counting', 1)).toBe(false);
});

test('one setting changes and nothing else does', () => {
  expect(withSetting(question, 'horizon', 5)).toEqual({ ...question, horizon: 5 });
  expect(withSetting(question, 'counting', 'end')).toEqual({ ...question, counting: 'end' });
  expect(withSetting(question, 'discountCosts', 0.05).discounting).toEqual({
    ...question.discounting,
    costs: 0.05,
  });
  expect(withSetting(question, 'discountOutcomes', 0).discounting).toEqual({
    ...question.discounting,
    outcomes: 0,
  });
});
