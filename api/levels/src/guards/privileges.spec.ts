import fc from 'fast-check';
import regionTable from '../../reference/bands-iaru-r1.json';
import usTable from '../../reference/bands-us.json';
import { errorOf } from '../../testing/error-of';
import { within, withinRel } from '../../testing/within';
import {
  bandsOf,
  checkEmission,
  type EmissionInput,
  type EmissionKind,
  IARU_REGION_1,
  occupiedBand,
  OutOfDomainError,
  radiatedPower,
  US_97,
} from '../index';

// Values and sources: api/levels/reference/bands-us.json and bands-iaru-r1.json, each row with its own source.

const DAY = '2026-12-01';
const asked = (overrides: Partial<EmissionInput> & { kHz: readonly number[] }): EmissionInput => {
  const { kHz, ...others } = overrides;
  const [low = NaN, high = NaN] = kHz;
  return {
    ruleSet: US_97,
    licenceClass: 'extra',
    emission: 'CW',
    day: DAY,
    lowHertz: low * 1000,
    highHertz: high * 1000,
    ...others,
  };
};
const bandName = (short: string) => `${short.slice(0, -1)} m`;

describe('the United States, 47 CFR part 97', () => {
  it.each(usTable.allocations)('$id: edges of the class', ({ inputs, expected }) => {
    const rows = US_97.bands.filter(
      ({ band, classes, regions }) =>
        band === bandName(inputs.band) &&
        (classes ?? []).includes(inputs.class) &&
        (regions ?? [2]).includes(inputs.itu_region),
    );
    expect(rows.flatMap(({ spans }) => spans)).toEqual(expected.kHz);
  });

  it.each(usTable.allocations)(
    '$id: Morse fits inside each edge and not across it',
    ({ inputs, expected }) => {
      const licenceClass = inputs.class;
      for (const [low = NaN, high = NaN] of expected.kHz) {
        expect(checkEmission(asked({ licenceClass, kHz: [low, low + 0.2] })).fits).toBe(true);
        expect(checkEmission(asked({ licenceClass, kHz: [high - 0.2, high] })).fits).toBe(true);
        // 80 and 75 m meet at 3600 kHz, and only those who have both may straddle it.
        const isJoint = (edge: number) => edge === 3600 && licenceClass === 'extra';
        expect(checkEmission(asked({ licenceClass, kHz: [low - 0.1, low + 0.1] })).fits).toBe(isJoint(low));
        expect(checkEmission(asked({ licenceClass, kHz: [high - 0.1, high + 0.1] })).fits).toBe(
          isJoint(high),
        );
      }
    },
  );

  it('gives no class a band the table does not', () => {
    const listed = new Set(
      usTable.allocations.map(({ inputs }) => `${inputs.class} ${bandName(inputs.band)}`),
    );
    for (const { band, classes } of US_97.bands)
      for (const name of classes ?? []) expect(listed).toContain(`${name} ${band}`);
  });

  it.each(usTable.emission_segments)('$id: segment $inputs.kHz kHz', ({ inputs, expected }) => {
    const row = US_97.segments.find(
      ({ span, emissions }) =>
        String(span) === String(inputs.kHz) && String(emissions) === String(expected.emissions),
    );
    expect(row).toBeDefined();
  });

  it('has no segment the table does not', () => {
    expect(US_97.segments).toHaveLength(usTable.emission_segments.length);
  });

  it.each(usTable.region_differences)('$id: edges in other regions', ({ inputs, expected }) => {
    const spansOf = (licenceClass: string, region: number) =>
      US_97.bands
        .filter(
          ({ band, classes, regions }) =>
            band === bandName(inputs.band) &&
            (classes ?? []).includes(licenceClass) &&
            (regions ?? [1, 2, 3]).includes(region),
        )
        .flatMap(({ spans }) => spans);
    const byClass = Object.entries(expected).filter(([, value]) => 'region1' in (value as object));
    for (const [licenceClass, edges] of byClass) {
      const { region1, region3 } = edges as { region1: number[][]; region3: number[][] };
      expect(spansOf(licenceClass, 1)).toEqual(region1);
      expect(spansOf(licenceClass, 3)).toEqual(region3);
    }
    if ('region1_kHz' in expected) {
      expect(spansOf('general', 1)).toEqual(expected.region1_kHz);
      expect(spansOf('general', 3)).toEqual(expected.region3_kHz);
    }
    if (inputs.band === '6m')
      expect([spansOf('extra', 1), spansOf('extra', 3)]).toEqual([[], [[50000, 54000]]]);
  });

  it.each(usTable.check_points.filter(({ id }) => id.startsWith('chk')))(
    '$id: $inputs.class, $inputs.emission at $inputs.occupied_kHz kHz',
    ({ inputs, expected }) => {
      const check = checkEmission(
        asked({
          licenceClass: inputs.class,
          emission: inputs.emission as EmissionKind,
          region: inputs.itu_region,
          kHz: inputs.occupied_kHz ?? [],
        }),
      );
      expect(check.fits).toBe(expected.ok);
      expect(check.reasons.length > 0).toBe(!expected.ok);
      for (const { text, rule } of check.reasons)
        expect([text.length > 10, rule.length > 3]).toEqual([true, true]);
      expect(check.caution).toContain('your licence');
    },
  );

  it('pub-1 to pub-3: the occupied band counts, not the dial', () => {
    const data = (carrier: number) =>
      checkEmission({ ...asked({ kHz: [1, 2], emission: 'data' }), ...occupiedBand(carrier, 'upper', 2800) });
    expect(data(14.1472e6).fits).toBe(true);
    expect(data(14.1473e6).fits).toBe(false);
    expect(occupiedBand(3.603e6, 'lower', 3000).lowHertz).toBe(3.6e6);
    const [reason] = checkEmission(asked({ emission: 'phone', kHz: [14348, 14351] })).reasons;
    expect([reason?.kind, reason?.outsideHertz]).toEqual(['outside', 1000]);
  });

  it.each(usTable.erp_checks)('$id: ERP on 60 m', ({ inputs, expected, tolerance }) => {
    const station = {
      peakWatts: inputs.PEP_W,
      feedLossDb: inputs.feed_loss_dB,
      antennaGainDbd: inputs.gain_dBd,
    };
    const { erpWatts, eirpWatts } = radiatedPower(station);
    withinRel(erpWatts, expected.ERP_W, tolerance.rel);
    withinRel(eirpWatts, expected.EIRP_W, tolerance.rel);
    const kHz = inputs.where === '60 m channel' ? [5330.6, 5333.4] : [5360, 5362.8];
    const check = checkEmission(asked({ emission: 'phone', kHz, ...station }));
    expect(check.limits.find(({ kind }) => kind === 'ERP')?.limitWatts).toBe(expected.limit_ERP_W);
    expect(check.fits).toBe(expected.ok);
  });

  it('60m: before 2026-02-13 five channels and no segment, from that day four channels and the segment', () => {
    const channel = (centre: number) => [centre - 1.4, centre + 1.4];
    const fits = (day: string, kHz: number[]) => checkEmission(asked({ day, emission: 'phone', kHz })).fits;
    for (const centre of [5332, 5348, 5358.5, 5373, 5405])
      expect(fits('2026-02-12', channel(centre))).toBe(true);
    expect(fits('2026-02-12', [5360, 5362.8])).toBe(false);
    for (const centre of [5332, 5348, 5373, 5405]) expect(fits('2026-02-13', channel(centre))).toBe(true);
    expect(fits('2026-02-13', [5360, 5362.8])).toBe(true);
    const erpAt = (day: string) =>
      checkEmission(asked({ day, emission: 'phone', kHz: channel(5358.5) })).limits.find(
        ({ kind }) => kind === 'ERP',
      )?.limitWatts;
    expect([erpAt('2026-02-12'), erpAt('2026-02-13')]).toEqual([100, 9.15]);
  });

  it('60m-channels: a carrier keyed on and off stands in the middle of its channel', () => {
    expect(checkEmission(asked({ kHz: [5331.9, 5332.1] })).fits).toBe(true);
    expect(checkEmission(asked({ kHz: [5331.4, 5331.6] })).fits).toBe(false);
  });

  it('data-bw, 60m-emissions: nothing wider than 2.8 kHz where that is the limit', () => {
    expect(checkEmission(asked({ emission: 'data', kHz: [14070, 14072.8] })).fits).toBe(true);
    const [wide] = checkEmission(asked({ emission: 'data', kHz: [14070, 14072.9] })).reasons;
    expect([wide?.kind, wide?.rule]).toEqual(['too wide', '97.305(c)(3)(ix); 97.307(f)(3)']);
  });

  it.each<[string, string, number[], number]>([
    ['pw-max', 'extra', [14200, 14202], 1500],
    ['pw-30m', 'extra', [10120, 10120.2], 200],
    ['pw-nov-tech', 'technician', [7050, 7050.2], 200],
    ['pw-nov-tech', 'novice', [28050, 28050.2], 200],
  ])('%s: %s at %j kHz may have %d W and not a watt more', (_id, licenceClass, kHz, watts) => {
    expect(checkEmission(asked({ licenceClass, kHz, peakWatts: watts })).fits).toBe(true);
    const over = checkEmission(asked({ licenceClass, kHz, peakWatts: watts + 1 }));
    expect(over.reasons.map(({ kind }) => kind)).toEqual(['too much power']);
  });

  it('pw-40-r13: 200 W from 7050 to 7075 kHz in Regions 1 and 3 only', () => {
    const at = (region: number) => checkEmission(asked({ kHz: [7060, 7060.2], peakWatts: 300, region })).fits;
    expect([at(1), at(2), at(3)]).toEqual([false, true, false]);
  });

  it('30m-secondary, 40m-sharing: says what else is to be known there', () => {
    expect(checkEmission(asked({ kHz: [10120, 10120.2] })).notes.join()).toContain('97.303(j)');
    expect(checkEmission(asked({ kHz: [7250, 7250.2] })).notes.join()).toContain('97.303(i)');
  });

  it('never lets a wider emission fit where a narrower one within it does not', () => {
    const kinds = fc.constantFrom<EmissionKind>('CW', 'phone', 'data', 'RTTY', 'image');
    const classes = fc.constantFrom(...US_97.licenceClasses);
    const span = fc.tuple(fc.integer({ min: 18000, max: 300000 }), fc.integer({ min: 1, max: 40 }));
    fc.assert(
      fc.property(
        kinds,
        classes,
        span,
        fc.integer({ min: 0, max: 10 }),
        (emission, licenceClass, [low, width], inset) => {
          const wide = [low / 10, (low + width) / 10];
          fc.pre(2 * inset < width);
          const narrow = [(low + inset) / 10, (low + width - inset) / 10];
          if (checkEmission(asked({ emission, licenceClass, kHz: wide })).fits) {
            expect(checkEmission(asked({ emission, licenceClass, kHz: narrow })).fits).toBe(true);
          }
        },
      ),
      { numRuns: 500 },
    );
  });
});

