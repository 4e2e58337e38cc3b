/** Numbers that look random and are the same on every run. */
export interface Dice {
  /** Uniform in [0, 1). */
  next: () => number;
  /** Uniform in [low, high). */
  between: (low: number, high: number) => number;
  /** About normal, by the sum of twelve uniforms: mean 0, standard deviation 1, never beyond ± 6. */
  bell: () => number;
  pick: <T>(items: readonly [T, ...T[]]) => T;
}

/**
 * A counter stepped by the golden ratio and mixed, seeded by a word: plenty for demo data, not for secrets.
 *
 * @param word - any text; the same word throws the same dice.
 */
export function diceOf(word: string): Dice {
  let state =
    [...word].reduce((sum, letter) => Math.imul(sum ^ letter.charCodeAt(0), 16_777_619), 2_166_136_261) >>> 0;
  const next = (): number => {
    state = (state + 0x9e37_79b9) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 16), 0x21f0_aaad);
    mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a_2d97);
    return ((mixed ^ (mixed >>> 15)) >>> 0) / 2 ** 32;
  };
  const between = (low: number, high: number): number => low + (high - low) * next();
  const bell = (): number => Array.from({ length: 12 }, next).reduce((sum, value) => sum + value, -6);
  const pick = <T>(items: readonly [T, ...T[]]): T => items[Math.floor(next() * items.length)] ?? items[0];
  return { next, between, bell, pick };
}
