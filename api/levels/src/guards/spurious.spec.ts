import fc from 'fast-check';
import spuriousTable from '../../reference/spurious.json';
import { between } from '../../testing/between';
import { within, withinRel } from '../../testing/within';
import {
  harmonicFilterFor,
  idealAttenuationDb,
  judgeSpurs,
  rippleFromReturnLoss,
  spuriousLimit,
  type SpuriousRuleId,
} from '../index';

// Values, tolerances and sources: api/levels/reference/spurious.json, rf-exposure.json and thermal-and-supply.json, each
// row with its own source.

describe('spurious limits against the rules’ own points', () => {
  it.each(spuriousTable.check_points)('$id', ({ inputs, expected, tolerance }) => {
    const published: [SpuriousRuleId, { min_dB: number; max_spur_W?: number }][] = [
      ['US below 30 MHz', expected['97.307(d)_after_2003']],
      ['US below 30 MHz, before 2003', expected['97.307(d)_2003_or_before']],
      ['US 30 to 225 MHz', expected['97.307(e)_30_225MHz']],
      ['ITU below 30 MHz', expected.ITU_below_30MHz],
      ['ITU above 30 MHz', expected.ITU_above_30MHz],
    ];
    for (const [rule, { min_dB: minimum, max_spur_W: most }] of published) {
      const limit = spuriousLimit(rule, inputs.P_W);
      within(limit.attenuationDb, minimum, tolerance.dB);
      if (most !== undefined) withinRel(limit.greatestWatts, most, tolerance.rel);
    }
  });

  it('itu-const: 43 + 10 log P is −13 dBm until 5.01 W, where 50 dB begin', () => {
    within(spuriousLimit('ITU below 30 MHz', 2).greatestDbm, -13, 0.01);
    expect(spuriousLimit('ITU below 30 MHz', 5.01).attenuationDb).toBeLessThan(50);
    expect(spuriousLimit('ITU below 30 MHz', 5.02).attenuationDb).toBe(50);
  });

  it.each(spuriousTable.application)('$id: spurs of a transmitter', ({ inputs, expected, tolerance }) => {
    const spurs = inputs.spurs.map(({ dBc }) => ({ dbc: dBc }));
    const us = judgeSpurs(spuriousLimit('US below 30 MHz', inputs.P_W), spurs);
    const itu = judgeSpurs(spuriousLimit('ITU below 30 MHz', inputs.P_W), spurs);
    expected.rows.forEach((row, index) => {
      within(us[index]?.marginDb, row.us_margin_dB, tolerance.dB);
      within(itu[index]?.marginDb, row.itu_margin_dB, tolerance.dB);
      expect(us[index]?.verdict === 'pass').toBe(row.us_ok);
      expect(itu[index]?.verdict === 'pass').toBe(row.itu_ok);
    });
  });

  it('never pass when the uncertainty reaches over the limit, and ask the filter for it too', () => {
    const dbc = between(-90, 0);
    const uncertainty = between(0, 5);
    fc.assert(
      fc.property(dbc, uncertainty, (level, expandedUncertaintyDb) => {
        const [spur] = judgeSpurs({ attenuationDb: 43 }, [{ dbc: level, expandedUncertaintyDb }]);
        expect(spur?.verdict === 'pass').toBe(level + expandedUncertaintyDb <= -43);
        expect((spur?.neededDb ?? NaN) === 0).toBe(level + expandedUncertaintyDb <= -43);
      }),
    );
  });
});

describe('the harmonic filter asked for', () => {
  const needs = [
    { harmonic: 2, neededDb: 22 },
    { harmonic: 3, neededDb: 33 },
    { harmonic: 4, neededDb: 12 },
  ];
  const wanted = { carrierHertz: 14e6, cutoffHertz: 15.5e6, rippleDb: rippleFromReturnLoss(20), needs };

  it('is the least that takes each harmonic', () => {
    const filter = harmonicFilterFor(wanted);
    expect(filter?.order).toBe(5);
    needs.forEach(({ neededDb }, index) =>
      expect(filter?.takenDb[index] ?? 0).toBeGreaterThanOrEqual(neededDb),
    );
    const three = idealAttenuationDb({ family: 'Chebyshev', order: 3, rippleDb: wanted.rippleDb }, 28 / 15.5);
    expect(three).toBeLessThan(22);
  });

  it('is none when nine elements do not do', () => {
    expect(harmonicFilterFor({ ...wanted, needs: [{ harmonic: 2, neededDb: 120 }] })).toBeUndefined();
  });
});
