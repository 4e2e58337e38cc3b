import fc from 'fast-check';
import { between } from '../../testing/between';
import { within } from '../../testing/within';
import { type Ladder, ladderMatrix, ladderResponse, lowPassLadder, powerShares } from '../index';

// Values, tolerances and sources: api/levels/reference/filters.json, each row with its own source.

const gainAt = (ladder: Ladder, hertz: number, inductorQ?: number) =>
  ladderResponse(ladder, Float64Array.of(hertz), { inductorQ }).gainDb[0];

const anyLadder = fc
  .array(
    fc.record({
      place: fc.constantFrom('series' as const, 'shunt' as const),
      part: fc.constantFrom('inductor' as const, 'capacitor' as const),
      scale: between(-1, 1),
    }),
    { minLength: 1, maxLength: 12 },
  )
  .map((parts): Ladder => {
    const elements = parts.map(({ place, part, scale }, index) => {
      return { name: `X${index}`, place, part, value: (part === 'inductor' ? 1e-6 : 400e-12) * 10 ** scale };
    });
    return { elements, sourceOhms: 50, loadOhms: 75 };
  });
const frequency = between(1e6, 60e6);

describe('any loss-free ladder', () => {
  it('is reciprocal: AD − BC is 1', () => {
    fc.assert(
      fc.property(anyLadder, frequency, (ladder, hertz) => {
        const { a, b, c, d } = ladderMatrix(ladder, hertz);
        const re = a.re * d.re - a.im * d.im - b.re * c.re + b.im * c.im;
        const size = Math.hypot(a.re, a.im) * Math.hypot(d.re, d.im) + 1;
        expect(Math.abs(re - 1) / size).toBeLessThan(1e-9);
      }),
    );
  });

  it('conserves power: what is not delivered comes back', () => {
    fc.assert(
      fc.property(anyLadder, frequency, (ladder, hertz) => {
        const { delivered, reflected, heat } = powerShares(ladder, hertz);
        expect(delivered + reflected).toBeCloseTo(1, 8);
        expect(heat).toBeLessThan(1e-8);
      }),
    );
  });

  it('has one response whether its matrices are multiplied or applied to the load', () => {
    fc.assert(
      fc.property(anyLadder, frequency, (ladder, hertz) => {
        const { a, b, c, d } = ladderMatrix(ladder, hertz);
        const { sourceOhms: rs, loadOhms: rl } = ladder;
        const re = a.re + b.re / rl + rs * (c.re + d.re / rl);
        const im = a.im + b.im / rl + rs * (c.im + d.im / rl);
        const gainDb = 10 * Math.log10((4 * rs) / rl / (re * re + im * im));
        expect(gainAt(ladder, hertz)).toBeCloseTo(gainDb, 7);
      }),
    );
  });

  it('passes as much from its load to its source', () => {
    fc.assert(
      fc.property(anyLadder, frequency, (ladder, hertz) => {
        const turned = {
          elements: [...ladder.elements].reverse(),
          sourceOhms: ladder.loadOhms,
          loadOhms: ladder.sourceOhms,
        };
        expect(gainAt(turned, hertz)).toBeCloseTo(gainAt(ladder, hertz) ?? NaN, 7);
      }),
    );
  });

  it('only loses by losses, and turns to heat what neither arrives nor comes back', () => {
    fc.assert(
      fc.property(anyLadder, frequency, (ladder, hertz) => {
        const { delivered, reflected, heat } = powerShares(ladder, hertz, { inductorQ: 50, capacitorQ: 300 });
        expect(delivered + reflected).toBeLessThanOrEqual(1 + 1e-12);
        expect(delivered + reflected + heat).toBeCloseTo(1, 9);
      }),
    );
  });

  it('never gives a figure that is not finite, at any frequency a radio could mean', () => {
    const extreme = fc.double({ min: 1e-3, max: 1e15, noNaN: true });
    fc.assert(
      fc.property(anyLadder, extreme, (ladder, hertz) => {
        const { gainDb, returnLossDb } = ladderResponse(ladder, Float64Array.of(hertz));
        expect([gainDb[0], returnLossDb[0]].every(Number.isFinite)).toBe(true);
        expect(gainDb[0]).toBeLessThanOrEqual(1e-6);
      }),
    );
  });

  it('returns everything where it lets nothing through', () => {
    const ladder = lowPassLadder({
      family: 'Butterworth',
      order: 15,
      cutoffHertz: 1e3,
      sourceOhms: 50,
      first: 'shunt',
    });
    const { gainDb, returnLossDb } = ladderResponse(ladder, Float64Array.of(1e15));
    expect(gainDb[0]).toBe(-1000);
    within(returnLossDb[0], 0, 1e-9);
  });
});
