import type { ModelDocument } from '../document.ts';
import {
  baseDocument,
  carePayoff,
  deadState,
  living,
  optionPayoff,
  Placeholders,
  qalyPayoff,
  rowOut,
  usualAndNew,
} from './parts.ts';
import type { TemplateSetting } from './template-words.ts';

/** Remission and relapse, to and fro: a new option that prevents relapses. */
export function relapsing(setting: TemplateSetting): ModelDocument {
  const { words } = setting;
  const make = new Placeholders(words);
  return baseDocument(setting, {
    strategies: usualAndNew(words),
    parameters: [
      make.chance('p_relapse', words.chanceRelapse, 0.3),
      make.chance('p_remission', words.chanceRemission, 0.5),
      make.chance('p_die_remission', words.chanceDyingRemission, 0.01),
      make.chance('p_die_relapse', words.chanceDyingRelapse, 0.05),
      make.ratio('rr_relapse', words.effectOnRelapse, 0.8),
      make.costPerYear('c_remission', words.costCareRemission, 100),
      make.costPerYear('c_relapse', words.costCareRelapse, 500),
      make.costPerYear('c_option', words.costOption, 100),
      make.utility('u_remission', words.utilityRemission, 0.8),
      make.utility('u_relapse', words.utilityRelapse, 0.5),
    ],
    variables: [
      {
        id: 'relapse_now',
        symbol: 'relapse_now',
        label: words.relapseNow,
        kind: 'probability',
        formula: {
          byStrategy: { new: 'times_risk(p_relapse, rr_relapse)' },
          otherwise: 'p_relapse',
        },
      },
    ],
    states: [
      living('remission', words.remission),
      living('relapse', words.relapse),
      deadState(words),
    ],
    start: { remainder: 'relapse', shares: [] },
    movements: {
      type: 'rows',
      rows: [
        rowOut('remission', { relapse: 'relapse_now', dead: 'p_die_remission' }),
        rowOut('relapse', { remission: 'p_remission', dead: 'p_die_relapse' }),
      ],
    },
    payoffs: [
      carePayoff(words, { remission: 'c_remission', relapse: 'c_relapse' }),
      optionPayoff(words, ['remission']),
      qalyPayoff(words, { remission: 'u_remission', relapse: 'u_relapse' }),
    ],
  });
}
