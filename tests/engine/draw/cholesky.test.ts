/** Against tests/golden/distributions.json, multivariate_normal (R 4.2.2 base::chol). */
import { describe, expect, it } from 'vitest';
import { cholesky } from '../../../shared/engine/draw/cholesky.ts';
import { expectClose } from '../close.ts';
import { goldenNormals } from '../distributions/golden.ts';

describe('cholesky', () => {
  it.each(goldenNormals)('$id', ({ covariance, cholesky_lower: want }) => {
    const lower = cholesky(covariance);
    want.forEach((row, i) => {
      row.forEach((value, j) => {
        expectClose(lower?.[i]?.[j] ?? 0, value, 1e-12, `L[${i}][${j}]`);
      });
    });
  });

  it.each([
    [
      [
        [1, 1],
        [1, 1],
      ],
    ],
    [
      [
        [1, 2],
        [2, 1],
      ],
    ],
    [[[0]]],
    [[[-1]]],
    [[[Number.NaN]]],
  ])('has none for %j, which is not positive definite', (matrix) => {
    expect(cholesky(matrix)).toBeUndefined();
  });
});
