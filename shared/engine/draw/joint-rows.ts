/** Rows of a joint sample, one row a draw for all members. */

/** A column a member, from one column of uniforms: row floor(u n) of the n rows. */
export function drawRows(
  rows: readonly (readonly number[])[],
  members: number,
  uniforms: Float64Array,
): Float64Array[] {
  return Array.from({ length: members }, (_, i) =>
    uniforms.map((u) => rows[Math.floor(u * rows.length)]?.[i] ?? Number.NaN),
  );
}
