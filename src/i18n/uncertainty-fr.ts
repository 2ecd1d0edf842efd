/** Les mots de l’étape Incertitude. */
export const uncertainty = {
  title: 'Jusqu’où peut-on être sûr\u00A0?',
  finding: '{{strategy}} est la meilleure dans {{share}} des tirages à {{threshold}}',
  waiting: 'Les graphiques viennent quand les tirages sont faits.',
  none: 'L’analyse ne demande aucun tirage\u00A0: il n’y a rien à dire de l’incertitude.',
  alone: 'Avec une seule stratégie, il n’y a pas de décision dont douter.',
  made_one:
    'D’après {{count}} tirage de tous les paramètres incertains ensemble (graine {{seed}}).',
  made_other:
    'D’après {{count, number}} tirages de tous les paramètres incertains ensemble (graine {{seed}}).',
  plane: {
    title: '{{strategy}}\u00A0: {{words}} dans {{share}} des tirages',
    northEast: 'gagne de la santé et coûte plus',
    southEast: 'gagne de la santé et économise de l’argent',
    southWest: 'perd de la santé et économise de l’argent',
    northWest: 'perd de la santé et coûte plus',
    onAxis: 'ne change rien au coût ou à la santé',
    xTitle: '{{unit}}, contre {{comparator}}',
    yTitle: 'Coût de plus que {{comparator}}, {{symbol}}',
    shares: '{{strategy}}\u00A0: {{list}}.',
    part: '{{share}} {{words}}',
    note: 'Chaque point est un tirage\u00A0; les marques sont les moyennes. Sous la ligne, un tirage vaut son coût à {{threshold}}.',
    draw: 'Tirage',
    cost: '{{strategy}}\u00A0: coût de plus, {{symbol}}',
    health: '{{strategy}}\u00A0: {{unit}}',
  },
  acceptability: {
    title: '{{strategy}} a la plus grande chance d’être la meilleure, {{share}}, à {{threshold}}',
    yTitle: 'Probabilité d’être la meilleure',
    xTitle: 'Seuil, {{symbol}} par {{unit}}',
    note: 'La ligne épaisse est la frontière d’acceptabilité\u00A0: la probabilité que la stratégie au plus grand bénéfice net moyen soit la meilleure.',
    frontier: 'Frontière d’acceptabilité',
    threshold: 'Seuil',
    onFrontier: 'Sur la frontière',
  },
  loss: {
    title: '{{strategy}} a la plus petite perte attendue, {{amount}} par personne, à {{threshold}}',
    yTitle: 'Perte attendue par personne, {{symbol}}',
    note: 'Ce à quoi on renonce en moyenne en choisissant une stratégie quand une autre s’avère la meilleure. La ligne la plus basse est la valeur de l’information parfaite.',
  },
  evpi: {
    title: 'L’information parfaite vaut {{amount}} par personne à {{threshold}}',
    titlePopulation:
      'L’information parfaite vaut {{amount}} par personne à {{threshold}}, {{population}} pour toutes les personnes concernées',
    line: 'EVPI par personne',
    error: 'Erreur type de Monte-Carlo',
    yTitle: 'EVPI par personne, {{symbol}}',
    population: 'EVPI pour toutes les personnes concernées, {{symbol}}',
    note: 'Aucune étude ne peut valoir plus. La bande va de deux erreurs types de Monte-Carlo de chaque côté.',
  },
  running: {
    title:
      'Après tous les tirages, le bénéfice net moyen de {{strategy}} est connu à ± {{error}} près',
    titleOne: 'Un seul tirage ne dit rien de la sûreté d’une moyenne',
    yTitle: 'Bénéfice net moyen contre {{comparator}}, {{symbol}}',
    xTitle: 'Tirages',
    mean: '{{strategy}}\u00A0: moyenne, {{symbol}}',
    error: '{{strategy}}\u00A0: erreur type, {{symbol}}',
    note: 'Les bandes vont de deux erreurs types de Monte-Carlo de chaque côté. Une moyenne qui dérive encore demande plus de tirages.',
  },
  draws: {
    title_one: 'Le tirage lui-même',
    title_other: 'Les {{count, number}} tirages eux-mêmes',
    cost: '{{strategy}}\u00A0: coût, {{symbol}}',
    outcome: '{{strategy}}\u00A0: {{unit}}',
  },
};