const inRegion1 = (kHz: number[], emission: EmissionKind = 'CW') =>
  checkEmission(asked({ ruleSet: IARU_REGION_1, licenceClass: undefined, emission, kHz }));

describe('IARU Region 1', () => {
  it.each(regionTable.edges)('$id', ({ inputs, expected }) => {
    const found = IARU_REGION_1.bands.find(({ band }) => band === bandName(inputs.band));
    expect(found?.spans).toEqual([expected.kHz]);
  });

  it.each(regionTable.segments)('$id', ({ inputs, expected }) => {
    const found = IARU_REGION_1.segments.find(({ span }) => String(span) === String(inputs.kHz));
    expect(found?.widestHertz).toBe(expected.max_bandwidth_Hz);
    const [low = NaN, high = NaN] = inputs.kHz;
    const middle = (low + high) / 2;
    const half = Math.min(expected.max_bandwidth_Hz / 2000, (high - low) / 2);
    if (expected.max_bandwidth_Hz === 0) expect(inRegion1([middle - 0.05, middle + 0.05]).fits).toBe(false);
    else expect(inRegion1([middle - half, middle + half]).fits).toBe(true);
  });

  it('has no segment the table does not, but 6 m, of which it knows the edges only', () => {
    expect(IARU_REGION_1.segments).toHaveLength(regionTable.segments.length + 1);
  });

  it.each(regionTable.check_points.filter(({ inputs }) => inputs.kHz !== undefined))(
    '$id: $inputs.kHz kHz against the United States',
    ({ inputs, expected }) => {
      const kHz = [(inputs.kHz ?? NaN) - 0.1, (inputs.kHz ?? NaN) + 0.1];
      expect(inRegion1(kHz).fits).toBe(expected.in_band);
      const general = checkEmission(asked({ licenceClass: 'general', kHz }));
      // 5348 kHz is a channel: in the middle of it, and narrow, it fits.
      expect(general.fits).toBe(expected.us_general_ok !== false);
    },
  );

  it('r1-6: 15 W EIRP is 9.14 W ERP', () => {
    const { erpWatts, eirpWatts } = radiatedPower({ peakWatts: 9.143 });
    within(erpWatts, 9.143, 1e-9);
    withinRel(eirpWatts, 15, 0.002);
  });

  it('refuses a voice among narrow modes, across into them, and where it is named', () => {
    expect(inRegion1([14040, 14042.7], 'phone').reasons[0]?.kind).toBe('too wide');
    expect(inRegion1([14098, 14100.7], 'phone').fits).toBe(false);
    expect(inRegion1([21112, 21114.7], 'phone').reasons[0]?.kind).toBe('not this emission');
    expect(inRegion1([14200, 14202.7], 'phone').fits).toBe(true);
  });

  it('says with every answer that it is no law', () => {
    expect(inRegion1([14040, 14040.2]).caution).toContain('not law');
    expect(IARU_REGION_1.kind).toBe('band plan');
  });
});

