import type { Question, Scenario } from './document.ts';

type Override = Extract<Scenario['overrides'][number], { type: 'setting' }>;
export type Setting = Override['setting'];
export type SettingValue = Override['value'];

const COUNTING: readonly SettingValue[] = ['start', 'end', 'trapezoid', 'simpson'];

/** Whether a value is in a setting's domain: years above 0, a rate above -1, a way of counting. */
export function isSettingValue(setting: Setting, value: SettingValue): boolean {
  if (setting === 'counting') return COUNTING.includes(value);
  return typeof value === 'number' && value > (setting === 'horizon' ? 0 : -1);
}

/** The question with one setting changed; the value has to be in the setting's domain. */
export function withSetting(question: Question, setting: Setting, value: SettingValue): Question {
  switch (setting) {
    case 'horizon':
      return { ...question, horizon: Number(value) };
    case 'counting':
      return { ...question, counting: value as Question['counting'] };
    case 'discountCosts':
      return { ...question, discounting: { ...question.discounting, costs: Number(value) } };
    case 'discountOutcomes':
      return { ...question, discounting: { ...question.discounting, outcomes: Number(value) } };
  }
}
