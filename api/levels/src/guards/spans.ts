import type { Span } from '../rule-sets/rule-set';

/** Binary noise of a frequency in kHz; a millihertz. */
const NOISE_KHZ = 1e-6;

/** Spans that overlap or meet, as one; sorted. */
export function merged(spans: readonly Span[]): Span[] {
  const sorted = [...spans].sort((a, b) => a[0] - b[0]);
  return sorted.reduce<Span[]>((done, span) => {
    const last = done.at(-1);
    if (last === undefined || span[0] > last[1]) return [...done, span];
    return [...done.slice(0, -1), [last[0], Math.max(last[1], span[1])]];
  }, []);
}

export function contains(outer: Span, inner: Span): boolean {
  return outer[0] <= inner[0] + NOISE_KHZ && outer[1] >= inner[1] - NOISE_KHZ;
}

/** Whether two spans share more than an edge. */
export function overlaps(a: Span, b: Span): boolean {
  return a[0] < b[1] - NOISE_KHZ && b[0] < a[1] - NOISE_KHZ;
}

/** How much of a span lies outside the nearest of others, kHz; undefined when it touches none. */
export function outside(spans: readonly Span[], inner: Span): number | undefined {
  const excess = spans
    .filter((span) => overlaps(span, inner))
    .map((span) => Math.max(span[0] - inner[0], 0) + Math.max(inner[1] - span[1], 0));
  return excess.length === 0 ? undefined : Math.min(...excess);
}
