import { expect, test } from 'vitest';
import { digestOf, sha256Hex } from '../../shared/model/digest.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

// FIPS 180-2, appendix B (examples B.1 to B.3, carried on with FIPS 180-4), and the
// empty message of the same algorithm's published test vectors.
test.each([
  ['', 'e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855'],
  ['abc', 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad'],
  [
    'abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq',
    '248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
  ],
  ['a'.repeat(1_000_000), 'cdc76e5c9914fb9281a1c7e284d73e67f1809a48a497200e046d39ccc7112cd0'],
])('SHA-256 of a published message (case %#)', (message, digest) => {
  expect(sha256Hex(message)).toBe(digest);
});

test('is that of the canonical form in UTF-8, so the order of keys does not matter', () => {
  expect(digestOf({ b: 'é', a: 1 })).toBe(sha256Hex('{"a":1,"b":"é"}'));
  expect(digestOf({ a: 1, b: 'é' })).toBe(digestOf({ b: 'é', a: 1 }));
});

test('changes with any value of a document', () => {
  const other = tinyDocument();
  other.parameters[0]!.value += 1e-15;
  expect(digestOf(other)).not.toBe(digestOf(tinyDocument()));
  expect(digestOf(tinyDocument())).toMatch(/^[0-9a-f]{64}$/);
});
