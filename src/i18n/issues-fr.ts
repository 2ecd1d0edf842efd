/** What each issue code of shared/ says, in French. */
export const issues = {
  unknown: 'Quelque chose ne va pas, que cette version ne sait pas nommer ({{code}}).',
  analysis: {
    notFinite:
      'La valeur «\u00A0{{quantity}}\u00A0» de {{strategy}} n’est pas un nombre\u00A0: rien ne peut être comparé.',
    noDraws: 'Il n’y a aucun tirage d’où conclure.',
    drawsMissing: 'Des tirages manquent à partir du tirage {{draw}}.',
    drawNotFinite:
      'La valeur «\u00A0{{quantity}}\u00A0» de {{strategy}} n’est pas un nombre au tirage {{draw}}.',
  },
  distribution: {
    noGroup: '{{parameter}} est tiré avec le groupe {{group}}, qui n’existe pas.',
    empty: '{{parameter}} est tiré d’une liste vide.',
    infinite: 'Certains tirages de {{parameter}} seraient infinis.',
    limits: 'Les bornes de {{parameter}} ne croissent pas\u00A0: de {{low}} à {{high}}.',
    notFinite: '{{name}} de {{parameter}} n’est pas un nombre fini.',
    notPositive: '{{name}} de {{parameter}} vaut {{value}}\u00A0; il faut plus de 0.',
    outsideKind:
      'Des tirages de {{parameter}} peuvent sortir de ce que peut être une grandeur du genre «\u00A0{{kind}}\u00A0».',
    unusualForKind:
      '{{parameter}}\u00A0: {{distribution}} est une distribution inhabituelle pour le genre «\u00A0{{kind}}\u00A0».',
    valueFar:
      'La valeur de base {{value}} de {{parameter}} est hors de l’intervalle à 95 % de ses tirages ({{low}} à {{high}}).',
    valueOutside:
      'La valeur de base {{value}} de {{parameter}} ne peut jamais être tirée ({{low}} à {{high}}).',
  },
  document: {
    badVersion: 'La version du format doit être un nombre entier à partir de 1.',
    brokenText: 'Un texte contient la moitié d’un caractère\u00A0: il a sans doute été coupé.',
    hostileKey: 'Le nom {{key}} est interdit\u00A0: il toucherait au programme lui-même.',
    hostileName: '{{got}} ne peut pas servir de nom.',
    invalid: '{{got}} n’est pas valable ici.',
    invalidFormat:
      '{{got}} n’est pas écrit comme il faut ici\u00A0: lettres, chiffres et _ seulement.',
    invalidKey: '{{key}} ne peut pas être un nom ici.',
    invalidType: 'Le type attendu est {{expected}}\u00A0; celui trouvé est {{got}}.',
    invalidValue: '{{got}} ne figure pas parmi les valeurs permises\u00A0: {{allowed}}.',
    missing: 'Il manque quelque chose ici\u00A0: {{expected}}.',
    moreIssues: 'Il y en a d’autres\u00A0: seuls les {{shown}} premiers sont indiqués.',
    newerFormat:
      'Le fichier est au format {{got}}\u00A0; ce Steelyard lit jusqu’au format {{known}}. Mettez Steelyard à jour, puis rouvrez le fichier.',
    notAbove: 'La valeur doit être supérieure à {{minimum}}.',
    notBelow: 'La valeur doit être inférieure à {{maximum}}.',
    notJson:
      'Ce n’est pas un fichier JSON complet\u00A0: il s’interrompt ou contient un caractère égaré à la ligne {{line}}, colonne {{column}}.',
    notObject: 'Un modèle est un objet JSON\u00A0; ceci est de type {{got}}.',
    notPlain: 'Une valeur de type {{got}} ne peut pas faire partie d’un modèle.',
    numberNotFinite: 'Un nombre est infini ou n’en est pas un.',
    olderFormat:
      'Le fichier est au format {{got}}, qui ne peut plus être amené au format {{known}}.',
    textTooLong: 'Le texte dépasse {{maximum}} caractères.',
    textTooShort: 'Le texte a moins de {{minimum}} caractères.',
    tooBig: 'La valeur doit être au plus {{maximum}}.',
    tooDeep: 'Listes et objets sont emboîtés sur plus de {{maximum}} niveaux.',
    tooFewItems: 'La liste doit compter au moins {{minimum}} éléments.',
    tooLarge: 'Le fichier dépasse {{maximum}} octets, le plus qui soit lu.',
    tooManyItems: 'La liste peut compter au plus {{maximum}} éléments.',
    tooManyKeys: 'Un objet contient plus de {{maximum}} entrées.',
    tooManyValues: 'Le fichier contient plus de {{maximum}} valeurs.',
    tooMuchWork:
      'Le modèle est trop grand\u00A0: {{work}} pas, pour {{maximum}} au plus. Réduisez les cycles, les états ou les profils.',
    tooSmall: 'La valeur doit être au moins {{minimum}}.',
    wrongFormat:
      'Ce n’est pas un modèle Steelyard\u00A0: son «\u00A0format\u00A0» devrait être {{expected}}.',
  },
  edit: {
    badValue: 'Cette valeur ne peut pas être placée ici.',
    hostileKey: 'Le nom {{key}} est interdit : il touche au programme lui-même.',
    idFixed: '{{id}} garde son identifiant.',
    idNotUnique: 'Plusieurs éléments s’appellent {{id}} : la liste est à corriger en entier.',
    idTaken: 'Un élément s’appelle déjà {{id}}.',
    noSuchItem: '{{id}} n’existe plus : il a sans doute été supprimé ailleurs.',
    noSuchPlace: 'L’endroit à modifier n’existe plus.',
    notAField: 'Ceci ne peut pas rester vide.',
  },
  formula: {
    badNumber: '{{text}} n’est pas un nombre.',
    chainedComparison: 'Deux comparaisons à la suite\u00A0: reliez-les par «\u00A0and\u00A0».',
    constantOutsideRange: '{{value}} ne peut pas être une valeur du genre «\u00A0{{kind}}\u00A0».',
    cycle: 'Des noms se définissent en cercle\u00A0: {{cycle}}.',
    cycleCostPerYear: 'Un coût par cycle figure là où l’on attend un coût par an.',
    decimalComma: '{{text}}\u00A0: écrivez les décimales avec un point.',
    disabilityAsUtility:
      'Un poids d’incapacité figure là où l’on attend une utilité\u00A0: l’utilité compte la santé, l’incapacité sa perte.',
    empty: 'La formule est vide.',
    functionWithoutBrackets: '{{name}} est une fonction\u00A0: il lui faut des parenthèses.',
    incomplete: 'La formule s’interrompt après {{after}}.',
    kindMismatch:
      'Une grandeur du genre «\u00A0{{got}}\u00A0» figure là où l’on attend «\u00A0{{wanted}}\u00A0».',
    lookupNeedsTable: 'lookup prend d’abord le nom d’une table.',
    misplacedNot: '«\u00A0not\u00A0» ne peut pas se trouver ici.',
    missingForStrategy: 'Il n’y a pas de formule pour la stratégie {{strategy}}.',
    mixedFlows:
      'On additionne deux genres de montants\u00A0: «\u00A0{{left}}\u00A0» et «\u00A0{{right}}\u00A0».',
    mixedKinds:
      'Des grandeurs qui ne s’additionnent ni ne se comparent\u00A0: «\u00A0{{left}}\u00A0» et «\u00A0{{right}}\u00A0».',
    noStartAge: '«\u00A0age\u00A0» demande une covariable start_age dans chaque profil.',
    noTimeInState: '«\u00A0time_in_state\u00A0» n’a de sens que pour un état qui connaît sa durée.',
    notAFunction: '{{name}} n’est pas une fonction.',
    notAnOutcome:
      'Une grandeur du genre «\u00A0{{got}}\u00A0» ne peut pas être comptée comme résultat de santé.',
    numberTooLarge: '{{text}} est un nombre trop grand.',
    operatorExpected: 'Il manque ici un opérateur tel que + ou *.',
    probabilityAsRate:
      'Une probabilité figure là où l’on attend un taux\u00A0: convertissez-la avec hazard().',
    rateAsProbability:
      'Un taux figure là où l’on attend une probabilité\u00A0: convertissez-le avec chance().',
    strayCharacter: 'Un caractère qui ne veut rien dire dans une formule.',
    syntax: 'La formule ne peut pas être lue.',
    tableWithoutLookup: '{{name}} est une table\u00A0: lisez-la avec lookup().',
    tooDeep: 'La formule est emboîtée sur plus de {{limit}} niveaux.',
    tooDeepTogether:
      'Les définitions s’appuient les unes sur les autres sur plus de {{maximum}} niveaux.',
    tooMuchText: 'Toutes les formules ensemble dépassent {{limit}} caractères.',
    tooMuchWork:
      'Les variables s’appuient les unes sur les autres de trop de façons pour être vérifiées.',
    tooLarge: 'La formule a plus de {{limit}} éléments.',
    tooLong: 'La formule dépasse {{limit}} caractères.',
    unclosedBracket: 'Une parenthèse est ouverte et jamais fermée.',
    unknownFunction: 'Il n’y a pas de fonction {{name}}.',
    unknownName: 'Rien ne s’appelle {{name}}.',
    unopenedBracket: 'Une parenthèse est fermée sans avoir été ouverte.',
    unused: '{{symbol}} n’est jamais utilisé.',
    utilityAsDisability:
      'Une utilité figure là où l’on attend un poids d’incapacité\u00A0: l’utilité compte la santé, l’incapacité sa perte.',
    valueExpected: 'Il manque ici un nombre ou un nom.',
    wrongArgumentCount: '{{name}} a reçu {{got}} valeurs, ce qui n’est pas le bon nombre.',
    wrongKeyCount: 'La table {{table}} prend {{wanted}} clés\u00A0; elle en a reçu {{got}}.',
    yearlyCostPerCycle: 'Un coût par an est payé à chaque cycle.',
    yearlyWeightPerCycle: 'Un poids pour un an est compté à chaque cycle.',
  },
  group: {
    kind: '{{parameter}}, dans le groupe de Dirichlet {{group}}, n’est pas une probabilité.',
    memberFixed: '{{parameter}} est fixe et ne peut être corrélé dans le groupe {{group}}.',
    memberInTwo: '{{parameter}} figure dans deux groupes\u00A0: {{other}} et {{group}}.',
    notCorrelation:
      'Les corrélations du groupe {{group}} doivent aller de −1 à 1, avec 1 sur la diagonale.',
    notFinite: 'Le groupe {{group}} contient un nombre qui n’est pas fini.',
    notPointing: '{{parameter}} figure dans le groupe {{group}} mais n’y est pas tiré.',
    notPositive: 'Les effectifs du groupe {{group}} doivent dépasser 0.',
    notPositiveDefinite:
      'La matrice du groupe {{group}} n’est pas définie positive\u00A0: aucune distribution ne l’admet.',
    notSymmetric: 'La matrice du groupe {{group}} n’est pas symétrique.',
    ownDistribution:
      '{{parameter}} a besoin de sa propre distribution pour être classé dans le groupe {{group}}.',
    repeatedMember: '{{parameter}} figure deux fois dans le groupe {{group}}.',
    size: '{{name}} du groupe {{group}} devrait compter {{want}} éléments, un par membre\u00A0; il y en a {{got}}.',
    unknownMember: 'Le groupe {{group}} mentionne {{parameter}}, qui n’existe pas.',
    valuesSum:
      'Les valeurs de base des probabilités de {{group}} ont pour somme {{sum}}, et non 1.',
  },
  groups: {
    doesNotListMember: '{{parameter}} dit appartenir au groupe {{group}}, qui ne le mentionne pas.',
    memberNeedsOwnDistribution:
      '{{parameter}} a besoin de sa propre distribution dans le groupe {{group}}.',
    memberNotInGroup: '{{parameter}} figure dans le groupe {{group}} mais ne le dit pas.',
    memberTwice: '{{id}} figure deux fois.',
    notCorrelation:
      '{{value}} n’est pas une corrélation\u00A0: elle doit aller de −1 à 1, avec 1 sur la diagonale.',
    notSymmetric:
      'La matrice diffère d’un côté à l’autre de sa diagonale (ligne {{row}}, colonne {{column}}).',
    unknown: 'Il n’y a pas de groupe {{id}}.',
    valuesDoNotSum: 'Les valeurs du groupe {{group}} ont pour somme {{sum}}, et non 1.',
    wrongLength: 'La liste devrait compter {{expected}} éléments\u00A0; elle en compte {{got}}.',
  },
  ids: {
    duplicate: 'L’identifiant {{id}} sert deux fois.',
  },
  movements: {
    absorbingHasRow: '{{state}} est absorbant\u00A0: personne n’en sort.',
    destinationTwice: '{{state}} est donné deux fois comme destination.',
    missingRow: 'Rien ne dit où vont les personnes en {{state}} sous {{strategy}}.',
    overlappingRows: 'Deux lignes disent où vont les personnes en {{state}} sous {{strategy}}.',
    rateToSelf: 'Un taux ne peut pas mener de {{state}} à lui-même.',
    referenceIsCell: 'La référence {{state}} a une formule à elle.',
    remainderIsCell: 'Le reste {{state}} a une formule à lui.',
    stateInTwoCurves: '{{state}} a deux courbes.',
    stateWithoutCurve: '{{state}} n’a pas de courbe.',
    timedUnderCurves: '{{state}} ne peut pas suivre sa durée dans un modèle à courbes de survie.',
  },
  names: {
    duplicate: 'Le nom {{symbol}} sert deux fois.',
    reserved: 'Le nom {{symbol}} est pris par le langage des formules.',
  },
  parameters: {
    unknown: 'Il n’y a pas de paramètre {{id}}.',
  },
  payoffs: {
    afterHorizon:
      'Ceci tombe au cycle {{cycle}}, après le dernier des {{cycles}}\u00A0: ce n’est jamais compté.',
    movementNeedsRows: '{{payoff}} compte des passages, que n’a pas un modèle à courbes de survie.',
    movementToSelf: 'Rester en {{state}} n’est pas un passage.',
    stateTwice: '{{state}} a deux montants.',
  },
  profiles: {
    missingCovariate: 'Le profil n’a pas de valeur pour {{covariate}}.',
    sharesDoNotSum: 'Les parts des profils ont pour somme {{sum}}, et non 1.',
    unknownCovariate: 'Il n’y a pas de covariable {{covariate}}.',
  },
  question: {
    cyclesRounded: 'L’horizon dure {{exact}} cycles\u00A0: {{cycles}} sont simulés.',
    simpsonNeedsEvenCycles:
      'La règle de Simpson demande un nombre pair de cycles\u00A0; il y en a {{cycles}}.',
    tooManyCycles: '{{cycles}} cycles, c’est trop\u00A0: {{maximum}} au plus.',
    unknownThreshold: 'Il n’y a pas de seuil {{id}}.',
  },
  run: {
    brokeDown:
      'Le calcul s’est interrompu. Modifiez quelque chose pour réessayer\u00A0; fermez d’autres onglets si la mémoire manque.',
    curveOutside:
      'Une courbe de survie sort de 0 à 1\u00A0: {{value}} au cycle {{cycle}}, stratégie {{strategy}}, profil {{profile}} ({{count}} fois, d’abord au tirage {{draw}}).',
    curvesCross:
      'Des courbes de survie se croisent au cycle {{cycle}}, stratégie {{strategy}}, profil {{profile}} ({{count}} fois, d’abord au tirage {{draw}}).',
    logOddsOutside:
      'Un logit n’est pas un nombre au cycle {{cycle}}, stratégie {{strategy}}, profil {{profile}} ({{count}} fois, d’abord au tirage {{draw}}).',
    notFinite: 'Les totaux de {{strategy}} ne sont pas des nombres.',
    probabilityOutside:
      'Une probabilité sort de 0 à 1\u00A0: {{value}} au cycle {{cycle}}, stratégie {{strategy}}, profil {{profile}} ({{count}} fois, d’abord au tirage {{draw}}).',
    rateOutside:
      'Un taux est négatif\u00A0: {{value}} au cycle {{cycle}}, stratégie {{strategy}}, profil {{profile}} ({{count}} fois, d’abord au tirage {{draw}}).',
    remainderOutside:
      'Ce qui revient au reste est {{value}}, hors de 0 à 1, au cycle {{cycle}}, stratégie {{strategy}}, profil {{profile}} ({{count}} fois, d’abord au tirage {{draw}}).',
    startOutside:
      'Une part au départ sort de 0 à 1\u00A0: {{value}}, stratégie {{strategy}}, profil {{profile}} ({{count}} fois, d’abord au tirage {{draw}}).',
    startRemainderOutside:
      'Ce que laissent les parts au départ est {{value}}, hors de 0 à 1, stratégie {{strategy}}, profil {{profile}} ({{count}} fois, d’abord au tirage {{draw}}).',
  },
  scenarios: {
    badSetting: '{{got}} n’est pas une valeur du réglage {{setting}}.',
    overriddenTwice: '{{target}} est modifié deux fois.',
    unknown: 'Il n’y a pas de scénario {{id}}.',
  },
  start: {
    stateTwice: '{{state}} a deux parts au départ.',
  },
  states: {
    cyclesNotUsed:
      '{{state}} a un nombre de cycles inutilisé\u00A0: cet état ne suit pas sa durée.',
    timedNeedsCycles: '{{state}} suit sa durée\u00A0: dites pendant combien de cycles.',
    tooMany: 'Avec les durées il y a {{count}} états\u00A0: {{maximum}} au plus.',
    unknown: 'Il n’y a pas d’état {{id}}.',
  },
  strategies: {
    listedTwice: 'La stratégie {{id}} figure deux fois.',
    noneListed: 'La liste des stratégies est vide\u00A0: omettez-la pour les désigner toutes.',
    unknown: 'Il n’y a pas de stratégie {{id}}.',
  },
  tables: {
    keysNotRising: 'Les points d’une clé doivent croître\u00A0: {{got}} suit {{before}}.',
    wrongSize: 'La table devrait contenir {{expected}} valeurs\u00A0; elle en contient {{got}}.',
  },
  values: {
    drawsOutsideKind:
      'Des tirages de cette distribution ({{distribution}}) peuvent sortir de ce que permet le genre «\u00A0{{kind}}\u00A0».',
    outsideKind: '{{value}} n’est pas une valeur que le genre «\u00A0{{kind}}\u00A0» peut prendre.',
  },
  variables: {
    unknown: 'Il n’y a pas de variable {{id}}.',
  },
};
