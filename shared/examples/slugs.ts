/** Slugs of the worked examples, in the order in which they are listed; SLUG.json is beside this file. */
export const EXAMPLE_SLUGS = [
  'keeping-hearts-well',
  'test-before-treating',
  'a-chair-or-a-kidney',
  'more-time-with-a-new-drug',
  'hiv-combination-therapy',
] as const;

export type ExampleSlug = (typeof EXAMPLE_SLUGS)[number];
