import canonicalize from 'canonicalize';

/**
 * Canonical JSON text of a plain value by RFC 8785 (JSON Canonicalization Scheme):
 * no white space, keys in the order of their UTF-16 units, numbers and text as
 * ECMAScript writes them. `undefined` fields are left out. Throws a RangeError on
 * what JSON cannot hold: numbers that are not finite, a lone `undefined`.
 */
export function canonical(value: unknown): string {
  const text = serialised(value);
  if (text === undefined) throw new RangeError('not a JSON value');
  return text;
}

function serialised(value: unknown): string | undefined {
  try {
    return canonicalize(value);
  } catch (cause) {
    throw new RangeError('not a JSON value', { cause });
  }
}
