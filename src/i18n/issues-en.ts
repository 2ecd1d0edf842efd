/** What each issue code of shared/ says, in English. */
export const issues = {
  unknown: 'Something is wrong that this version has no words for ({{code}}).',
  analysis: {
    notFinite: 'The {{quantity}} of {{strategy}} is not a number: nothing can be compared.',
    noDraws: 'There are no draws to conclude from.',
    drawsMissing: 'Draws are missing from draw {{draw}} on.',
    drawNotFinite: 'The {{quantity}} of {{strategy}} is not a number in draw {{draw}}.',
  },
  distribution: {
    noGroup: '{{parameter}} is drawn with the group {{group}}, which does not exist.',
    empty: '{{parameter}} is drawn from an empty list.',
    infinite: 'Some draws of {{parameter}} would be infinite.',
    limits: 'The limits of {{parameter}} do not rise: from {{low}} to {{high}}.',
    notFinite: '{{name}} of {{parameter}} is not a finite number.',
    notPositive: '{{name}} of {{parameter}} is {{value}}; it must be above 0.',
    outsideKind: 'Draws of {{parameter}} can leave what a quantity of the kind “{{kind}}” can be.',
    unusualForKind:
      '{{parameter}}: {{distribution}} is an unusual distribution for the kind “{{kind}}”.',
    valueFar:
      'The base value {{value}} of {{parameter}} lies outside the 95% interval of its draws ({{low}} to {{high}}).',
    valueOutside:
      'The base value {{value}} of {{parameter}} can never be drawn ({{low}} to {{high}}).',
  },
  document: {
    badVersion: 'The version of the format must be a whole number from 1 on.',
    brokenText: 'A text holds half a character: it was probably cut.',
    hostileKey: 'The name {{key}} may not be used: it reaches into the program itself.',
    hostileName: '{{got}} may not be used as a name.',
    invalid: '{{got}} is not valid here.',
    invalidFormat: '{{got}} is not written as it should be here: letters, digits and _ only.',
    invalidKey: '{{key}} cannot be a name here.',
    invalidType: 'This should be of type {{expected}}; it is of type {{got}}.',
    invalidValue: '{{got}} is none of the values allowed: {{allowed}}.',
    missing: 'Something is missing here: {{expected}}.',
    moreIssues: 'There are more: only the first {{shown}} are listed.',
    newerFormat:
      'The file is of format version {{got}}; this Steelyard reads up to {{known}}. Update Steelyard, then open it again.',
    notAbove: 'The value must be above {{minimum}}.',
    notBelow: 'The value must be below {{maximum}}.',
    notJson:
      'This is not a whole JSON file: it breaks off or has a stray character at line {{line}}, column {{column}}.',
    notObject: 'A model is a JSON object; this is of type {{got}}.',
    notPlain: 'A value of type {{got}} cannot be part of a model.',
    numberNotFinite: 'A number is infinite or not a number.',
    olderFormat:
      'The file is of format version {{got}}, which can no longer be brought up to {{known}}.',
    textTooLong: 'The text is longer than {{maximum}} characters.',
    textTooShort: 'The text is shorter than {{minimum}} characters.',
    tooBig: 'The value must be {{maximum}} or less.',
    tooDeep: 'Lists and objects lie more than {{maximum}} deep in one another.',
    tooFewItems: 'The list needs {{minimum}} items or more.',
    tooLarge: 'The file is larger than {{maximum}} bytes, the most that is read.',
    tooManyItems: 'The list may hold {{maximum}} items at most.',
    tooManyKeys: 'An object holds more than {{maximum}} entries.',
    tooManyValues: 'The file holds more than {{maximum}} values.',
    tooMuchWork:
      'The model is too large to run: {{work}} steps, where {{maximum}} are the most. Use fewer cycles, states or profiles.',
    tooSmall: 'The value must be {{minimum}} or more.',
    wrongFormat: 'This is not a Steelyard model: its “format” should be {{expected}}.',
  },
  edit: {
    badValue: 'This value cannot be put here.',
    hostileKey: 'The name {{key}} may not be used: it reaches into the program itself.',
    idFixed: '{{id}} keeps its id.',
    idNotUnique: 'Several things are called {{id}}: the list has to be mended as a whole.',
    idTaken: 'Something is called {{id}} already.',
    noSuchItem: 'There is no {{id}} any more: it was probably removed elsewhere.',
    noSuchPlace: 'The place that was to be changed is there no more.',
    notAField: 'This cannot be left empty.',
  },
  formula: {
    badNumber: '{{text}} is not a number.',
    chainedComparison: 'Two comparisons in a row: join them with “and”.',
    constantOutsideRange: '{{value}} cannot be a value of the kind “{{kind}}”.',
    cycle: 'Names that define one another in a circle: {{cycle}}.',
    cycleCostPerYear: 'A cost a cycle stands where a cost a year is meant.',
    decimalComma: '{{text}}: write decimals with a point.',
    disabilityAsUtility:
      'A disability weight stands where a utility is meant: utility counts health, disability counts its loss.',
    empty: 'The formula is empty.',
    functionWithoutBrackets: '{{name}} is a function: it needs brackets after it.',
    incomplete: 'The formula breaks off after {{after}}.',
    kindMismatch: 'A quantity of the kind “{{got}}” stands where “{{wanted}}” is meant.',
    lookupNeedsTable: 'The first thing that lookup takes is the name of a table.',
    misplacedNot: '“not” cannot stand here.',
    missingForStrategy: 'There is no formula for the strategy {{strategy}}.',
    mixedFlows: 'Money of two kinds is added: “{{left}}” and “{{right}}”.',
    mixedKinds: 'Quantities that cannot be added or compared: “{{left}}” and “{{right}}”.',
    noStartAge: '“age” needs a covariate start_age in every profile.',
    noTimeInState: '“time_in_state” has a meaning only in rows and payoffs of a timed state.',
    notAFunction: '{{name}} is no function.',
    notAnOutcome: 'A quantity of the kind “{{got}}” cannot be counted as an outcome.',
    numberTooLarge: '{{text}} is too large a number.',
    operatorExpected: 'An operator such as + or * is missing here.',
    probabilityAsRate: 'A probability stands where a rate is meant: turn it with hazard().',
    rateAsProbability: 'A rate stands where a probability is meant: turn it with chance().',
    strayCharacter: 'A character that means nothing in a formula.',
    syntax: 'The formula cannot be read.',
    tableWithoutLookup: '{{name}} is a table: read it with lookup().',
    tooDeep: 'The formula is nested more than {{limit}} deep.',
    tooDeepTogether: 'Definitions rest on one another more than {{maximum}} deep.',
    tooMuchText: 'All formulas together are longer than {{limit}} characters.',
    tooMuchWork: 'The variables rest on one another in too many ways to be checked.',
    tooLarge: 'The formula has more than {{limit}} parts.',
    tooLong: 'The formula is longer than {{limit}} characters.',
    unclosedBracket: 'A bracket is opened and never closed.',
    unknownFunction: 'There is no function {{name}}.',
    unknownName: 'Nothing is called {{name}}.',
    unopenedBracket: 'A bracket is closed that was never opened.',
    unused: '{{symbol}} is never used.',
    utilityAsDisability:
      'A utility stands where a disability weight is meant: utility counts health, disability counts its loss.',
    valueExpected: 'A number or a name is missing here.',
    wrongArgumentCount: '{{name}} was given {{got}} values, which is not as many as it takes.',
    wrongKeyCount: 'The table {{table}} takes {{wanted}} keys; it was given {{got}}.',
    yearlyCostPerCycle: 'A cost a year is paid each cycle.',
    yearlyWeightPerCycle: 'A weight for a year is counted each cycle.',
  },
  group: {
    kind: '{{parameter}} in the Dirichlet group {{group}} is not a probability.',
    memberFixed: '{{parameter}} is fixed and cannot be correlated in the group {{group}}.',
    memberInTwo: '{{parameter}} is in two groups: {{other}} and {{group}}.',
    notCorrelation:
      'Correlations of the group {{group}} must lie from −1 to 1, with 1 on the diagonal.',
    notFinite: 'The group {{group}} holds a number that is not finite.',
    notPointing: '{{parameter}} is listed by the group {{group}} but not drawn in it.',
    notPositive: 'Counts of the group {{group}} must be above 0.',
    notPositiveDefinite:
      'The matrix of the group {{group}} is not positive definite: no distribution has it.',
    notSymmetric: 'The matrix of the group {{group}} is not symmetric.',
    ownDistribution:
      '{{parameter}} needs a distribution of its own to be ranked in the group {{group}}.',
    repeatedMember: '{{parameter}} is a member of the group {{group}} twice.',
    size: '{{name}} of the group {{group}} should have {{want}} items, one a member; it has {{got}}.',
    unknownMember: 'The group {{group}} lists {{parameter}}, which does not exist.',
    valuesSum: 'Base values of the probabilities in {{group}} sum to {{sum}}, not to 1.',
  },
  groups: {
    doesNotListMember:
      '{{parameter}} says it belongs to the group {{group}}, which does not list it.',
    memberNeedsOwnDistribution:
      '{{parameter}} needs a distribution of its own in the group {{group}}.',
    memberNotInGroup: '{{parameter}} is listed by the group {{group}} but does not say so.',
    memberTwice: '{{id}} is listed twice.',
    notCorrelation:
      '{{value}} is no correlation: it must lie from −1 to 1, with 1 on the diagonal.',
    notSymmetric:
      'The matrix is not the same on both sides of its diagonal (row {{row}}, column {{column}}).',
    unknown: 'There is no group {{id}}.',
    valuesDoNotSum: 'The values of the group {{group}} sum to {{sum}}, not to 1.',
    wrongLength: 'The list should hold {{expected}} items; it holds {{got}}.',
  },
  ids: {
    duplicate: 'The id {{id}} is used twice.',
  },
  movements: {
    absorbingHasRow: '{{state}} is absorbing: nobody leaves it.',
    destinationTwice: '{{state}} is given twice as a destination.',
    missingRow: 'Nothing says where people in {{state}} go under {{strategy}}.',
    overlappingRows: 'Two rows say where people in {{state}} go under {{strategy}}.',
    rateToSelf: 'A rate cannot lead from {{state}} to itself.',
    referenceIsCell: 'The reference {{state}} has a formula of its own.',
    remainderIsCell: 'The remainder {{state}} has a formula of its own.',
    stateInTwoCurves: '{{state}} is given two curves.',
    stateWithoutCurve: '{{state}} has no curve.',
    timedUnderCurves: '{{state}} cannot keep time in state in a model of survival curves.',
  },
  names: {
    duplicate: 'The name {{symbol}} is used twice.',
    reserved: 'The name {{symbol}} is taken by the formula language itself.',
  },
  parameters: {
    unknown: 'There is no parameter {{id}}.',
  },
  payoffs: {
    afterHorizon: 'This falls in cycle {{cycle}}, after the last of {{cycles}}: it never counts.',
    movementNeedsRows:
      '{{payoff}} counts movements, which a model of survival curves does not have.',
    movementToSelf: 'Staying in {{state}} is not a movement.',
    stateTwice: '{{state}} is given two amounts.',
  },
  profiles: {
    missingCovariate: 'The profile has no value for {{covariate}}.',
    sharesDoNotSum: 'The shares of the profiles sum to {{sum}}, not to 1.',
    unknownCovariate: 'There is no covariate {{covariate}}.',
  },
  question: {
    cyclesRounded: 'The horizon is {{exact}} cycles long: {{cycles}} are run.',
    simpsonNeedsEvenCycles: 'Simpson’s rule needs an even number of cycles; there are {{cycles}}.',
    tooManyCycles: '{{cycles}} cycles are too many: {{maximum}} are the most.',
    unknownThreshold: 'There is no threshold {{id}}.',
  },
  run: {
    brokeDown:
      'The calculation broke down. Change something to try again; close other tabs where memory is short.',
    curveOutside:
      'A survival curve leaves 0 to 1: {{value}} in cycle {{cycle}}, strategy {{strategy}}, profile {{profile}} ({{count}} times, first in draw {{draw}}).',
    curvesCross:
      'Survival curves cross in cycle {{cycle}}, strategy {{strategy}}, profile {{profile}} ({{count}} times, first in draw {{draw}}).',
    logOddsOutside:
      'A log odds is not a number in cycle {{cycle}}, strategy {{strategy}}, profile {{profile}} ({{count}} times, first in draw {{draw}}).',
    notFinite: 'The totals of {{strategy}} are not numbers.',
    probabilityOutside:
      'A probability leaves 0 to 1: {{value}} in cycle {{cycle}}, strategy {{strategy}}, profile {{profile}} ({{count}} times, first in draw {{draw}}).',
    rateOutside:
      'A rate is below 0: {{value}} in cycle {{cycle}}, strategy {{strategy}}, profile {{profile}} ({{count}} times, first in draw {{draw}}).',
    remainderOutside:
      'What is left for the remainder is {{value}}, outside 0 to 1, in cycle {{cycle}}, strategy {{strategy}}, profile {{profile}} ({{count}} times, first in draw {{draw}}).',
    startOutside:
      'A share at the start leaves 0 to 1: {{value}}, strategy {{strategy}}, profile {{profile}} ({{count}} times, first in draw {{draw}}).',
    startRemainderOutside:
      'What the shares at the start leave is {{value}}, outside 0 to 1, strategy {{strategy}}, profile {{profile}} ({{count}} times, first in draw {{draw}}).',
  },
  scenarios: {
    badSetting: '{{got}} is no value for the setting {{setting}}.',
    overriddenTwice: '{{target}} is changed twice.',
    unknown: 'There is no scenario {{id}}.',
  },
  start: {
    stateTwice: '{{state}} is given two shares at the start.',
  },
  states: {
    cyclesNotUsed: '{{state}} has a number of cycles that is not used: it is not a timed state.',
    timedNeedsCycles: '{{state}} keeps time in state: say for how many cycles.',
    tooMany: 'With time in state there are {{count}} states: {{maximum}} are the most.',
    unknown: 'There is no state {{id}}.',
  },
  strategies: {
    listedTwice: 'The strategy {{id}} is listed twice.',
    noneListed: 'The list of strategies is empty: leave it out to mean all.',
    unknown: 'There is no strategy {{id}}.',
  },
  tables: {
    keysNotRising: 'The points of a key must rise: {{got}} follows {{before}}.',
    wrongSize: 'The table should hold {{expected}} values; it holds {{got}}.',
  },
  values: {
    drawsOutsideKind:
      'Draws of this {{distribution}} distribution can leave what the kind “{{kind}}” allows.',
    outsideKind: '{{value}} is not a value that the kind “{{kind}}” can take.',
  },
  variables: {
    unknown: 'There is no variable {{id}}.',
  },
};
