const [USUAL_FIRST, EARLIEST] = [12, 6];

/** The hour at which the lanes open: noon, or earlier when something stands before it. The rest is a scroll away. */
export function firstHour(blocks: readonly { top: number }[]): number {
  const first = Math.min(USUAL_FIRST * 60, ...blocks.map(({ top }) => top));
  return Math.max(EARLIEST, Math.floor(first / 60));
}
