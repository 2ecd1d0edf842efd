/**
 * What shared/ uses beyond the language itself, and every browser, worker and Node has.
 * Its own type check (shared/tsconfig.json) knows neither browser nor Node, so that
 * nothing else slips in.
 */
interface TextEncoder {
  encode(input?: string): Uint8Array<ArrayBuffer>;
}
declare var TextEncoder: { prototype: TextEncoder; new (): TextEncoder };
