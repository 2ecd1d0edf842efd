/**
 * Starting points for a new model.
 *
 *   TEMPLATES[slug]({ id, year, words }): ModelDocument      valid, and runs at once
 */
import type { ModelDocument } from '../document.ts';
import { acuteChronic } from './acute-chronic.ts';
import { emptyDocument } from './empty.ts';
import { progressive } from './progressive.ts';
import { relapsing } from './relapsing.ts';
import { screening } from './screening.ts';
import type { TemplateSetting } from './template-words.ts';
import { twoState } from './two-state.ts';

/** In the order in which they are offered. */
export const TEMPLATE_SLUGS = [
  'empty',
  'two-state',
  'progressive',
  'relapsing',
  'screening',
  'acute-chronic',
] as const;
export type TemplateSlug = (typeof TEMPLATE_SLUGS)[number];

export const TEMPLATES: Readonly<
  Record<TemplateSlug, (setting: TemplateSetting) => ModelDocument>
> = {
  empty: emptyDocument,
  'two-state': twoState,
  progressive,
  relapsing,
  screening,
  'acute-chronic': acuteChronic,
};
