import fc from 'fast-check';
import table from '../../reference/preferred-values.json';
import { between } from '../../testing/between';
import { within } from '../../testing/within';
import {
  fittedPart,
  nearestPreferred,
  OutOfDomainError,
  PREFERRED_SERIES,
  preferredNeighbours,
  preferredSignificands,
} from '../index';

// Values and sources: api/levels/reference/preferred-values.json (IEC 60063:2015).

describe('preferred values against IEC 60063:2015', () => {
  it.each(table.entries)('$id: every significand', ({ inputs, expected }) => {
    const series = PREFERRED_SERIES.find((known) => known === inputs.series) ?? 'E3';
    expect(preferredSignificands(series)).toEqual(expected.significands);
    expect(preferredSignificands(series)).toHaveLength(expected.count);
  });

  it.each(table.nearest_value_cases)('$id: nearest to $inputs.value', ({ inputs, expected, tolerance }) => {
    for (const series of ['E12', 'E24', 'E96'] as const) {
      const published = expected[series];
      const { below, above } = preferredNeighbours(inputs.value, series);
      expect({ below, above }).toEqual({ below: published.below, above: published.above });
      const nearest = nearestPreferred(inputs.value, series);
      expect(nearest.value).toBe(published.nearest_linear);
      within(100 * nearest.errorRel, published.error_pct_of_nearest_linear, tolerance.error_pct);
      expect(nearestPreferred(inputs.value, series, 'ratio').value).toBe(published.nearest_log);
    }
  });
});

const wanted = fc.double({ min: 1e-12, max: 1e7, noNaN: true });
const series = fc.constantFrom(...PREFERRED_SERIES);
const quantity = fc.constantFrom('resistance' as const, 'capacitance' as const, 'inductance' as const);

/** By trying every pair there is, three decades either way. */
function bestByTrial(value: number, add: (a: number, b: number) => number): number {
  const decades = [-2, -1, 0, 1, 2].map((step) => Math.floor(Math.log10(value)) + step);
  const values = decades.flatMap((decade) => preferredSignificands('E6').map((s) => s * 10 ** decade));
  let best = Infinity;
  for (const a of values) for (const b of values) best = Math.min(best, Math.abs(add(a, b) / value - 1));
  return best;
}

describe('a value made up of parts', () => {
  it('is never further away with two parts than with one, and is what its parts make', () => {
    fc.assert(
      fc.property(wanted, series, quantity, (value, chosen, kind) => {
        const one = fittedPart(value, kind, { series: chosen });
        const two = fittedPart(value, kind, { series: chosen, atMostParts: 2, enoughRel: 0 });
        expect(Math.abs(two.errorRel)).toBeLessThanOrEqual(Math.abs(one.errorRel));
        const [a = NaN, b] = two.parts;
        const adds = (kind === 'capacitance') === (two.arrangement === 'parallel');
        const made = b === undefined ? a : adds ? a + b : (a * b) / (a + b);
        expect(made / two.value).toBeCloseTo(1, 9);
        expect(two.value / value - 1).toBeCloseTo(two.errorRel, 9);
      }),
    );
  });

  it('is as near as trying every pair of E6 values finds', () => {
    fc.assert(
      fc.property(between(1, 1000), (value) => {
        const found = fittedPart(value, 'resistance', { series: 'E6', atMostParts: 2, enoughRel: 0 });
        const byTrial = Math.min(
          bestByTrial(value, (a, b) => a + b),
          bestByTrial(value, (a, b) => (a * b) / (a + b)),
          Math.abs(nearestPreferred(value, 'E6').errorRel),
        );
        // Pairs in which one part gives under a hundredth are left out on purpose.
        expect(Math.abs(found.errorRel)).toBeLessThanOrEqual(byTrial + 0.01);
      }),
      { numRuns: 50 },
    );
  });

  it('stays one part where that is near enough', () => {
    expect(fittedPart(201, 'capacitance', { series: 'E24', atMostParts: 2 }).parts).toEqual([200]);
    expect(fittedPart(201, 'capacitance', { series: 'E24', atMostParts: 2, enoughRel: 0 }).parts.length).toBe(
      2,
    );
  });

  it.each([0, -1, NaN, Infinity])('refuses a value of %d', (value) => {
    expect(() => fittedPart(value, 'resistance', { series: 'E24' })).toThrow(OutOfDomainError);
    expect(() => preferredNeighbours(value, 'E24')).toThrow(OutOfDomainError);
  });
});
