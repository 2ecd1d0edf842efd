/** Words of editing evidence and model. */
export const modelling = {
  formulaField: {
    suggestions: 'Names and functions',
    count_one: '{{count}} suggestion; arrow keys to choose, Enter to take',
    count_other: '{{count}} suggestions; arrow keys to choose, Enter to take',
    what: {
      parameter: 'parameter',
      variable: 'variable',
      table: 'table',
      covariate: 'covariate',
      clock: 'clock',
      function: 'function',
      word: 'word of the language',
    },
  },
};
