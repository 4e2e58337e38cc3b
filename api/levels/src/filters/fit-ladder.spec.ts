import { within, withinRel } from '../../testing/within';
import {
  fitLadder,
  harmonicRejections,
  type Ladder,
  ladderResponse,
  lowPassLadder,
  rippleFromReturnLoss,
} from '../index';

// Values, tolerances and sources: api/levels/reference/filters.json, each row with its own source.

const gainAt = (ladder: Ladder, hertz: number, inductorQ?: number) =>
  ladderResponse(ladder, Float64Array.of(hertz), { inductorQ }).gainDb[0];

describe('a ladder fitted from real parts', () => {
  const exact = lowPassLadder({
    family: 'Chebyshev',
    order: 5,
    rippleDb: rippleFromReturnLoss(20),
    cutoffHertz: 15.5e6,
    sourceOhms: 50,
    first: 'shunt',
  });
  const fitted = fitLadder(exact, {
    capacitors: { series: 'E12', atMostParts: 2 },
    inductors: { alNanohenry: 4.2 },
  });

  it('has whole turns and preferred values, whose figures are the ones worked with', () => {
    const [c1, l2, c3] = fitted.elements;
    expect(l2?.turns?.turns).toBe(13);
    withinRel(l2?.value, 13 ** 2 * 4.2e-9, 1e-12);
    expect(c3?.fitted?.parts).toEqual([220e-12, 150e-12]);
    withinRel(c3?.value, 370e-12, 1e-9);
    withinRel(c1?.exactValue, exact.elements[0]?.value ?? NaN, 1e-12);
    expect(gainAt(fitted, 28e6)).not.toBe(gainAt(exact, 28e6));
  });

  it('may have coils of preferred values instead', () => {
    const chosen = fitLadder(exact, { capacitors: { series: 'E24' }, inductors: { series: 'E24' } });
    expect(chosen.elements[1]?.fitted?.parts).toEqual([680e-9]);
  });

  it('is judged at each harmonic against the carrier, nominal and worst', () => {
    const spread = {
      ladder: fitted,
      inductorQ: 180,
      capacitorToleranceRel: 0.05,
      inductorToleranceRel: 0.05,
    };
    const [second] = harmonicRejections({ ...spread, builds: 300, seed: 7 }, 14e6, [
      { harmonic: 2, neededDb: 22 },
    ]);
    const loss = -(gainAt(fitted, 14e6, 180) ?? NaN);
    within(second?.takenDb, -(gainAt(fitted, 28e6, 180) ?? NaN) - loss, 1e-9);
    expect(second?.worstDb).toBe(Math.min(...(second?.builds ?? [])));
    expect(second?.worstDb ?? NaN).toBeLessThan(second?.takenDb ?? NaN);
    within(second?.inHandDb, (second?.worstDb ?? NaN) - 22, 1e-12);
    expect(second?.passing).toBe(300);
  });
});
