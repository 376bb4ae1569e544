/**
 * A dense front by rows: `rows` × `size` numbers, of which the first `size` rows hold the lower triangle of a symmetric
 * matrix and the remaining rows right-hand sides.
 */
export type Front = Readonly<{ size: number; rows: number; a: Float64Array }>;

const dot = (a: Float64Array, i: number, j: number, n: number): number => {
  let [p, q, r, s] = [0, 0, 0, 0];
  const whole = n - (n % 4);
  for (let k = 0; k < whole; k += 4) {
    p += a[i + k]! * a[j + k]!;
    q += a[i + k + 1]! * a[j + k + 1]!;
    r += a[i + k + 2]! * a[j + k + 2]!;
    s += a[i + k + 3]! * a[j + k + 3]!;
  }
  for (let k = whole; k < n; k++) p += a[i + k]! * a[j + k]!;
  return p + q + r + s;
};

/**
 * Eliminates the first `count` unknowns of a front in place by Cholesky's method: their columns become those of the
 * factor, the rest the Schur complement, right-hand sides included.
 * @returns false where a pivot is not positive: the matrix is not positive definite.
 * @source I. Duff & J. Reid, ACM TOMS 9 (1983).
 */
export const eliminate = ({ size, rows, a }: Front, count: number): boolean => {
  for (let i = 0; i < rows; i++) {
    const row = i * size;
    const last = Math.min(i, size - 1);
    const own = Math.min(count, i);
    for (let j = 0; j < own; j++) {
      const column = j * size;
      a[row + j] = (a[row + j]! - dot(a, row, column, j)) / a[column + j]!;
    }
    if (i < count) {
      const pivot = a[row + i]! - dot(a, row, row, i);
      if (!(pivot > 0)) return false;
      a[row + i] = Math.sqrt(pivot);
      continue;
    }
    for (let j = count; j <= last; j++) a[row + j]! -= dot(a, row, j * size, count);
  }
  return true;
};
