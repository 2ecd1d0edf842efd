/**
 * What each issue code of shared/ says on the command line, in English. `{name}`
 * stands for a param; a stretch in `[...]` is left out where one of its params is
 * missing. One table, so that the file is as long as there are codes.
 */

const FIRST = ' ({count} times; first in draw {draw})';
const MOMENT = ', cycle {cycle}, strategy {strategy}, profile {profile}';
const RANGE = '[ (at least {low})][ (at most {high})]';

export const ISSUE_WORDS: Readonly<Record<string, string>> = {
  'analysis.drawNotFinite': 'the {quantity} of {strategy} is not a number in draw {draw}',
  'analysis.drawsMissing': 'draws are missing from draw {draw} on',
  'analysis.noDraws': 'there are no draws to conclude from',
  'analysis.notFinite': 'the {quantity} of {strategy} is not a number',

  'command.badNumber': '--{option} does not take {text}: it takes a number up to {most}',
  'command.badPlan': '--plan does not take {text}: it takes plain, lhs or sobol',
  'command.noSuchExample': 'there is no example {slug}',
  'command.noSuchFile': 'there is no file {path}',
  'command.noSuchScenario': 'the document has no scenario {id}',
  'command.oneDocument': 'give one file, or one example with --example',
  'command.unknownOption': 'an option is not known, or has no value',

  'distribution.empty': '{parameter} is drawn from an empty list',
  'distribution.infinite': 'some draws of {parameter} would be infinite',
  'distribution.limits': 'limits of {parameter} do not rise: low {low}[, mode {mode}], high {high}',
  'distribution.notFinite': '{name} of {parameter} is {value}, not a finite number',
  'distribution.notPositive': '{name} of {parameter} is {value}; it must be above 0',
  'distribution.outsideKind':
    'draws of {parameter} can leave what a {kind} can be ({low} to {high}): a share of {share}',
  'distribution.unusualForKind': '{parameter}: {distribution} is an unusual choice for a {kind}',
  'distribution.valueFar':
    'the base value {value} of {parameter} is outside the 95% interval of its draws ({low} to {high})',
  'distribution.valueOutside':
    'the base value {value} of {parameter} can never be drawn ({low} to {high})',
  'distribution.noGroup': '{parameter} is drawn in the group {group}, which does not hold it',

  'document.badVersion': 'formatVersion must be a whole number from 1 on',
  'document.brokenText': 'a text holds half of a character (a surrogate without its pair)',
  'document.hostileKey': 'the key {key} is not allowed anywhere in a document',
  'document.hostileName': '{got} cannot be used as a name',
  'document.invalid': '{got} is not valid here',
  'document.invalidFormat': '{got} is not written as it has to be here',
  'document.invalidKey': 'the key {key} is no id (letters, digits, _ and -)',
  'document.invalidType': 'expected {expected}, got {got}',
  'document.invalidValue': '{got} is none of: {allowed}',
  'document.missing': 'missing; expected: {expected}',
  'document.moreIssues': 'more issues follow; the first {shown} are listed',
  'document.newerFormat':
    'the document has format version {got}; this program knows versions up to {known}: update it',
  'document.notAbove': 'must be above {minimum}',
  'document.notBelow': 'must be below {maximum}',
  'document.notJson': 'not whole, valid JSON: stops making sense at line {line}, column {column}',
  'document.notObject': 'a document is a JSON object; got {got}',
  'document.notPlain': 'a value of type {got} is no JSON',
  'document.numberNotFinite': 'a number is too large or no number',
  'document.olderFormat': 'format version {got} can no longer be brought up to version {known}',
  'document.textTooLong': 'longer than {maximum} characters',
  'document.textTooShort': 'shorter than {minimum} characters',
  'document.tooBig': 'must be {maximum} or less',
  'document.tooDeep': 'nested deeper than {maximum} levels[, from line {line}, column {column} on]',
  'document.tooFewItems': 'needs at least {minimum} items',
  'document.tooLarge': 'larger than {maximum} bytes, the most that is read',
  'document.tooManyItems': 'has more than {maximum} items, the most allowed',
  'document.tooManyKeys': 'an object with more than {maximum} keys',
  'document.tooManyValues': 'more than {maximum} values',
  'document.tooMuchWork':
    'too large to run: strategies x profiles x cycles x states = {work}, more than {maximum}',
  'document.tooSmall': 'must be {minimum} or more',
  'document.wrongFormat': 'not a document of this program: format has to be {expected}',

  'edit.badValue': 'a value that cannot be put there',
  'edit.hostileKey': 'the key {key} is not allowed anywhere in a document',
  'edit.idFixed': '{id} keeps its id',
  'edit.idNotUnique': 'several items are called {id}',
  'edit.idTaken': 'there is an item {id} already',
  'edit.noSuchItem': 'there is no item {id}',
  'edit.noSuchPlace': 'there is no such place in the document',
  'edit.notAField': 'only a field can be unset',

  'fit.counts': '{events} events among {n} persons cannot be: whole numbers, 0 to n',
  'fit.improper': '{events} events among {n} leave no distribution without a prior',
  'fit.interval': 'no interval: {lower} to {upper}',
  'fit.level': 'the level of an interval is above 0 and below 1; got {level}',
  'fit.meanOutside': `the mean {mean} is outside what the distribution can have${RANGE}`,
  'fit.noSolution': 'no distribution of this kind has the interval {lower} to {upper}',
  'fit.pointOutside': 'the point estimate {point} is outside the interval {lower} to {upper}',
  'fit.standardError': 'the standard error must be above 0; got {se}',
  'fit.tooWide': 'the standard error {se} is too large for this mean: it must be below {limit}',

  'formula.badNumber': '{text} is no number',
  'formula.chainedComparison': 'comparisons cannot be chained: join them with and',
  'formula.constantOutsideRange': `{value} is outside what a {kind} can be${RANGE}`,
  'formula.cycle': 'definitions go round in a circle: {cycle}',
  'formula.cycleCostPerYear': 'a cost per cycle stands where a cost per year is meant',
  'formula.decimalComma': '{text}: decimals take a point',
  'formula.disabilityAsUtility': 'a disability weight stands where a utility is meant',
  'formula.empty': 'the formula is empty',
  'formula.functionWithoutBrackets': '{name} is a function: write {name}(...)',
  'formula.incomplete': 'the formula breaks off after {after}',
  'formula.kindMismatch':
    'a {got} stands where a {wanted} is meant[ (argument {argument} of {name})]',
  'formula.lookupNeedsTable': 'lookup takes the name of a table first',
  'formula.misplacedNot': 'not cannot stand here; put brackets round what it denies',
  'formula.missingForStrategy': 'no formula[ for strategy {strategy}]',
  'formula.mixedFlows': 'money of different kinds is added: {left} and {right}',
  'formula.mixedKinds': 'a {left} and a {right} cannot be added or compared',
  'formula.noStartAge': 'age needs a covariate with the symbol start_age',
  'formula.noTimeInState':
    'time_in_state has a meaning only in the row or payoff of a timed state[ (by way of {variable})]',
  'formula.notAFunction': '{name} is a {what}, not a function',
  'formula.notAnOutcome': 'a {got} is no outcome of measure {measure}',
  'formula.numberTooLarge': '{text} is too large a number',
  'formula.operatorExpected': 'an operator is missing before this[; did you mean {instead}?]',
  'formula.probabilityAsRate': 'a probability stands where a rate is meant: use hazard()',
  'formula.rateAsProbability': 'a rate stands where a probability is meant: use chance()',
  'formula.strayCharacter': '{character} means nothing in a formula[; write {instead}]',
  'formula.syntax': 'the formula cannot be read',
  'formula.tableWithoutLookup': '{name} is a table: use lookup({name}, ...)',
  'formula.tooDeep': 'nested deeper than {limit} levels',
  'formula.tooDeepTogether': 'definitions rest on one another more than {maximum} deep',
  'formula.tooLarge': 'more than {limit} parts in one formula',
  'formula.tooLong': '{length} characters, more than the {limit} that are read',
  'formula.tooMuchText': 'all formulas together have {length} characters, more than {limit}',
  'formula.tooMuchWork': 'variables use each other in more than {limit} steps',
  'formula.unclosedBracket': 'this bracket is never closed',
  'formula.unknownFunction': 'there is no function[ {name}][; did you mean {suggestion}?]',
  'formula.unknownName': 'nothing is called {name}[; did you mean {suggestion}?]',
  'formula.unopenedBracket': 'this bracket was never opened',
  'formula.unused': 'the {what} {symbol} is never used',
  'formula.utilityAsDisability': 'a utility stands where a disability weight is meant',
  'formula.valueExpected': 'a number or a name is missing before this',
  'formula.wrongArgumentCount':
    '{name} got {got} arguments; it takes {min} or more[, {max} at most]',
  'formula.wrongKeyCount': 'the table {table} takes {wanted} keys; it got {got}',
  'formula.yearlyCostPerCycle': 'a cost per year stands where a cost per cycle is meant',
  'formula.yearlyWeightPerCycle': 'a {got} counts by the year, but is paid each cycle',

  'group.kind': '{parameter} in the Dirichlet group {group} is a {kind}, not a probability',
  'group.memberFixed': '{parameter} is fixed and cannot be correlated in the group {group}',
  'group.memberInTwo': '{parameter} is in two groups: {other} and {group}',
  'group.notCorrelation':
    'correlations of the group {group} must lie from -1 to 1, with 1 on the diagonal',
  'group.notFinite': 'the group {group} holds a number that is not finite',
  'group.notPointing': '{parameter} is listed by the group {group} but not drawn in it',
  'group.notPositive': 'counts of the group {group} must be above 0',
  'group.notPositiveDefinite':
    'the matrix of the group {group} is not positive definite: no distribution has it',
  'group.notSymmetric': 'the matrix of the group {group} is not symmetric',
  'group.ownDistribution':
    '{parameter} needs a distribution of its own to be ranked in the group {group}',
  'group.repeatedMember': '{parameter} is a member of the group {group} twice',
  'group.size': '{name} of the group {group} should have {want} items, one a member; got {got}',
  'group.unknownMember': 'the group {group} lists {parameter}, which does not exist',
  'group.valuesSum': 'base values of the probabilities in {group} sum to {sum}, not 1',

  'groups.doesNotListMember': '{parameter} is drawn in the group {group}, which does not list it',
  'groups.memberNeedsOwnDistribution':
    '{parameter} needs a distribution of its own to be ranked in the group {group}',
  'groups.memberNotInGroup': '{parameter} is listed by the group {group} but not drawn in it',
  'groups.memberTwice': '{id} is a member twice',
  'groups.unknown': 'there is no group {id}',
  'groups.wrongLength': 'expected {expected} items, one a member; got {got}',

  'ids.duplicate': 'the id {id} is given twice in this list',

  'movements.absorbingHasRow': '{state} is absorbing, so nobody moves out of it',
  'movements.destinationTwice': '{state} is a destination twice in this row',
  'movements.missingRow': 'no row says where those in {state} go under {strategy}',
  'movements.overlappingRows': 'two rows say where those in {state} go under {strategy}',
  'movements.rateToSelf': 'a rate from {state} to itself has no meaning',
  'movements.referenceIsCell': 'the reference {state} has a formula too',
  'movements.remainderIsCell': 'the remainder {state} has a formula too',
  'movements.stateInTwoCurves': '{state} is named twice by the curves',
  'movements.stateWithoutCurve': '{state} is named by no curve',
  'movements.timedUnderCurves': '{state} is timed, which survival curves cannot follow',

  'names.duplicate': 'the symbol {symbol} already names a {what}',
  'names.reserved': 'the symbol {symbol} is a {what} of the formula language',

  'parameters.unknown': 'there is no parameter {id}',

  'payoffs.afterHorizon': 'cycle {cycle} is after the horizon ({cycles} cycles): never counted',
  'payoffs.movementNeedsRows': '{payoff} is paid on movements, which survival curves do not show',
  'payoffs.movementToSelf': 'staying in {state} is no movement',
  'payoffs.stateTwice': '{state} is named twice',

  'profiles.missingCovariate': 'no value for the covariate {covariate}',
  'profiles.sharesDoNotSum': 'shares of the profiles sum to {sum}, not 1',
  'profiles.unknownCovariate': 'there is no covariate {covariate}',

  'question.cyclesRounded': 'the horizon is {exact} cycles; {cycles} are run',
  'question.simpsonNeedsEvenCycles': "Simpson's rule needs an even number of cycles, not {cycles}",
  'question.tooManyCycles': '{cycles} cycles are more than {maximum}, the most that are run',
  'question.unknownThreshold': 'there is no threshold {id}',

  'run.curveOutside': `a curve is {value}, outside 0 to 1${MOMENT}${FIRST}`,
  'run.curvesCross': `curves cross: a state's share is {value}${MOMENT}${FIRST}`,
  'run.logOddsOutside': `log odds are {value}${MOMENT}${FIRST}`,
  'run.notFinite': 'totals of {strategy} are no numbers[ in {count} draws, first in draw {draw}]',
  'run.probabilityOutside': `a probability is {value}, outside 0 to 1${MOMENT}${FIRST}`,
  'run.rateOutside': `a rate is {value}, below 0 or no number${MOMENT}${FIRST}`,
  'run.remainderOutside': `the remainder is {value}, outside 0 to 1${MOMENT}${FIRST}`,
  'run.startOutside': `a starting share is {value}, outside 0 to 1${MOMENT}${FIRST}`,
  'run.startRemainderOutside': `the starting remainder is {value}, outside 0 to 1${MOMENT}${FIRST}`,

  'scenarios.badSetting': '{got} is no value for {setting}',
  'scenarios.overriddenTwice': '{target} is overridden twice',
  'scenarios.unknown': 'there is no scenario {id}',

  'start.stateTwice': '{state} has two starting shares, or one beside the remainder',

  'states.cyclesNotUsed': '{state} is not timed, so its cycles are not used',
  'states.timedNeedsCycles': '{state} is timed and has to say for how many cycles',
  'states.tooMany': '{count} states after timed ones are expanded, more than {maximum}',
  'states.unknown': 'there is no state {id}',

  'strategies.listedTwice': '{id} is listed twice',
  'strategies.noneListed': 'an empty list of strategies: leave it out to mean all',
  'strategies.unknown': 'there is no strategy {id}',

  'tables.keysNotRising': 'points of a key must rise: {got} follows {before}',
  'tables.wrongSize': 'expected {expected} values, one for each combination of keys; got {got}',

  'values.drawsOutsideKind': `draws of a {distribution} distribution can be outside what a {kind} can be${RANGE}`,
  'values.outsideKind': `{value} is outside what a {kind} can be${RANGE}`,

  'variables.unknown': 'there is no variable {id}',
};
