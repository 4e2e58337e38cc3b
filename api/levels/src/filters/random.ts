/** Marsaglia's xorshift needs a state that is not all zero; these digits of π see to it whatever the seed. */
const PI_WORDS = [0x243f6a88, 0x85a308d3, 0x13198a2e];

/**
 * Numbers from 0 to under 1, the same on every machine for the same seed.
 *
 * @param seed - any whole number; its lowest 32 bits count.
 * @see G. Marsaglia, Xorshift RNGs, Journal of Statistical Software 8 (2003), the four-word generator
 */
export function seededRandom(seed: number): () => number {
  let x = seed | 0;
  let [y = 1, z = 1, w = 1] = PI_WORDS;
  const next = () => {
    const t = x ^ (x << 11);
    x = y;
    y = z;
    z = w;
    w = w ^ (w >>> 19) ^ (t ^ (t >>> 8));
    return (w >>> 0) / 2 ** 32;
  };
  // Neighbouring seeds begin alike; a few turns part them.
  for (let turn = 0; turn < 32; turn++) next();
  return next;
}
