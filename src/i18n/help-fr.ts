import type { HelpWords } from './help-words.ts';

/** L’aide de chaque étape : ce que c’est, ce qu’il faut faire, ce qui peut mal tourner. */
export const help: HelpWords = {
  headings: { what: 'Ce que c’est', todo: 'Que faire', wrong: 'Ce qui peut mal tourner' },
  topics: {
    appraisals: {
      what: 'Toutes les évaluations de cet appareil, et des exemples traités pour apprendre. Une évaluation pèse plusieurs façons de traiter un problème de santé\u00A0: ce que chacune coûte, et la santé qu’elle apporte.',
      todo: [
        'Ouvrez un exemple traité et parcourez ses étapes, de la Question à la Synthèse.',
        'Modifiez quelque chose dans un exemple\u00A0: dès la première modification, c’est une évaluation à vous.',
        'Commencez la vôtre à partir d’un canevas proche de votre problème, et remplacez ses nombres.',
        'Ouvrez un fichier de modèle qu’on vous a envoyé.',
      ],
      wrong: [
        'Les évaluations sont gardées dans ce navigateur. Effacer ses données les supprime\u00A0: exportez dans un fichier ce qui compte.',
        'Dans une fenêtre privée, rien n’est gardé une fois la fenêtre fermée.',
        'Un fichier est refusé quand il contient une erreur. Le message dit laquelle, et où.',
      ],
    },
    question: {
      what: 'Ce qu’il faut décider, pour qui, et selon quelles règles. Tout ce qui suit en dépend.',
      todo: [
        'Écrivez la décision en une phrase ou deux\u00A0; dites qui elle concerne et qui paie.',
        'Dressez la liste des stratégies, et choisissez le comparateur\u00A0: ce qui se fait aujourd’hui.',
        'Choisissez un horizon assez long pour contenir toutes les différences entre les stratégies.',
        'Fixez la durée du cycle, les taux d’actualisation et le seuil selon vos recommandations nationales.',
        'Dites combien de personnes la décision concerne, si la valeur de nouvelles recherches doit être estimée.',
      ],
      wrong: [
        'Un horizon trop court laisse de côté des coûts ou de la santé qui viennent plus tard.',
        'Un comparateur que personne n’emploie fait paraître une stratégie meilleure qu’elle n’est.',
        'Les montants d’années ou de monnaies différentes ne sont pas convertis\u00A0: ramenez d’abord chaque prix à l’année des prix.',
        'Un cycle trop long cache ce qui s’y passe.',
      ],
    },
    evidence: {
      what: 'Tous les nombres que lit le modèle\u00A0: leur valeur, leur incertitude, et d’où ils viennent.',
      todo: [
        'Ajoutez un paramètre pour chaque nombre, avec son unité et sa nature.',
        'Donnez à chacun sa source. Un lecteur doit pouvoir retrouver le nombre.',
        'Choisissez une loi qui convient\u00A0: bêta pour une probabilité, gamma ou lognormale pour un coût, lognormale pour un rapport.',
        'Mettez en groupe les paramètres qui dépendent les uns des autres, pour qu’ils soient tirés ensemble.',
      ],
      wrong: [
        'Un paramètre fixe passe pour certain. Dites pourquoi il est fixe, ou donnez-lui une loi.',
        'Un taux annuel n’est pas une probabilité\u00A0: choisissez la nature qui est la sienne.',
        'Une erreur type n’est pas un écart type. Pour l’incertitude d’une moyenne, prenez l’erreur type.',
        'Un nombre sans source est la première chose qu’un relecteur relèvera.',
      ],
    },
    model: {
      what: 'Où les gens peuvent se trouver, comment ils passent d’un cycle au suivant, ce que cela coûte et ce que cela apporte.',
      todo: [
        'Nommez les états. Chaque personne est dans un seul à la fois.',
        'Dites où les gens commencent.',
        'Écrivez les mouvements au départ de chaque état, en probabilités ou en taux, stratégie par stratégie là où ils diffèrent.',
        'Écrivez ce qui est compté\u00A0: coûts et santé, par état ou par événement.',
        'Servez-vous de variables pour ce qui est utile à plus d’un endroit.',
      ],
      wrong: [
        'Les probabilités au départ d’un état doivent faire 1. Laissez une case prendre le reste.',
        'Une formule emploie des symboles, pas des libellés. Le message sous le champ dit quel nom est inconnu.',
        'Un état de décès qui coûte ou apporte encore quelque chose est presque toujours une erreur.',
        'Une probabilité annuelle employée avec un cycle d’un mois compte beaucoup trop. Convertissez-la d’abord.',
      ],
    },
    results: {
      what: 'La réponse\u00A0: ce que chaque stratégie coûte et apporte pour une personne, et laquelle est la meilleure à quel seuil.',
      todo: [
        'Lisez le titre\u00A0: il énonce le résultat.',
        'Déplacez le poids le long du fléau pour essayer d’autres seuils. Il montre la meilleure stratégie à chacun.',
        'Appuyez sur Expliquer à côté d’un nombre pour voir d’où il vient.',
        'Sous «\u00A0Et si…\u00A0», ajoutez un levier pour essayer une autre valeur sans changer le modèle.',
        'Regardez la trace\u00A0: y a-t-il autant de décès, ou de guérisons, que vous l’attendez\u00A0?',
      ],
      wrong: [
        'Pas de résultats\u00A0: le modèle contient une erreur. Le bandeau du haut dit quoi corriger.',
        'Tant qu’un levier est en vigueur, les nombres ne sont pas ceux du modèle. Un avis le rappelle à chaque étape.',
        'Une stratégie meilleure d’un cheveu ne l’est peut-être pas\u00A0: voyez l’incertitude avant de décider.',
        'Un rapport négatif n’a pas de sens à lui seul. Regardez si la stratégie fait gagner ou perdre.',
      ],
    },
    uncertainty: {
      what: 'À quel point la réponse est sûre. Chaque nombre incertain est tiré encore et encore, et le modèle tourne pour chaque tirage.',
      todo: [
        'Laissez les tirages se finir. Mille suffisent pour commencer\u00A0; leur nombre se fixe à l’étape Question, prenez-en plus pour une réponse définitive.',
        'Lisez combien de fois chaque stratégie est la meilleure à votre seuil.',
        'Lisez ce qu’il vaudrait de tout savoir (EVPI)\u00A0: aucune étude ne peut valoir davantage.',
        'Vérifiez que l’erreur type de Monte-Carlo est petite à côté de la différence qui vous fait décider.',
      ],
      wrong: [
        'Seuls les paramètres qui ont une loi varient. Si la plupart sont fixes, la réponse paraît plus sûre qu’elle n’est.',
        'Des paramètres liés mais tirés séparément faussent les chances. Groupez-les à l’étape Données.',
        'Le doute sur la structure du modèle n’est pas dans les tirages. Essayez pour cela des scénarios.',
        'Peu de tirages donnent des courbes en dents de scie\u00A0: c’est le hasard, pas un résultat.',
      ],
    },
    brief: {
      what: 'Une page pour ceux qui décident, rédigée d’après le modèle tel qu’il est.',
      todo: [
        'Choisissez la langue et le papier.',
        'Lisez chaque phrase, et reformulez celles qui le demandent.',
        'Regardez la page telle qu’elle sera imprimée.',
        'Imprimez-la, ou enregistrez-la en PDF depuis la fenêtre d’impression.',
      ],
      wrong: [
        'La page est marquée provisoire quand quelque chose manque ou a changé. La raison est écrite à côté.',
        'Vos propres mots ne suivent pas le modèle. Après une modification, relisez-les.',
        'Une page trop pleine ne s’imprime pas\u00A0: raccourcissez les phrases les plus longues.',
        'La page aide à délibérer. Elle ne prend pas la décision.',
      ],
    },
    history: {
      what: 'Les versions que vous avez gardées, ce qui a changé de l’une à l’autre, et l’effet sur la réponse.',
      todo: [
        'Enregistrez une version quand une chose est finie\u00A0; dites ce qui a changé et pourquoi.',
        'Comparez deux versions pour voir chaque changement et les deux réponses.',
        'Revenez au besoin à une version antérieure. Cela aussi peut s’annuler.',
      ],
      wrong: [
        'Les modifications sont en sûreté sans version, mais c’est à une version que l’on peut revenir par son nom.',
        'Une version sans message ne dit plus grand-chose un an plus tard.',
        'Les versions sont gardées sur cet appareil. Exportez un fichier pour en garder une ailleurs.',
      ],
    },
    settings: {
      what: 'Ce qui vaut pour toutes les évaluations de cet appareil\u00A0: langue, apparence, votre nom, tirages et stockage.',
      todo: [
        'Choisissez la langue et le thème.',
        'Écrivez votre nom, pour que les versions que vous enregistrez le portent.',
        'Fixez le nombre de tirages d’une nouvelle évaluation.',
        'Demandez au navigateur de garder vos données.',
      ],
      wrong: [
        'Un navigateur peut effacer des données si la place vient à manquer. Exportez dans un fichier ce qui compte.',
        'Plus de simulateurs vont plus vite sur un appareil puissant, et moins vite sur un faible. Les résultats restent les mêmes.',
        'Les réglages sont ceux de ce navigateur seulement\u00A0: un autre a les siens.',
      ],
    },
  },
};
