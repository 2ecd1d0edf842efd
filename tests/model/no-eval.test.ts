import { expect, test, vi } from 'vitest';

test('reading a document never reaches for the Function constructor', async () => {
  const construct = vi.fn(() => {
    throw new Error('blocked as a strict Content-Security-Policy would');
  });
  vi.stubGlobal('Function', construct);
  const { readDocument } = await import('../../shared/model/read.ts');
  const { tinyDocument } = await import('../fixtures/tiny-document.ts');
  expect(readDocument(JSON.stringify(tinyDocument())).document).not.toBeNull();
  expect(construct).not.toHaveBeenCalled();
  vi.unstubAllGlobals();
});
