import { ImpossibleInput } from '../outcome';

/**
 * What is the inverse of this symmetric, positive definite matrix?
 *
 * Takes a square matrix as rows; returns its inverse as rows, and leaves the given one alone. Never insufficient;
 * throws ImpossibleInput when the matrix is not positive definite. Method: Gauss and Jordan without exchange of
 * rows, which such a matrix does not need. Example: [[2]] gives [[0.5]].
 */
export function invertedPositive(matrix: readonly (readonly number[])[]): number[][] {
  const size = matrix.length;
  const work = matrix.map((row, index) => [...row, ...matrix.map((_, column) => (column === index ? 1 : 0))]);
  for (let pivot = 0; pivot < size; pivot += 1) {
    const pivotRow = work[pivot] as number[];
    const head = pivotRow[pivot] as number;
    if (!(head > 1e-9)) throw new ImpossibleInput('The matrix is not positive definite.', 'matrix');
    for (let column = 0; column < 2 * size; column += 1)
      pivotRow[column] = (pivotRow[column] as number) / head;
    work.forEach((row, index) => {
      const factor = row[pivot] as number;
      if (index === pivot || factor === 0) return;
      for (let column = 0; column < 2 * size; column += 1) {
        row[column] = (row[column] as number) - factor * (pivotRow[column] as number);
      }
    });
  }
  return work.map((row) => row.slice(size));
}

/** c′ M c for a symmetric matrix M, the variance of a contrast in units of the error variance. */
export function symmetricForm(matrix: readonly (readonly number[])[], contrast: readonly number[]): number {
  return matrix.reduce(
    (sum, row, index) =>
      sum +
      (contrast[index] as number) *
        row.reduce((inner, entry, column) => inner + entry * (contrast[column] as number), 0),
    0,
  );
}
