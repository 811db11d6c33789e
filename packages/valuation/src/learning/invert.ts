/**
 * Inverse of a symmetric positive definite matrix by Cholesky's factors; the matrix itself is left alone.
 * @throws {RangeError} when the matrix is not positive definite
 * Source: G. H. Golub and C. F. Van Loan, Matrix Computations, section 4.2.
 */
export function invert(matrix: readonly Float64Array[]): Float64Array[] {
  const lower = cholesky(matrix);
  const columns = matrix.map((_, i) => solve(lower, i));
  return columns;
}

function cholesky(matrix: readonly Float64Array[]): Float64Array[] {
  const lower: Float64Array[] = [];
  matrix.forEach((given, i) => {
    const row = new Float64Array(matrix.length);
    lower.push(row);
    for (let j = 0; j <= i; j += 1) {
      const other = lower[j] as Float64Array;
      let rest = given[j] as number;
      for (let k = 0; k < j; k += 1) rest -= (row[k] as number) * (other[k] as number);
      if (i !== j) row[j] = rest / (other[j] as number);
      else if (rest > 0) row[j] = Math.sqrt(rest);
      else throw new RangeError('the matrix is not positive definite');
    }
  });
  return lower;
}

/** Column i of the inverse: forward through the factor, then back through its transpose. */
function solve(lower: readonly Float64Array[], column: number): Float64Array {
  const size = lower.length;
  const x = new Float64Array(size);
  const at = (i: number, j: number) => (lower[i] as Float64Array)[j] as number;
  for (let i = column; i < size; i += 1) {
    let rest = i === column ? 1 : 0;
    for (let k = column; k < i; k += 1) rest -= at(i, k) * (x[k] as number);
    x[i] = rest / at(i, i);
  }
  for (let i = size - 1; i >= 0; i -= 1) {
    let rest = x[i] as number;
    for (let k = i + 1; k < size; k += 1) rest -= at(k, i) * (x[k] as number);
    x[i] = rest / at(i, i);
  }
  return x;
}
