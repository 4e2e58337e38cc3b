import fc from 'fast-check';
import { within } from '../../testing/within';
import { explainShortfall, type PlannedStage, shortfallText } from '../index';

// Values, tolerances and sources: api/levels/reference/cascade.json, each row with its own source.
import { between } from '../../testing/between';

const planned = (name: string, plannedDbm: number, measuredDbm?: number, toleranceDb = 2): PlannedStage => {
  return { name, plannedDbm, toleranceDb, measuredDbm, expandedUncertaintyDb: 0.4 };
};

describe('where a level went', () => {
  it('is the stage whose gain is off, not those that pass its error on', () => {
    const found = explainShortfall([
      planned('Balanced modulator', -18, -18.2),
      planned('Crystal filter', -24, -27.3),
      planned('IF amplifier', -10, -13.2, 1.5),
      planned('Mixer', -16.5, -19.9),
    ]);
    within(found.offPlanDb, -3.4, 1e-9);
    expect(found.causes.map(({ name }) => name)).toEqual(['Crystal filter']);
    expect(shortfallText(found)).toBe(
      '3.4 dB are missing at the Mixer. The Crystal filter takes 3.1 dB more than planned; the stage before it is inside.',
    );
  });

  it('is told of an amplifier as gain, and of the stages before it together', () => {
    const found = explainShortfall([
      planned('Mixer', -16.5, -16.4),
      planned('Band-pass filter', -19, -19.2),
      planned('Pre-driver', 1.5, -2.5),
    ]);
    expect(shortfallText(found)).toBe(
      '4.0 dB are missing at the Pre-driver. The Pre-driver gives 3.8 dB less than planned; the stages before it are inside.',
    );
  });

  it('may be too much, from several stages, the most first', () => {
    const found = explainShortfall([
      planned('Mixer', -16.5, -16.5),
      planned('Filter', -19, -16),
      planned('Driver', 1, 6),
    ]);
    expect(shortfallText(found)).toBe(
      '5.0 dB are too much at the Driver. The Filter takes 3.0 dB less than planned; the Driver gives 2.0 dB more than planned; the stage before it is inside.',
    );
  });

  it('may be hidden in part by a stage that went the other way', () => {
    const found = explainShortfall([planned('A', 0, -5), planned('B', 10, 7)]);
    expect(found.causes.map(({ name }) => name)).toEqual(['A']);
    expect(found.hiding.map(({ name }) => name)).toEqual(['B']);
    expect(shortfallText(found)).toContain('The A comes out 5.0 dB low; it is the first one measured.');
  });

  it('reaches over stages that were not measured, and says so', () => {
    const found = explainShortfall([planned('A', 0, 0), planned('B', -6), planned('C', -8, -12)]);
    expect(found.causes[0]?.across).toEqual(['B']);
    expect(shortfallText(found)).toContain('with what lies before it unmeasured (B), takes 4.0 dB more');
  });

  it('is left open where the readings’ uncertainty is as large', () => {
    const wide = { ...planned('B', -3, -5.5), expandedUncertaintyDb: 3 };
    expect(shortfallText(explainShortfall([planned('A', 0, 0), wide]))).toContain(
      'which the readings leave open',
    );
  });

  it('names the stages outside already, and nobody while the end is inside', () => {
    const found = explainShortfall([planned('A', 0, -2.5), planned('B', -6, -12)]);
    expect(shortfallText(found)).toContain('before it, outside already: A.');
    const inside = explainShortfall([planned('A', 0, -5), planned('B', 10, 9)]);
    expect([inside.causes, shortfallText(inside)]).toEqual([[], 'The level at the B is inside its window.']);
  });

  it('is nobody’s in particular when each took a little', () => {
    const many = ['A', 'B', 'C', 'D', 'E'].map((name, index) => planned(name, 0, -0.6 * (index + 1)));
    expect(shortfallText(explainShortfall(many))).toContain('No one stage stands out');
  });

  it('adds up: what the stages changed is what is off at the end', () => {
    const level = between(-60, 40);
    fc.assert(
      fc.property(
        fc.array(fc.tuple(level, fc.option(level)), { minLength: 1, maxLength: 9 }),
        level,
        (pairs, last) => {
          const list = [
            ...pairs.map(([plan, found]) => planned('x', plan, found ?? undefined)),
            planned('end', 0, last),
          ];
          const { stages: shares, offPlanDb } = explainShortfall(list);
          expect(shares.reduce((sum, { changeDb }) => sum + changeDb, 0)).toBeCloseTo(offPlanDb, 6);
        },
      ),
    );
  });
});
