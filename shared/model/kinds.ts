/**
 * The kinds a quantity can have. A kind says what a number means, so that a rate
 * cannot pass for a probability, nor a yearly cost for a cycle's.
 */
export const KINDS = [
  'probability', // within one cycle, or within the time its label states; 0 to 1
  'rate', // events per person-year; 0 or more
  'perCycle', // events per person and cycle; 0 or more
  'ratio', // relative risk, odds ratio, hazard ratio, any factor without unit
  'logOdds', // linear predictor on the log-odds scale
  'utility', // health-state value; 1 is full health
  'disabilityWeight', // 0 full health, 1 death
  'costPerYear', // money per person-year
  'costPerCycle', // money per person and cycle
  'costOnce', // money per person, paid once
  'money', // a price or an amount, not yet a flow
  'time', // years
  'count', // persons, items, visits
  'number', // anything else without unit
] as const;

export type Kind = (typeof KINDS)[number];
