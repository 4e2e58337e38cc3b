/**
 * Works off wishes one at a time, the latest first: one that came in between is never begun, and a result nobody waits
 * for any more is not told.
 *
 * @returns the wish; the same one again, or undefined, changes nothing.
 */
export function latestOnly<I, R>(
  work: (input: I) => Promise<R>,
  tell: (input: I, result: R) => void,
): (input: I | undefined) => void {
  let wanted: I | undefined;
  let isBusy = false;
  async function workOff(): Promise<void> {
    isBusy = true;
    while (wanted !== undefined) {
      const input = wanted;
      const result = await work(input);
      if (input !== wanted) continue;
      wanted = undefined;
      tell(input, result);
    }
    isBusy = false;
  }
  return (input) => {
    wanted = input ?? wanted;
    if (!isBusy) void workOff();
  };
}
