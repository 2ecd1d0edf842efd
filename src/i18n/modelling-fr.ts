import type { modelling as english } from './modelling-en.ts';
import type { Words } from './words.ts';

/** Mots de la saisie des données et du modèle. */
export const modelling: Pick<Words, keyof typeof english> = {
  formulaField: {
    suggestions: 'Noms et fonctions',
    count_one: '{{count}} proposition\u00A0; flèches pour choisir, Entrée pour prendre',
    count_other: '{{count}} propositions\u00A0; flèches pour choisir, Entrée pour prendre',
    what: {
      parameter: 'paramètre',
      variable: 'variable (formule)',
      table: 'tableau',
      covariate: 'covariable',
      clock: 'horloge',
      function: 'fonction',
      word: 'mot du langage',
    },
  },
};
