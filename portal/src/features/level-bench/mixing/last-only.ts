/**
 * The same work with its last result kept: as long as what goes in says the same, what comes out is the same object, so
 * that nothing that hangs on it is drawn again.
 *
 * @param work - a pure function of plain data.
 */
export function lastOnly<A, R>(work: (input: A) => R): (input: A) => R {
  let last: { key: string; result: R } | undefined;
  return (input) => {
    const key = JSON.stringify(input);
    if (last?.key !== key) last = { key, result: work(input) };
    return last.result;
  };
}
