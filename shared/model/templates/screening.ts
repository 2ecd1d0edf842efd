import type { ModelDocument, Parameter, Payoff } from '../document.ts';
import {
  baseDocument,
  byState,
  deadState,
  living,
  Placeholders,
  qalyPayoff,
  rowOut,
} from './parts.ts';
import type { TemplateSetting, TemplateWords } from './template-words.ts';

/**
 * A test at the start: who has the disease, and whom the test finds, says where the
 * cohort begins. Those found are treated; the others are left as they are.
 */
export function screening(setting: TemplateSetting): ModelDocument {
  const { words } = setting;
  const found = 'prevalence * sensitivity';
  const missed = 'prevalence * (1 - sensitivity)';
  return baseDocument(setting, {
    strategies: [
      { id: 'none', label: words.noScreening },
      { id: 'screening', label: words.screening },
    ],
    parameters: placeholders(words),
    states: [
      living('healthy', words.healthy),
      living('undetected', words.undetected),
      living('treated', words.treated),
      deadState(words),
    ],
    start: {
      remainder: 'healthy',
      shares: [
        {
          id: 'undetected',
          state: 'undetected',
          formula: { byStrategy: { none: 'prevalence', screening: missed } },
        },
        {
          id: 'treated',
          state: 'treated',
          formula: { byStrategy: { none: '0', screening: found } },
        },
      ],
    },
    movements: {
      type: 'rows',
      rows: [
        rowOut('healthy', { dead: 'p_die_healthy' }),
        rowOut('undetected', { dead: 'p_die_undetected' }),
        rowOut('treated', { dead: 'times_risk(p_die_undetected, rr_treatment)' }),
      ],
    },
    payoffs: payoffs(words),
  });
}

function placeholders(words: TemplateWords): Parameter[] {
  const make = new Placeholders(words);
  return [
    make.share('prevalence', words.prevalence, 0.1),
    make.share('sensitivity', words.sensitivity, 0.8),
    make.share('specificity', words.specificity, 0.9),
    make.chance('p_die_healthy', words.chanceDyingHealthy, 0.01),
    make.chance('p_die_undetected', words.chanceDyingUndetected, 0.1),
    make.ratio('rr_treatment', words.effectOfTreatment, 0.5),
    make.costOnce('c_test', words.costTest, 10),
    make.costOnce('c_false_alarm', words.costFalseAlarm, 50),
    make.costPerYear('c_undetected', words.costCareUndetected, 200),
    make.costPerYear('c_treated', words.costCareTreated, 100),
    make.utility('u_healthy', words.utilityHealthy, 0.9),
    make.utility('u_undetected', words.utilityUndetected, 0.6),
    make.utility('u_treated', words.utilityTreated, 0.8),
  ];
}

function payoffs(words: TemplateWords): Payoff[] {
  const care = { id: 'care', label: words.care, measure: 'cost', category: words.care } as const;
  const testing = { measure: 'cost', category: words.testing, strategies: ['screening'] } as const;
  const falseAlarms = '(1 - prevalence) * (1 - specificity) * c_false_alarm';
  return [
    {
      ...testing,
      id: 'test',
      label: words.testing,
      strategies: ['screening'],
      type: 'start',
      formula: 'c_test',
    },
    {
      ...testing,
      id: 'false-alarms',
      label: words.costFalseAlarm,
      strategies: ['screening'],
      type: 'start',
      formula: falseAlarms,
    },
    byState(care, { undetected: 'c_undetected', treated: 'c_treated' }),
    qalyPayoff(words, { healthy: 'u_healthy', undetected: 'u_undetected', treated: 'u_treated' }),
  ];
}
