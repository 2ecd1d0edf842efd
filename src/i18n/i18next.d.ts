import 'i18next';
import type { en } from './en.ts';

/** English is the measure of every key: a misspelt one does not compile. */
declare module 'i18next' {
  interface CustomTypeOptions {
    resources: { translation: typeof en };
    returnNull: false;
  }
}
