import type { HelpWords } from './help-words.ts';

/** The help on each step: what this is, what to do, what can go wrong. */
export const help: HelpWords = {
  headings: { what: 'What this is', todo: 'What to do', wrong: 'What can go wrong' },
  topics: {
    appraisals: {
      what: 'Every appraisal on this device, and worked examples to learn from. An appraisal weighs ways of treating one health problem: what each costs, and what health it gives.',
      todo: [
        'Open a worked example and walk through its steps, from Question to Brief.',
        'Change something in an example: from the first change on it is an appraisal of your own.',
        'Begin your own from a template near to your problem, and replace its numbers.',
        'Open a model file that somebody sent you.',
      ],
      wrong: [
        'Appraisals are kept in this browser. Clearing its data deletes them: export what matters as a file.',
        'In a private window nothing is kept once the window is closed.',
        'A file is refused when something in it is broken. The message says what, and where.',
      ],
    },
    question: {
      what: 'What is to be decided, for whom, and by which rules. Everything after it depends on what stands here.',
      todo: [
        'Write the decision in a sentence or two, and say whom it concerns and who pays.',
        'List the strategies, and choose the comparator: what is done today.',
        'Set the time horizon long enough to hold every difference between the strategies.',
        'Set the length of a cycle, the discount rates and the threshold as your guideline has them.',
        'Say how many people the decision concerns, if more research is to be valued.',
      ],
      wrong: [
        'A horizon that is too short leaves out costs or health that come later.',
        'A comparator that nobody uses makes a strategy look better than it is.',
        'Money of different years or currencies is not converted: bring every price to the price year first.',
        'A cycle that is too long hides what happens within it.',
      ],
    },
    evidence: {
      what: 'Every number that the model reads: its value, how uncertain it is, and where it comes from.',
      todo: [
        'Add a parameter for each number, with its unit and kind.',
        'Give each its source. A reader should be able to find the number again.',
        'Choose a distribution that fits the kind: beta for a probability, gamma or lognormal for a cost, lognormal for a ratio.',
        'Put parameters that depend on each other in a group, so that they are drawn together.',
      ],
      wrong: [
        'A fixed parameter counts as certain. Say why it is fixed, or give it a distribution.',
        'A yearly rate is not a probability: choose the kind that it is.',
        'A standard error is not a standard deviation. For the uncertainty of a mean, use the standard error.',
        'A number with no source will be the first thing a reviewer asks about.',
      ],
    },
    model: {
      what: 'Where people can be, how they move from cycle to cycle, and what that costs and gains.',
      todo: [
        'Name the states. Each person is in one of them at any time.',
        'Say where people start.',
        'Write the movements out of each state, as probabilities or as rates, a strategy at a time where they differ.',
        'Write the payoffs: costs and health, by state or by event.',
        'Use variables for what is needed in more than one place.',
      ],
      wrong: [
        'Probabilities out of a state must come to 1. Let one cell take the rest.',
        'A formula uses symbols, not labels. The message under the field says which name is unknown.',
        'A death state that still costs or gains something is nearly always a mistake.',
        'A probability per year used with a cycle of a month counts far too much. Convert it first.',
      ],
    },
    results: {
      what: 'The answer: what each strategy costs and gains for one person, and which is best at which threshold.',
      todo: [
        'Read the heading: it states the finding.',
        'Move the poise along the beam to try other thresholds. It marks the best strategy at each.',
        'Press Explain beside a number to see where it comes from.',
        'Under “What if…”, add a lever to try another value without changing the model.',
        'Look at the trace: do as many people die, or recover, as you would expect?',
      ],
      wrong: [
        'No results: the model is broken. The strip on top lists what to mend.',
        'While a lever is in force, the numbers are not those of the model. A notice says so on every step.',
        'A strategy best by a hair may not be best at all: look at Uncertainty before you decide.',
        'A negative ratio has no meaning of its own. Look at whether the strategy saves or loses.',
      ],
    },
    uncertainty: {
      what: 'How sure the answer is. Every uncertain number is drawn again and again, and the model is run for each draw.',
      todo: [
        'Let the draws finish. A thousand is a start; set how many on Question, and use more for a final answer.',
        'Read how often each strategy is best at your threshold.',
        'Read what it would be worth to know everything (EVPI): no study can be worth more.',
        'Check that the Monte Carlo standard error is small beside the difference that you decide on.',
      ],
      wrong: [
        'Only parameters with a distribution vary. If most are fixed, the answer looks surer than it is.',
        'Parameters drawn apart that belong together give wrong chances. Group them on Evidence.',
        'Doubt about the structure of the model is not in the draws. Try scenarios for it.',
        'Few draws make ragged curves: that is chance, not a finding.',
      ],
    },
    brief: {
      what: 'One page for those who decide, drafted from the model as it stands.',
      todo: [
        'Choose the language and the paper.',
        'Read every sentence, and reword those that need it.',
        'Look at the page as it will be printed.',
        'Print it, or save it as a PDF from the print window.',
      ],
      wrong: [
        'The page is marked provisional when something is missing or has changed. What it is stands beside it.',
        'Your own words do not follow the model. After a change, look at them again.',
        'A page that is too full is not printed: shorten the longest sentences.',
        'The page supports deliberation. It does not take the decision.',
      ],
    },
    history: {
      what: 'The versions that you kept, what changed between them, and what that did to the answer.',
      todo: [
        'Save a version when something is done, and say what changed and why.',
        'Compare two versions to see each change and both answers.',
        'Go back to an earlier version if you need to. That too can be undone.',
      ],
      wrong: [
        'Edits are safe without a version, but a version is what you can go back to by name.',
        'A version with no message says little a year later.',
        'Versions are kept on this device. Export a file to keep one elsewhere.',
      ],
    },
    settings: {
      what: 'What holds for every appraisal on this device: language, look, your name, draws and storage.',
      todo: [
        'Choose the language and the theme.',
        'Write your name, so that the versions you save bear it.',
        'Set how many draws a new appraisal begins with.',
        'Ask the browser to keep your data.',
      ],
      wrong: [
        'A browser may clear data when the device runs out of room. Export what matters as a file.',
        'More simulators are quicker on a strong device, and slower on a weak one. Results stay the same.',
        'Settings are of this browser only: another one has its own.',
      ],
    },
  },
};
