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

/** Stable, progressed, dead, one way: a new option that slows progression. */
export function progressive(setting: TemplateSetting): ModelDocument {
  const { words } = setting;
  const make = new Placeholders(words);
  return baseDocument(setting, {
    strategies: usualAndNew(words),
    parameters: [
      make.chance('p_progress', words.chanceProgression, 0.1),
      make.chance('p_die_stable', words.chanceDyingStable, 0.02),
      make.chance('p_die_progressed', words.chanceDyingProgressed, 0.2),
      make.ratio('rr_progress', words.effectOnProgression, 0.8),
      make.costPerYear('c_stable', words.costCareStable, 100),
      make.costPerYear('c_progressed', words.costCareProgressed, 500),
      make.costPerYear('c_option', words.costOption, 100),
      make.utility('u_stable', words.utilityStable, 0.8),
      make.utility('u_progressed', words.utilityProgressed, 0.5),
    ],
    variables: [
      {
        id: 'progress_now',
        symbol: 'progress_now',
        label: words.progressionNow,
        kind: 'probability',
        formula: {
          byStrategy: { new: 'times_risk(p_progress, rr_progress)' },
          otherwise: 'p_progress',
        },
      },
    ],
    states: [
      living('stable', words.stable),
      living('progressed', words.progressed),
      deadState(words),
    ],
    start: { remainder: 'stable', shares: [] },
    movements: {
      type: 'rows',
      rows: [
        rowOut('stable', { progressed: 'progress_now', dead: 'p_die_stable' }),
        rowOut('progressed', { dead: 'p_die_progressed' }),
      ],
    },
    payoffs: [
      carePayoff(words, { stable: 'c_stable', progressed: 'c_progressed' }),
      optionPayoff(words, ['stable']),
      qalyPayoff(words, { stable: 'u_stable', progressed: 'u_progressed' }),
    ],
  });
}
