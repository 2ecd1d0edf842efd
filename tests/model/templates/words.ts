import type { TemplateWords } from '../../../shared/model/templates/template-words.ts';

/** Every word is its own name: what is missing or left in another language would show. */
export const words = new Proxy({} as TemplateWords, {
  get: (_, name) => `word ${String(name)}`,
});
