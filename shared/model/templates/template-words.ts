/**
 * Every word that a template writes into a document. `shared` words nothing: the
 * interface gives them in its language, and they are the author's own from then on.
 */
export interface TemplateWords {
  /** Title of a document that has none yet. */
  readonly untitled: string;
  /** Says of a model that all its numbers are placeholders. */
  readonly allPlaceholders: string;
  /** Note on each placeholder: replace it. */
  readonly replaceMe: string;
  /** In the stead of a source. */
  readonly notYetGiven: string;

  readonly threshold: string;
  readonly everybody: string;
  readonly qalys: string;
  readonly qaly: string;

  /** Units. */
  readonly perYear: string;
  readonly share: string;
  readonly ratio: string;
  readonly utility: string;
  readonly moneyPerYear: string;
  readonly moneyOnce: string;

  /** Strategies. */
  readonly usualCare: string;
  readonly newOption: string;
  readonly noScreening: string;
  readonly screening: string;

  /** States. */
  readonly alive: string;
  readonly dead: string;
  readonly stable: string;
  readonly progressed: string;
  readonly remission: string;
  readonly relapse: string;
  readonly healthy: string;
  readonly undetected: string;
  readonly treated: string;
  readonly recovered: string;
  readonly chronic: string;

  /** Labels of probabilities and effects. */
  readonly chanceDying: string;
  readonly chanceDyingStable: string;
  readonly chanceDyingProgressed: string;
  readonly chanceProgression: string;
  readonly chanceRemission: string;
  readonly chanceRelapse: string;
  readonly chanceDyingRemission: string;
  readonly chanceDyingRelapse: string;
  readonly chanceDyingHealthy: string;
  readonly chanceDyingUndetected: string;
  readonly chanceDyingChronic: string;
  readonly chanceDyingRecovered: string;
  readonly chanceDyingAcute: string;
  readonly chanceChronicAfterAcute: string;
  readonly effectOnDying: string;
  readonly effectOnProgression: string;
  readonly effectOnRelapse: string;
  readonly effectOfTreatment: string;
  readonly effectOnAcuteDeath: string;
  readonly prevalence: string;
  readonly sensitivity: string;
  readonly specificity: string;
  /** Labels of variables. */
  readonly dyingNow: string;
  readonly progressionNow: string;
  readonly relapseNow: string;
  readonly acuteDeathNow: string;

  /** Labels and categories of payoffs and of their amounts. */
  readonly care: string;
  readonly option: string;
  readonly costCare: string;
  readonly costCareStable: string;
  readonly costCareProgressed: string;
  readonly costCareRemission: string;
  readonly costCareRelapse: string;
  readonly costCareUndetected: string;
  readonly costCareTreated: string;
  readonly costCareChronic: string;
  readonly costAcute: string;
  readonly costOption: string;
  readonly costTest: string;
  readonly costFalseAlarm: string;
  readonly testing: string;
  readonly acuteCare: string;
  readonly utilityAlive: string;
  readonly utilityStable: string;
  readonly utilityProgressed: string;
  readonly utilityRemission: string;
  readonly utilityRelapse: string;
  readonly utilityHealthy: string;
  readonly utilityUndetected: string;
  readonly utilityTreated: string;
  readonly utilityChronic: string;
  readonly utilityRecovered: string;
}

/** What a template is filled in with. */
export interface TemplateSetting {
  /** Id of the new document. */
  readonly id: string;
  /** Price year. */
  readonly year: number;
  readonly words: TemplateWords;
}
