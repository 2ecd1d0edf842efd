import type { ModelDocument } from '../document.ts';
import { baseDocument, living, rowOut } from './parts.ts';
import type { TemplateSetting } from './template-words.ts';

/**
 * The least that holds together: one strategy and one state that nobody leaves. To be
 * led through the question first.
 */
export function emptyDocument(setting: TemplateSetting): ModelDocument {
  const { words } = setting;
  return baseDocument(setting, {
    about: { invented: false },
    strategies: [{ id: 'usual', label: words.usualCare }],
    states: [living('alive', words.alive)],
    start: { remainder: 'alive', shares: [] },
    movements: { type: 'rows', rows: [rowOut('alive', {})] },
  });
}
