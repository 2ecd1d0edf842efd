/** Words of the finder. */
export const finder = {
  open: 'Find',
  title: 'Find a step, a parameter, an action…',
  field: 'What are you looking for?',
  found_one: '{{count}} found',
  found_other: '{{count}} found',
  first: 'The first {{shown}} of {{count}}: write more to narrow them down.',
  none: 'Nothing has that name. Try fewer letters, or a symbol used in formulas.',
  kinds: {
    step: 'Step',
    parameter: 'Parameter',
    state: 'State',
    variable: 'Variable',
    strategy: 'Strategy',
    action: 'Action',
  },
  acts: {
    print: 'Print the brief',
    language: 'Language: {{language}}',
    theme: 'Theme: {{theme}}',
  },
};
