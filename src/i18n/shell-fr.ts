/** Mots de la coquille : le travail et son état, la liste, l’historique, les réglages. */
import type { shell as english } from './shell-en.ts';
import type { Words } from './words.ts';

export const shell: Pick<Words, keyof typeof english> = {
  shell: {
    cannotOpen: 'Cette évaluation n’a pas pu être ouverte',
    tryAgain: 'Réessayer',
    undo: 'Annuler',
    redo: 'Rétablir',
    undoWhat: 'Annuler\u00A0: {{what}}',
    redoWhat: 'Rétablir\u00A0: {{what}}',
    example: 'Exemple traité\u00A0: la première modification en fait une évaluation à vous',
    saved: 'Enregistré sur cet appareil',
    saving: 'Enregistrement…',
    failed: 'N’a pas pu être enregistré\u00A0: {{why}}',
    retry: 'Réessayer',
    export: 'Exporter un fichier',
    dismiss: 'Fermer',
    settings: 'Réglages',
    help: 'Aide',
    helpOnStep: 'Aide sur cette étape',
    helpFailed: 'L’aide n’a pas pu être lue sur cet appareil. Rechargez la page et réessayez.',
  },
  store: {
    full: 'Il n’y a plus de place sur cet appareil. Libérez de l’espace, ou exportez l’évaluation dans un fichier.',
    unavailable:
      'Ce navigateur ne garde rien ici, comme certaines fenêtres privées. Exportez l’évaluation dans un fichier avant de fermer la page.',
    outdated:
      'Une version plus récente de Steelyard est ouverte dans un autre onglet. Rechargez cette page.',
    deleted: 'L’évaluation a été supprimée dans un autre onglet.',
    failed:
      'Le stockage de l’appareil ne répond pas. Réessayez, ou exportez l’évaluation dans un fichier.',
  },
  connection: {
    blocked:
      'Un onglet avec une version plus ancienne de Steelyard tient le stockage\u00A0: fermez-le pour continuer.',
    outdated:
      'Un autre onglet a mis en service une version plus récente de Steelyard. Ce qui est modifié ici n’est plus gardé\u00A0: rechargez.',
    reload: 'Recharger',
  },
  draft: {
    covered:
      'Un autre onglet a modifié la même chose. Votre modification tient\u00A0: «\u00A0{{label}}\u00A0». Annuler rétablit l’autre.',
    dropped:
      'Votre modification ne convient plus et n’a pas été retenue\u00A0: «\u00A0{{label}}\u00A0».',
    unreadable_one:
      '{{count}} modification gardée sur cet appareil ne convient plus et a été laissée de côté.',
    unreadable_other:
      '{{count}} modifications gardées sur cet appareil ne conviennent plus et ont été laissées de côté.',
  },
  form: {
    required: 'Il faut écrire quelque chose ici.',
    noNumber: 'Ce n’est pas un nombre.',
    min: 'Il faut {{limit}} ou plus.',
    max: 'Il faut {{limit}} ou moins.',
    above: 'Il faut plus de {{limit}}.',
    whole: 'Il faut un nombre entier.',
  },
  own: {
    title: 'Vos évaluations',
    opened: 'Ouverte le {{time}}',
    rename: 'Renommer',
    duplicate: 'Dupliquer',
    export: 'Exporter',
    delete: 'Supprimer',
    deleted: 'Supprimée\u00A0: {{title}}.',
    copyOf: '{{title}} (copie)',
    newTitle: 'Nouveau titre',
    save: 'Renommer',
  },
  begin: {
    title: 'Commencer une évaluation à vous',
    lead: 'Un canevas est un petit modèle qui tourne aussitôt. Ses nombres sont provisoires et signalés comme tels\u00A0: à vous de les remplacer.',
    templates: {
      empty: {
        name: 'Vide',
        body: 'Commencer par la question\u00A0; le modèle a un seul état et aucun nombre encore.',
      },
      'two-state': {
        name: 'Deux états',
        body: 'Vivant et décédé, avec un effet sur la mortalité.',
      },
      progressive: {
        name: 'Trois états, progressif',
        body: 'Stable, aggravé, décédé\u00A0: une maladie qui s’aggrave.',
      },
      relapsing: {
        name: 'Rémission et rechute',
        body: 'Une maladie qui va et vient.',
      },
      screening: {
        name: 'Dépistage, avec un test au départ',
        body: 'Un court arbre de décision dit qui est trouvé, puis viennent les années qui suivent.',
      },
      'acute-chronic': {
        name: 'Aiguë, puis chronique',
        body: 'Une maladie terminée dès le premier cycle, et ce qu’elle laisse.',
      },
    },
  },
  settings: {
    look: 'Langue et apparence',
    person: 'Vous',
    work: 'Tirages',
    samples: 'Tirages d’une nouvelle évaluation',
    samplesHelp: 'L’usage est de {{number}} ou plus. Chaque évaluation garde son propre nombre.',
    workers: 'Simulateurs à l’œuvre en même temps',
    workersHelp:
      'Les résultats n’en dépendent pas. En vigueur à la prochaine ouverture de la page.',
    workersAuto_one: 'Selon l’appareil ({{count}})',
    workersAuto_other: 'Selon l’appareil ({{count}})',
    storage: 'Stockage',
    appraisals_one: '{{count}} évaluation est gardée sur cet appareil.',
    appraisals_other: '{{count}} évaluations sont gardées sur cet appareil.',
    room: '{{used}} Mo occupés sur {{all}} Mo environ.',
    kept: {
      granted: 'Le navigateur promet de garder ces données.',
      refused:
        'Le navigateur peut effacer ces données si la place vient à manquer. Exportez dans un fichier ce qui compte.',
      unknown:
        'Ce navigateur ne dit pas s’il garde les données. Exportez dans un fichier ce qui compte.',
    },
    keep: 'Garder mes données',
  },
  keys: {
    title: 'Touches du clavier',
    undo: { keys: 'Ctrl ou Cmd + Z', does: 'Annule la dernière modification' },
    redo: { keys: 'Ctrl ou Cmd + Maj + Z', does: 'La rétablit' },
    find: { keys: 'Ctrl ou Cmd + K', does: 'Cherche une étape, un paramètre, une action' },
    keys: { keys: 'Touche\u00A0?', does: 'Montre ces touches, hors d’un champ' },
    poise: { keys: 'Flèches', does: 'Déplacent le poids, ou un curseur, d’un pas' },
    poiseFar: {
      keys: 'Page préc., Page suiv., Début, Fin',
      does: 'Le déplacent plus loin, ou au bout',
    },
    close: { keys: 'Échap', does: 'Ferme ce qui couvre la page' },
  },
};
