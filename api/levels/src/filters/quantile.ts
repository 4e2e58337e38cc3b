/**
 * The value at a place in the order of an array, found without sorting all of it: time grows with its length only.
 *
 * @param values - reordered on the way; no NaN.
 * @param rank - 0 to length − 1.
 * @see C. A. R. Hoare, Algorithm 65: Find, Communications of the ACM 4 (1961)
 */
export function valueAtRank(values: Float64Array, rank: number): number {
  let low = 0;
  let high = values.length - 1;
  while (low < high) {
    const pivot = values[(low + high) >> 1] ?? 0;
    let [left, right] = [low, high];
    while (left <= right) {
      while ((values[left] ?? 0) < pivot) left++;
      while ((values[right] ?? 0) > pivot) right--;
      if (left > right) break;
      const moved = values[left] ?? 0;
      values[left++] = values[right] ?? 0;
      values[right--] = moved;
    }
    if (rank <= right) high = right;
    else if (rank >= left) low = left;
    else break;
  }
  return values[rank] ?? NaN;
}
