import fc from 'fast-check';
import { between } from '../testing/between';
import { errorOf } from '../testing/error-of';
import { OutOfDomainError, verdictOf, type VerdictWindow, whyTooClose } from './index';

const level = between(-100, 100);
const uncertainty = between(0, 10);
const window: fc.Arbitrary<VerdictWindow> = fc.oneof(
  fc.tuple(level, level).map(([a, b]) => ({ low: Math.min(a, b), high: Math.max(a, b) })),
  level.map((low) => ({ low })),
  level.map((high) => ({ high })),
);

/** Asks the window itself, value by value, instead of comparing ends: 41 values from one end of the whisker to the other. */
function insides(value: number, spread: number, { low, high }: VerdictWindow): boolean[] {
  return Array.from({ length: 41 }, (_, step) => {
    const at = step === 40 ? value + spread : value - spread + (2 * spread * step) / 40;
    return !(low !== undefined && at < low) && !(high !== undefined && at > high);
  });
}

describe('a verdict', () => {
  it('passes when the uncertainty touches the end of the window from inside', () => {
    expect(verdictOf(0.5, 0.5, { low: 0, high: 3 })).toBe('pass');
    expect(verdictOf(2.5, 0.5, { low: 0, high: 3 })).toBe('pass');
  });

  it('is too close to call by the least amount past the end', () => {
    expect(verdictOf(0.5, 0.5000001, { low: 0, high: 3 })).toBe('too close to call');
  });

  it('does not round: 0.0949 ± 0.0951 shown as 0.09 ± 0.10 is judged as it is', () => {
    expect(verdictOf(0.0951, 0.0949, { low: 0 })).toBe('pass');
    expect(verdictOf(0.0949, 0.0951, { low: 0 })).toBe('too close to call');
  });

  it('is too close to call, not "not yet", while any of the uncertainty is inside', () => {
    expect(verdictOf(-0.4, 0.4, { low: 0, high: 3 })).toBe('too close to call');
    expect(verdictOf(-0.41, 0.4, { low: 0, high: 3 })).toBe('not yet');
    expect(verdictOf(3.41, 0.4, { low: 0, high: 3 })).toBe('not yet');
  });

  it('is too close to call when the uncertainty is wider than the window', () => {
    expect(verdictOf(1, 5, { low: 0, high: 2 })).toBe('too close to call');
  });

  it('judges one open end by the other', () => {
    expect(verdictOf(-32, 1.4, { high: -25 })).toBe('pass');
    expect(verdictOf(900, 1, { low: 0 })).toBe('pass');
  });

  it.each<[string, number, number, VerdictWindow, string]>([
    ['a value of NaN', NaN, 0.1, { low: 0 }, 'value'],
    ['a negative uncertainty', 0, -0.1, { low: 0 }, 'expandedUncertainty'],
    ['an infinite uncertainty', 0, Infinity, { low: 0 }, 'expandedUncertainty'],
    ['a window without ends', 0, 0.1, {}, 'window'],
    ['a reversed window', 0, 0.1, { low: 3, high: 0 }, 'high'],
    ['a window to NaN', 0, 0.1, { high: NaN }, 'high'],
  ])('refuses %s', (_title, value, spread, limits, input) => {
    const error = errorOf(() => verdictOf(value, spread, limits));
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });

  it('never passes when any value within the guard band is outside the window', () => {
    fc.assert(
      fc.property(level, uncertainty, window, (value, spread, limits) => {
        const allInside = insides(value, spread, limits).every(Boolean);
        expect(verdictOf(value, spread, limits) === 'pass').toBe(allInside);
      }),
      { numRuns: 5000 },
    );
  });

  it('never says not yet when any value within the guard band is inside', () => {
    fc.assert(
      fc.property(level, uncertainty, window, (value, spread, limits) => {
        if (insides(value, spread, limits).some(Boolean))
          expect(verdictOf(value, spread, limits)).not.toBe('not yet');
      }),
      { numRuns: 5000 },
    );
  });

  it('never gets better when the uncertainty grows', () => {
    fc.assert(
      fc.property(level, uncertainty, uncertainty, window, (value, spread, more, limits) => {
        const wider = verdictOf(value, spread + more, limits);
        if (wider !== 'too close to call') expect(verdictOf(value, spread, limits)).toBe(wider);
      }),
      { numRuns: 5000 },
    );
  });
});

describe('why it is too close', () => {
  it('names the low end, how far past it reaches and what would settle it', () => {
    const [low, ...others] = whyTooClose(0.37, 0.47, { low: 0, high: 3 });
    expect(others).toEqual([]);
    expect(low).toMatchObject({ end: 'low', limit: 0, passesFrom: 0.47, passesWithUncertainty: 0.37 });
    expect(low?.past).toBeCloseTo(0.1, 12);
    expect(low?.reach).toBeCloseTo(-0.1, 12);
  });

  it('names the high end', () => {
    expect(whyTooClose(14.59, 0.61, { low: 13, high: 15 })).toMatchObject([{ end: 'high', limit: 15 }]);
  });

  it('names both ends of a window narrower than the uncertainty', () => {
    expect(whyTooClose(1, 5, { low: 0, high: 2 }).map(({ end }) => end)).toEqual(['low', 'high']);
  });

  it('knows no uncertainty at which a value outside would pass', () => {
    expect(whyTooClose(-0.2, 0.5, { low: 0 })[0]).not.toHaveProperty('passesWithUncertainty');
  });

  it('has nothing to say about a pass or a not yet', () => {
    expect(whyTooClose(1.5, 0.4, { low: 0, high: 3 })).toEqual([]);
    expect(whyTooClose(9, 0.4, { low: 0, high: 3 })).toEqual([]);
  });

  it('gives at least one reason exactly when the verdict is too close to call', () => {
    fc.assert(
      fc.property(level, uncertainty, window, (value, spread, limits) => {
        const isTooClose = verdictOf(value, spread, limits) === 'too close to call';
        expect(whyTooClose(value, spread, limits).length > 0).toBe(isTooClose);
      }),
    );
  });
});
