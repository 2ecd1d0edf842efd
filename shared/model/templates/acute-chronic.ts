import type { ModelDocument, Parameter } from '../document.ts';
import {
  baseDocument,
  carePayoff,
  deadState,
  living,
  Placeholders,
  qalyPayoff,
  rowOut,
  usualAndNew,
} from './parts.ts';
import type { TemplateSetting, TemplateWords } from './template-words.ts';

/**
 * An acute illness that is over within the first cycle, by a short tree at the start:
 * death, lasting damage or recovery. Then the years that follow.
 */
export function acuteChronic(setting: TemplateSetting): ModelDocument {
  const { words } = setting;
  return baseDocument(setting, {
    strategies: usualAndNew(words),
    parameters: placeholders(words),
    variables: [
      {
        id: 'die_acute_now',
        symbol: 'die_acute_now',
        label: words.acuteDeathNow,
        kind: 'probability',
        formula: {
          byStrategy: { new: 'times_risk(p_die_acute, rr_acute)' },
          otherwise: 'p_die_acute',
        },
      },
    ],
    states: [
      living('recovered', words.recovered),
      living('chronic', words.chronic),
      deadState(words),
    ],
    start: {
      remainder: 'recovered',
      shares: [
        { id: 'dead', state: 'dead', formula: 'die_acute_now' },
        { id: 'chronic', state: 'chronic', formula: '(1 - die_acute_now) * p_chronic' },
      ],
    },
    movements: {
      type: 'rows',
      rows: [
        rowOut('recovered', { dead: 'p_die_recovered' }),
        rowOut('chronic', { dead: 'p_die_chronic' }),
      ],
    },
    payoffs: [
      {
        id: 'acute',
        label: words.acuteCare,
        measure: 'cost',
        category: words.acuteCare,
        type: 'start',
        formula: 'c_acute',
      },
      {
        id: 'option',
        label: words.option,
        measure: 'cost',
        category: words.option,
        strategies: ['new'],
        type: 'start',
        formula: 'c_option',
      },
      carePayoff(words, { chronic: 'c_chronic' }),
      qalyPayoff(words, { recovered: 'u_recovered', chronic: 'u_chronic' }),
    ],
  });
}

function placeholders(words: TemplateWords): Parameter[] {
  const make = new Placeholders(words);
  return [
    make.share('p_die_acute', words.chanceDyingAcute, 0.2),
    make.share('p_chronic', words.chanceChronicAfterAcute, 0.3),
    make.ratio('rr_acute', words.effectOnAcuteDeath, 0.8),
    make.chance('p_die_recovered', words.chanceDyingRecovered, 0.02),
    make.chance('p_die_chronic', words.chanceDyingChronic, 0.1),
    make.costOnce('c_acute', words.costAcute, 1_000),
    make.costOnce('c_option', words.costOption, 200),
    make.costPerYear('c_chronic', words.costCareChronic, 200),
    make.utility('u_recovered', words.utilityRecovered, 0.9),
    make.utility('u_chronic', words.utilityChronic, 0.6),
  ];
}
