/** Standard normal draws made to correlate. */
import { standardNormalQuantile } from '../distributions/normal.ts';

/**
 * L z for independent standard normals z: column i of the result is
 * sum over j <= i of L[i][j] z[j]. `uniforms`: a column a member, all of one length.
 */
export function correlatedNormals(
  lower: readonly (readonly number[])[],
  uniforms: readonly Float64Array[],
): Float64Array[] {
  const normals = uniforms.map((column) => column.map(standardNormalQuantile));
  return lower.map((row) => {
    const sum = new Float64Array(normals[0]?.length ?? 0);
    row.forEach((weight, j) => {
      normals[j]?.forEach((z, d) => {
        sum[d] = (sum[d] ?? 0) + weight * z;
      });
    });
    return sum;
  });
}