describe('bands of a set', () => {
  it('are what any class has, as on the day', () => {
    expect(bandsOf(US_97, '2026-12-01').map(({ band }) => band)).toContain('60 m');
    expect(bandsOf(US_97, '2026-02-12').map(({ band }) => band)).not.toContain('60 m');
    expect(bandsOf(US_97, DAY, 2).find(({ band }) => band === '20 m')).toEqual({
      band: '20 m',
      lowHertz: 14e6,
      highHertz: 14.35e6,
    });
    expect(bandsOf(IARU_REGION_1, DAY)).toHaveLength(11);
  });

  it('end on the day a row ends', () => {
    const [row] = US_97.bands;
    const ending = { ...US_97, bands: row === undefined ? [] : [{ ...row, until: '2026-02-13' }] };
    expect(bandsOf(ending, '2026-02-12')).toHaveLength(1);
    expect(bandsOf(ending, '2026-02-13')).toEqual([]);
  });

  it('name where they come from and carry their caution', () => {
    for (const ruleSet of [US_97, IARU_REGION_1]) {
      expect(ruleSet.source).not.toBe('');
      expect(ruleSet.textDate).toMatch(/^\d{4}-\d\d-\d\d$/);
      expect(ruleSet.caution).toContain('licence');
      for (const row of [...ruleSet.bands, ...ruleSet.segments]) expect(row.rule).not.toBe('');
    }
  });
});

