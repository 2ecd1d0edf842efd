/**
 * An error that is said to whoever asked: data, never words and never a stack.
 * Every other error is a fault of the hub's own and is told apart as `hub.internal`.
 */
export class Fault extends Error {
  readonly code: string;
  readonly status: number;
  readonly path: readonly (string | number)[];
  readonly params: Readonly<Record<string, string | number>>;

  constructor(
    code: string,
    status: number,
    params: Readonly<Record<string, string | number>> = {},
    path: readonly (string | number)[] = [],
  ) {
    super(code);
    this.code = code;
    this.status = status;
    this.params = params;
    this.path = path;
  }

  /** The body of an answer: `{ error: { code, path, params } }`. */
  body() {
    return { error: { code: this.code, path: this.path, params: this.params } };
  }
}
