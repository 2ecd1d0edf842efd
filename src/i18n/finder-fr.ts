/** Mots de la recherche. */
import type { Words } from './words.ts';

export const finder: Words['finder'] = {
  open: 'Chercher',
  title: 'Chercher une étape, un paramètre, une action…',
  field: 'Que cherchez-vous\u00A0?',
  found_one: '{{count}} trouvé',
  found_other: '{{count}} trouvés',
  first: 'Les {{shown}} premiers sur {{count}}\u00A0: écrivez davantage pour préciser.',
  none: 'Rien ne porte ce nom. Essayez moins de lettres, ou un symbole employé dans les formules.',
  kinds: {
    step: 'Étape',
    parameter: 'Paramètre',
    state: 'État',
    variable: 'Variable',
    strategy: 'Stratégie',
    action: 'Action',
  },
  acts: {
    print: 'Imprimer la synthèse',
    language: 'Langue\u00A0: {{language}}',
    theme: 'Thème\u00A0: {{theme}}',
  },
};
