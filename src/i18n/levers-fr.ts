/** Les mots du panneau des hypothèses. */
export const levers = {
  title: 'Et si…',
  titleMoved_one: 'Et si\u00A0: {{count}} levier en vigueur',
  titleMoved_other: 'Et si\u00A0: {{count}} leviers en vigueur',
  lead: 'Faites glisser une valeur dans son intervalle à 95\u00A0%, ou un réglage, et voyez l’effet sur la réponse. Le modèle reste tel quel. Une valeur fixée ici compte comme choisie, et non plus comme incertaine.',
  choose: 'Ajouter un levier',
  none: 'Choisir un paramètre ou un réglage',
  settingsGroup: 'Réglages',
  parametersGroup: 'Paramètres incertains',
  scenario: 'Partir d’un scénario',
  noScenario: 'Choisir un scénario',
  years: 'ans',
  settings: {
    discountCosts: 'Taux d’actualisation des coûts',
    discountOutcomes: 'Taux d’actualisation des résultats',
    horizon: 'Horizon temporel',
    counting: 'Décompte dans un cycle',
  },
  dropOne: 'Retirer',
  dropNamed: 'Retirer le levier {{what}}',
  drop: 'Retirer tous les leviers',
  name: 'Nom du scénario',
  suggested: 'Et si\u00A0: {{names}}',
  keep: 'Garder comme scénario',
  keepLabel: 'Garder le scénario {{label}}',
  kept: 'Gardé dans le modèle comme scénario «\u00A0{{label}}\u00A0».',
  inForce_one:
    'Et si\u00A0: {{count}} levier est en vigueur\u00A0; les nombres ne sont pas ceux du modèle.',
  inForce_other:
    'Et si\u00A0: {{count}} leviers sont en vigueur\u00A0; les nombres ne sont pas ceux du modèle.',
  reason: 'Fixé par un levier',
  wasLevel: 'Sans le dernier changement, l’équilibre était à {{threshold}}.',
};
