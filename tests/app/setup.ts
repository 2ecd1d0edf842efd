/** What the app's component tests stand on: words, and a clean page after each test. */
import { cleanup } from '@testing-library/react';
import { afterEach, beforeAll } from 'vitest';
import { startWords } from '../../src/i18n/i18n.ts';

export function withWords(language: 'en' | 'fr' = 'en'): void {
  beforeAll(() => startWords(language));
  afterEach(cleanup);
}
