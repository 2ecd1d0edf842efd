import type { Json, Place, Step } from '../edit/edit.ts';

/**
 * What kind of change it is: a number that goes in, a formula, how the model is put
 * together, or words that no number depends on.
 */
export type Nature = 'input' | 'formula' | 'structure' | 'words';

/** Fields that are read by people only. */
const WORDS: ReadonlySet<string> = new Set([
  'about',
  'label',
  'description',
  'title',
  'decision',
  'population',
  'perspective',
  'setting',
  'referenceCase',
  'currency',
  'unit',
  'unitSingular',
  'source',
  'citation',
  'grade',
  'notes',
  'reason',
  'category',
]);

/** Parts that are what goes in: one item more or less is another input. */
const INPUTS: ReadonlySet<Step | undefined> = new Set([
  'parameters',
  'groups',
  'tables',
  'profiles',
  'question',
  'scenarios',
  'analysis',
]);

/** Fields elsewhere that are numbers to the model, and fields of the question that are not. */
const NUMBERS: ReadonlySet<string> = new Set(['cycle', 'cycles']);
const STRUCTURE: ReadonlySet<string> = new Set(['comparator', 'outcome']);

/** Of a change at a place, from `before` to `after`. */
export function natureOf(place: Place, before: Json | undefined, after: Json | undefined): Nature {
  const names = place.filter((step) => typeof step === 'string');
  const last = names.at(-1) ?? '';
  if (names.includes('formula')) return 'formula';
  if (last === 'symbol' || names.some((name) => WORDS.has(name))) return 'words';
  if (names.some((name) => STRUCTURE.has(name))) return 'structure';
  if (INPUTS.has(place[0]) || NUMBERS.has(last)) return 'input';
  const isItem = typeof place.at(-1) === 'object' && typeof (before ?? after) === 'object';
  return place[0] === 'variables' && isItem ? 'formula' : 'structure';
}

/** No number depends on the order of a list, but on that of survival curves. */
export function natureOfMove(place: Place): Nature {
  return place.includes('curves') ? 'structure' : 'words';
}
