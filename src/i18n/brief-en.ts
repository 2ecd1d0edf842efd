/** Words of the one printed page, and of the step that it is made at. */
export const brief = {
  brief: {
    step: 'Brief',
    title: 'One page for the decision',
    lead: 'Drafted from the model as it stands, at the threshold where the poise stands. Print it, or save it as a PDF from the print window.',
    language: 'Language of the page',
    paper: 'Paper',
    letter: 'US Letter',
    draftedBy: 'Drafted by',
    print: 'Print the page',
    sheet: 'The page as it is printed',
    provisional: 'Provisional',
    waiting: 'The page is being drafted…',
    tooLong:
      'The page is too full to be printed on one sheet. Shorten the longest sentences below, or the wording of the question.',
    refused: 'There is no page to print',
    edit: {
      title: 'Sentences, as drafted or in your own words',
      body: 'What you write stands on the page in place of the draft. When the model changes, the page is marked provisional until you look at your words again.',
      readOnly: 'This appraisal cannot be changed here, so the sentences stay as drafted.',
      field: 'Sentence {{number}} of “{{part}}”',
      again: 'Take the draft again',
      stands: 'It still holds',
      stale: 'Written for an earlier model. The draft now says: {{draft}}',
      label: 'Sentence of the brief',
    },
    standing: {
      errors_one: 'The model has {{count}} error: mend it first, then the page can be printed.',
      errors_other:
        'The model has {{count}} errors: mend them first, then the page can be printed.',
      noBase: 'The base case has not been worked out.',
      baseOfOther: 'The numbers are those of an earlier model.',
      noDraws: 'The draws are not done: how sure one can be is missing.',
      drawsOfOther: 'The draws are those of an earlier model.',
      otherEngine: 'The numbers come from another version of the engine.',
      writtenForOther: 'A sentence was written for an earlier model.',
    },
    head: {
      brief: 'Brief for a decision',
      version: '{{date}}, version {{version}}',
      for: 'For: {{population}}. Where: {{setting}}.',
      invented: 'Invented data',
    },
    parts: {
      answer: 'The answer',
      options:
        'The options, a person, in order of cost; each is weighed against the next cheaper one worth having',
      howSure: 'How sure are we?',
      whatWouldChange: 'What would change the answer',
      research: 'Is more research worth it?',
      restsOn: 'What it rests on',
      reasons: 'The committee’s reasons',
      reasonsFor: 'Recommendation, conditions, dissent, date of review',
    },
    table: {
      option: 'Option',
      cost: 'Cost, {{symbol}}',
      icer: 'Each extra unit of health costs, {{symbol}}',
      best: 'Chance that it is the best choice',
      comparator: 'comparator',
      noIcer: {
        reference: 'starting point',
        dominated: 'no better than “{{because}}”, for no less',
        extendedlyDominated: 'worth less than a mix of {{because}}',
        tied: 'the same as “{{because}}”',
        beyondNumbers: 'too large to say',
      },
    },
    gloss: {
      qaly: 'QALY: quality-adjusted life year, worth one year in full health.',
      daly: 'DALY: disability-adjusted life year, one year of healthy life lost.',
      lifeYears: 'Life year: one year lived, in whatever health.',
    },
    beam: {
      alt: 'Balance: {{strategy}} against {{against}}, at {{threshold}}.',
      tipsToPoise: 'At {{threshold}}, “{{strategy}}” outweighs “{{against}}”.',
      tipsToHook: 'At {{threshold}}, “{{strategy}}” does not outweigh “{{against}}”.',
      level: 'At {{threshold}}, “{{strategy}}” and “{{against}}” weigh the same.',
      cannotLevel: '“{{strategy}}” costs more than “{{against}}” and gains no more health.',
      alwaysTipsToPoise: '“{{strategy}}” saves money and gains health against “{{against}}”.',
      noDifference: '“{{strategy}}” and “{{against}}” cost and gain the same.',
    },
    foot: {
      document: 'Document {{digest}}',
      results: 'Results {{digest}}',
      engine: 'engine {{version}}',
      check:
        'The square holds both identities in full: whoever has the model’s file can check that it is this one and that it gives these numbers.',
      threshold: 'Threshold: {{threshold}} ({{label}}).',
      thresholdFree: 'Threshold: {{threshold}}, chosen for this page.',
      source: 'Source: {{source}}.',
    },
    value: {
      about: '{{count}} of {{of}}',
      below: 'fewer than {{count}} of {{of}}',
      above: 'more than {{count}} of {{of}}',
      health: '{{amount}} {{unit}}',
      and: ' and ',
      more_one: '{{count}} other',
      more_other: '{{count}} others',
      start: 'at the start of the cycle',
      end: 'at the end of the cycle',
      trapezoid: 'with half-cycle correction (trapezoid)',
      simpson: 'with half-cycle correction (Simpson’s 1/3 rule)',
      byYear: 'a rate for each year',
    },
    sentences: {
      caution:
        'This page supports the deliberation of trained people; it gives no clinical advice. National guidelines, local rules and licensed practice come first. Have the model reviewed before a decision rests on it.',
      answer: {
        onlyStrategy: '{{strategy}}: the only option that was looked at.',
        bestEverywhere:
          '{{strategy}}: the best choice at {{inForce}}, and whatever else may be paid.',
        worthAbove:
          '{{strategy}}: the best choice at {{inForce}}, and wherever {{threshold}} or more may be paid.',
        worthBelow:
          '{{strategy}}: the best choice at {{inForce}}, and wherever no more than {{threshold}} may be paid.',
        worthBetween:
          '{{strategy}}: the best choice at {{inForce}}, and wherever from {{from}} to {{to}} may be paid.',
        neverBest: '{{strategy}}: the best choice at {{inForce}}, but by next to nothing.',
        tied: 'As good as that: {{others}}.',
        against: {
          noDifference:
            'For {{people}} people followed for {{years}}, “{{strategy}}” costs and brings the same as “{{comparator}}”.',
          dominates:
            'For {{people}} people followed for {{years}}, “{{strategy}}” costs {{cost}} less than “{{comparator}}”, with {{health}}.',
          dominated:
            'For {{people}} people followed for {{years}}, “{{strategy}}” costs {{cost}} more than “{{comparator}}”, with {{health}}.',
          moreCostlyMoreEffective:
            'For {{people}} people followed for {{years}}, “{{strategy}}” costs {{cost}} more than “{{comparator}}”, for {{health}}.',
          lessCostlyLessEffective:
            'For {{people}} people followed for {{years}}, “{{strategy}}” costs {{cost}} less than “{{comparator}}”, with {{health}}.',
        },
      },
      sure: {
        noDraws: 'How sure one can be was not worked out: the analysis asks for no draws.',
        best: 'At {{threshold}}, “{{strategy}}” is the best choice in {{frequency}} plausible cases ({{samples}} were drawn from what is uncertain).',
        next: 'Otherwise it is most often “{{strategy}}”, in {{frequency}}.',
        onMean: 'On the average of these cases, though, “{{strategy}}” comes out best.',
      },
      research: {
        none: 'None of these cases would change the answer: for this decision, more research on the inputs is worth nothing.',
        perPerson:
          'To know everything before deciding (EVPI) would be worth at most {{perPerson}} a person, at {{threshold}}. A study that costs more is not worth its price.',
        population:
          'To know everything before deciding (EVPI) would be worth at most {{population}} over {{years}}: {{perPerson}} a person, at {{threshold}}. A study that costs more is not worth its price. Counted: {{people}}.',
      },
      change: {
        below: 'Below {{threshold}}, “{{strategy}}” is the best choice.',
        above: 'Above {{threshold}}, “{{strategy}}” is the best choice.',
        noThreshold: 'No other threshold would change it.',
        profiles_one:
          'For {{count}} of the {{of}} groups of people ({{profiles}}), “{{strategy}}” would be the best choice.',
        profiles_other:
          'For {{count}} of the {{of}} groups of people ({{profiles}}), “{{strategy}}” would be the best choice.',
        sameForAll: 'It is the same for each of the {{count}} groups of people.',
      },
      rests: {
        inputs_one: '{{count}} input, of which {{details}}',
        inputs_other: '{{count}} inputs, of which {{details}}',
        uncertain_one: '{{count}} uncertain',
        uncertain_other: '{{count}} uncertain',
        weak: '{{count}} from weak evidence',
        notGraded: '{{count}} of evidence not graded',
        invented_one: '{{count}} invented',
        invented_other: '{{count}} invented',
        discounting: 'Discount rates a year: costs {{costs}}, health {{outcomes}}',
        noDiscounting: 'Neither costs nor health are discounted',
        counting: 'Counted {{method}}',
        horizon: 'People are followed for {{years}}, in {{cycles}} cycles',
        survivors: 'Alive at the end: {{frequency}}; what comes after is not counted',
        perspective: 'Costs as seen by: {{perspective}}',
        prices: 'Prices of {{year}}, currency {{currency}}',
        referenceCase: 'Reference case: {{label}}',
      },
    },
  },
};
