import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { canonical } from './canonical.ts';

/**
 * Identity of a document: SHA-256 (FIPS 180-4), in hex, of the UTF-8 bytes of its
 * canonical form. Taken of a document as read, defaults filled in, so a file that
 * leaves a default out and one that writes it are the same document. For that to
 * stay so, a field that a later version adds has to be optional without a default.
 */
export function digestOf(document: unknown): string {
  return sha256Hex(canonical(document));
}

/** SHA-256 in lower-case hex of a text's UTF-8 bytes. */
export function sha256Hex(text: string): string {
  return bytesToHex(sha256(utf8ToBytes(text)));
}
