/** Mots de la page imprimée, et de l'étape où elle se fait. */
import type { brief as english } from './brief-en.ts';
import type { Words } from './words.ts';

export const brief: Pick<Words, keyof typeof english> = {
  brief: {
    step: 'Synthèse',
    title: 'Une page pour décider',
    lead: 'Rédigée d’après le modèle tel qu’il est, au seuil où se tient le poids. Imprimez-la, ou enregistrez-la en PDF depuis la fenêtre d’impression.',
    language: 'Langue de la page',
    paper: 'Papier',
    letter: 'Lettre (États-Unis)',
    draftedBy: 'Rédigé par',
    print: 'Imprimer la page',
    sheet: 'La page telle qu’elle s’imprime',
    provisional: 'Provisoire',
    waiting: 'Rédaction de la page…',
    tooLong:
      'La page est trop pleine pour tenir sur une feuille. Raccourcissez ci-dessous les phrases les plus longues, ou l’énoncé de la question.',
    refused: 'Il n’y a pas de page à imprimer',
    edit: {
      title: 'Les phrases, telles que rédigées ou dans vos mots',
      body: 'Ce que vous écrivez remplace sur la page la phrase proposée. Quand le modèle change, la page est marquée provisoire jusqu’à ce que vous ayez revu vos phrases.',
      readOnly:
        'Cette évaluation ne peut pas être modifiée ici\u00A0: les phrases restent telles que proposées.',
      field: 'Phrase {{number}} de «\u00A0{{part}}\u00A0»',
      again: 'Reprendre la phrase proposée',
      stands: 'Elle tient toujours',
      stale: 'Écrite pour un modèle antérieur. La phrase proposée dit maintenant\u00A0: {{draft}}',
      label: 'Phrase de la synthèse',
    },
    standing: {
      errors_one:
        'Le modèle contient {{count}} erreur\u00A0: corrigez-la d’abord, la page pourra ensuite être imprimée.',
      errors_other:
        'Le modèle contient {{count}} erreurs\u00A0: corrigez-les d’abord, la page pourra ensuite être imprimée.',
      noBase: 'Le cas de base n’a pas été calculé.',
      baseOfOther: 'Les nombres sont ceux d’un modèle antérieur.',
      noDraws: 'Les tirages ne sont pas faits\u00A0: on ne sait pas encore à quel point c’est sûr.',
      drawsOfOther: 'Les tirages sont ceux d’un modèle antérieur.',
      otherEngine: 'Les nombres viennent d’une autre version du moteur de calcul.',
      writtenForOther: 'Une phrase a été écrite pour un modèle antérieur.',
    },
    head: {
      brief: 'Synthèse pour une décision',
      version: 'du {{date}}, version {{version}}',
      for: 'Pour qui\u00A0: {{population}}. Où\u00A0: {{setting}}.',
      invented: 'Données inventées',
    },
    parts: {
      answer: 'La réponse',
      options:
        'Les options, par personne, par ordre de coût\u00A0; chacune est pesée contre la précédente qui vaut la peine',
      howSure: 'En est-on sûr\u00A0?',
      whatWouldChange: 'Ce qui changerait la réponse',
      research: 'Faut-il plus de recherche\u00A0?',
      restsOn: 'Sur quoi elle repose',
      reasons: 'Les motifs du comité',
      reasonsFor: 'Recommandation, conditions, avis contraires, date de réexamen',
    },
    table: {
      option: 'Choix possible',
      cost: 'Coût, {{symbol}}',
      icer: 'Coût d’une unité de santé de plus, {{symbol}}',
      best: 'Chances d’être le meilleur choix',
      comparator: 'comparateur',
      noIcer: {
        reference: 'point de départ',
        dominated: 'pas mieux que «\u00A0{{because}}\u00A0», et pas moins cher',
        extendedlyDominated: 'vaut moins qu’un mélange de {{because}}',
        tied: 'comme «\u00A0{{because}}\u00A0»',
        beyondNumbers: 'trop grand pour être dit',
      },
    },
    gloss: {
      qaly: 'QALY\u00A0: année de vie ajustée sur la qualité, soit une année en pleine santé.',
      daly: 'DALY\u00A0: année de vie ajustée sur l’incapacité, soit une année de vie en bonne santé perdue.',
      lifeYears: 'Année de vie\u00A0: une année vécue, quelle que soit la santé.',
    },
    beam: {
      alt: 'Balance\u00A0: {{strategy}} contre {{against}}, à {{threshold}}.',
      tipsToPoise:
        'À {{threshold}}, «\u00A0{{strategy}}\u00A0» l’emporte sur «\u00A0{{against}}\u00A0».',
      tipsToHook:
        'À {{threshold}}, «\u00A0{{strategy}}\u00A0» ne l’emporte pas sur «\u00A0{{against}}\u00A0».',
      level: 'À {{threshold}}, «\u00A0{{strategy}}\u00A0» et «\u00A0{{against}}\u00A0» se valent.',
      cannotLevel:
        '«\u00A0{{strategy}}\u00A0» coûte plus que «\u00A0{{against}}\u00A0» sans apporter plus de santé.',
      alwaysTipsToPoise:
        '«\u00A0{{strategy}}\u00A0» fait économiser et gagner de la santé par rapport à «\u00A0{{against}}\u00A0».',
      noDifference:
        '«\u00A0{{strategy}}\u00A0» et «\u00A0{{against}}\u00A0» coûtent et apportent autant.',
    },
    foot: {
      document: 'Modèle {{digest}}',
      results: 'Résultats {{digest}}',
      engine: 'moteur {{version}}',
      check:
        'Le carré contient les deux empreintes en entier\u00A0: qui a le fichier du modèle peut vérifier que c’est bien celui-ci et qu’il donne ces nombres.',
      threshold: 'Seuil\u00A0: {{threshold}} ({{label}}).',
      thresholdFree: 'Seuil\u00A0: {{threshold}}, choisi pour cette page.',
      source: 'Source\u00A0: {{source}}.',
    },
    value: {
      about: '{{count}} sur {{of}}',
      below: 'moins de {{count}} sur {{of}}',
      above: 'plus de {{count}} sur {{of}}',
      health: '{{amount}}\u00A0{{unit}}',
      and: ' et ',
      more_one: '{{count}} autre',
      more_other: '{{count}} autres',
      start: 'au début du cycle',
      end: 'à la fin du cycle',
      trapezoid: 'avec correction de demi-cycle (trapèze)',
      simpson: 'avec correction de demi-cycle (règle de Simpson 1/3)',
      byYear: 'un taux pour chaque année',
    },
    sentences: {
      caution:
        'Cette page aide à la délibération de personnes formées\u00A0; elle ne donne aucun avis clinique. Les recommandations nationales, les règles locales et la pratique autorisée passent d’abord. Faites relire le modèle avant qu’une décision ne s’y appuie.',
      answer: {
        onlyStrategy: '{{strategy}}\u00A0: le seul choix étudié.',
        bestEverywhere:
          '{{strategy}}\u00A0: le meilleur choix à {{inForce}}, et quel que soit le prix accepté.',
        worthAbove:
          '{{strategy}}\u00A0: le meilleur choix à {{inForce}}, et partout où l’on accepte de payer {{threshold}} ou plus.',
        worthBelow:
          '{{strategy}}\u00A0: le meilleur choix à {{inForce}}, et partout où l’on n’accepte pas de payer plus de {{threshold}}.',
        worthBetween:
          '{{strategy}}\u00A0: le meilleur choix à {{inForce}}, et partout où l’on accepte de payer de {{from}} à {{to}}.',
        neverBest: '{{strategy}}\u00A0: le meilleur choix à {{inForce}}, mais de presque rien.',
        tied: 'Aussi bien\u00A0: {{others}}.',
        against: {
          noDifference:
            'Pour {{people}} personnes suivies pendant {{years}}, «\u00A0{{strategy}}\u00A0» coûte et apporte autant que «\u00A0{{comparator}}\u00A0».',
          dominates:
            'Pour {{people}} personnes suivies pendant {{years}}, «\u00A0{{strategy}}\u00A0» coûte {{cost}} de moins que «\u00A0{{comparator}}\u00A0», avec {{health}}.',
          dominated:
            'Pour {{people}} personnes suivies pendant {{years}}, «\u00A0{{strategy}}\u00A0» coûte {{cost}} de plus que «\u00A0{{comparator}}\u00A0», avec {{health}}.',
          moreCostlyMoreEffective:
            'Pour {{people}} personnes suivies pendant {{years}}, «\u00A0{{strategy}}\u00A0» coûte {{cost}} de plus que «\u00A0{{comparator}}\u00A0», pour {{health}}.',
          lessCostlyLessEffective:
            'Pour {{people}} personnes suivies pendant {{years}}, «\u00A0{{strategy}}\u00A0» coûte {{cost}} de moins que «\u00A0{{comparator}}\u00A0», avec {{health}}.',
        },
      },
      sure: {
        noDraws:
          'On n’a pas évalué à quel point c’est sûr\u00A0: l’analyse ne demande aucun tirage.',
        best: 'À {{threshold}}, «\u00A0{{strategy}}\u00A0» est le meilleur choix dans {{frequency}} cas plausibles ({{samples}} ont été tirés de ce qui est incertain).',
        next: 'Sinon, c’est le plus souvent «\u00A0{{strategy}}\u00A0», dans {{frequency}}.',
        onMean:
          'En moyenne sur ces cas, toutefois, c’est «\u00A0{{strategy}}\u00A0» qui arrive en tête.',
      },
      research: {
        none: 'Aucun de ces cas ne changerait la réponse\u00A0: pour cette décision, plus de recherche sur les données ne vaut rien.',
        perPerson:
          'Tout savoir avant de décider (EVPI) vaudrait au plus {{perPerson}} par personne, à {{threshold}}. Une étude plus chère ne vaut pas son prix.',
        population:
          'Tout savoir avant de décider (EVPI) vaudrait au plus {{population}} sur {{years}}\u00A0: {{perPerson}} par personne, à {{threshold}}. Une étude plus chère ne vaut pas son prix. Personnes comptées\u00A0: {{people}}.',
      },
      change: {
        below: 'Au-dessous de {{threshold}}, le meilleur choix est «\u00A0{{strategy}}\u00A0».',
        above: 'Au-dessus de {{threshold}}, le meilleur choix est «\u00A0{{strategy}}\u00A0».',
        noThreshold: 'Aucun autre seuil ne la changerait.',
        profiles_one:
          'Pour {{count}} des {{of}} groupes de personnes ({{profiles}}), le meilleur choix serait «\u00A0{{strategy}}\u00A0».',
        profiles_other:
          'Pour {{count}} des {{of}} groupes de personnes ({{profiles}}), le meilleur choix serait «\u00A0{{strategy}}\u00A0».',
        sameForAll: 'Elle est la même pour chacun des {{count}} groupes de personnes.',
      },
      rests: {
        inputs_one: '{{count}} donnée, dont {{details}}',
        inputs_other: '{{count}} données, dont {{details}}',
        uncertain_one: '{{count}} incertaine',
        uncertain_other: '{{count}} incertaines',
        weak: '{{count}} de faible qualité',
        notGraded: '{{count}} de qualité non évaluée',
        invented_one: '{{count}} inventée',
        invented_other: '{{count}} inventées',
        discounting: 'Taux d’actualisation par an\u00A0: coûts {{costs}}, santé {{outcomes}}',
        noDiscounting: 'Ni les coûts ni la santé ne sont actualisés',
        counting: 'Décompte {{method}}',
        horizon: 'Personnes suivies pendant {{years}}, en {{cycles}} cycles',
        survivors: 'En vie à la fin\u00A0: {{frequency}}\u00A0; la suite n’est pas comptée',
        perspective: 'Coûts vus par\u00A0: {{perspective}}',
        prices: 'Prix de {{year}}, monnaie {{currency}}',
        referenceCase: 'Cas de référence\u00A0: {{label}}',
      },
    },
  },
};