describe('what a rule set is not asked', () => {
  const good = asked({ kHz: [14040, 14040.2] });

  it.each<[string, string, () => unknown]>([
    ['a class it does not know', 'licenceClass', () => checkEmission({ ...good, licenceClass: 'full' })],
    ['no class', 'licenceClass', () => checkEmission({ ...good, licenceClass: undefined })],
    ['an emission it does not know', 'emission', () => checkEmission({ ...good, emission: 'smoke' as 'CW' })],
    ['a day before it', 'day', () => checkEmission({ ...good, day: '2020-01-01' })],
    ['a day that is none', 'day', () => checkEmission({ ...good, day: 'today' })],
    ['region 4', 'region', () => checkEmission({ ...good, region: 4 })],
    [
      'region 2 of a plan for Region 1',
      'region',
      () => checkEmission({ ...good, ruleSet: IARU_REGION_1, region: 2 }),
    ],
    ['an emission without width', 'highHertz', () => checkEmission({ ...good, highHertz: good.lowHertz })],
    ['a negative power', 'peakWatts', () => checkEmission({ ...good, peakWatts: -1 })],
    ['a bandwidth of 0', 'bandwidthHertz', () => occupiedBand(14e6, 'upper', 0)],
    ['a side that is none', 'side', () => occupiedBand(14e6, 'left' as 'upper', 100)],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
