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

/** Alive or dead: a new option that lowers the chance of dying. */
export function twoState(setting: TemplateSetting): ModelDocument {
  const { words } = setting;
  const make = new Placeholders(words);
  return baseDocument(setting, {
    strategies: usualAndNew(words),
    parameters: [
      make.chance('p_die', words.chanceDying, 0.05),
      make.ratio('rr_die', words.effectOnDying, 0.8),
      make.costPerYear('c_care', words.costCare, 100),
      make.costPerYear('c_option', words.costOption, 100),
      make.utility('u_alive', words.utilityAlive, 0.8),
    ],
    variables: [
      {
        id: 'die_now',
        symbol: 'die_now',
        label: words.dyingNow,
        kind: 'probability',
        formula: { byStrategy: { new: 'times_risk(p_die, rr_die)' }, otherwise: 'p_die' },
      },
    ],
    states: [living('alive', words.alive), deadState(words)],
    start: { remainder: 'alive', shares: [] },
    movements: { type: 'rows', rows: [rowOut('alive', { dead: 'die_now' })] },
    payoffs: [
      carePayoff(words, { alive: 'c_care' }),
      optionPayoff(words, ['alive']),
      qalyPayoff(words, { alive: 'u_alive' }),
    ],
  });
}
