/** Fails unless the value lies within a tolerance; a missing value fails too. */
export function within(actual: number | undefined, expected: number | null, tolerance: number): void {
  const distance = Math.abs((actual ?? NaN) - (expected ?? NaN));
  // The comparison is the message: which number, against which, how far.
  expect({ actual, expected, isWithin: distance <= tolerance }).toEqual({ actual, expected, isWithin: true });
}

/** The same with the tolerance relative to what is expected. */
export function withinRel(actual: number | undefined, expected: number | null, relative: number): void {
  within(actual, expected, Math.abs(expected ?? NaN) * relative);
}
