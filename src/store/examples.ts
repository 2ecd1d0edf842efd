/**
 * The worked examples that ship with the app. The list needs a few facts of each; the
 * documents themselves are chunks of their own, fetched when one is opened.
 */
import type { ModelDocument } from '../../shared/model/document.ts';

export interface ExampleFacts {
  readonly slug: string;
  readonly title: string;
  readonly decision: string;
  readonly invented: boolean;
  readonly strategies: number;
}

type Part<K extends keyof ModelDocument> = Record<string, ModelDocument[K]>;

// One key of each file: the build leaves the rest of the document out of this chunk.
const questions: Part<'question'> = import.meta.glob('../../shared/examples/*.json', {
  eager: true,
  import: 'question',
});
const abouts: Part<'about'> = import.meta.glob('../../shared/examples/*.json', {
  eager: true,
  import: 'about',
});
const strategies: Part<'strategies'> = import.meta.glob('../../shared/examples/*.json', {
  eager: true,
  import: 'strategies',
});
const texts = import.meta.glob<string>('../../shared/examples/*.json', {
  query: '?raw',
  import: 'default',
});

/** The order of the list; an example not named here comes after, by its slug. */
const ORDER = [
  'keeping-hearts-well',
  'test-before-treating',
  'a-chair-or-a-kidney',
  'more-time-with-a-new-drug',
  'hiv-combination-therapy',
];

export function listExamples(): ExampleFacts[] {
  return Object.entries(questions)
    .map(([path, question]) => ({
      slug: slugOf(path),
      title: question.title,
      decision: question.decision ?? question.population,
      invented: abouts[path]?.invented ?? false,
      strategies: strategies[path]?.length ?? 0,
    }))
    .sort((a, b) => rank(a.slug) - rank(b.slug) || (a.slug < b.slug ? -1 : 1));
}

/** The JSON text of an example, or null where there is none of that name. */
export async function exampleText(slug: string): Promise<string | null> {
  const load = texts[`../../shared/examples/${slug}.json`];
  return load ? load() : null;
}

function slugOf(path: string): string {
  return path.slice(path.lastIndexOf('/') + 1, -'.json'.length);
}

function rank(slug: string): number {
  const place = ORDER.indexOf(slug);
  return place < 0 ? ORDER.length : place;
}
