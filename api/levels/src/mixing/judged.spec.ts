import fc from 'fast-check';
import table from '../../reference/mixers.json';
import { between } from '../../testing/between';
import { within } from '../../testing/within';
import {
  DIODE_RING,
  DIODE_RING_RANGES,
  dBm,
  judgeProducts,
  type JudgeInput,
  type MixerFigures,
  ohms,
  productLevel,
  voltsPeakToPeakFromDbm,
  wattsFromDbm,
} from '../index';

// Values, tolerances and sources: api/levels/reference/mixers.json, each row with its own source.

/** Passes its band with 2.5 dB and takes 66 dB, or 120 dB far below. */
const filterGainDb = (hertz: number) =>
  hertz < 8.9e6 ? -120 : hertz > 13.9e6 && hertz < 14.5e6 ? -2.5 : -66;
const bench: JudgeInput = {
  loHertz: 23.067e6,
  ifHertz: 8.867e6,
  maxOrder: 7,
  loDbm: 7,
  ifDbm: -10,
  wanted: 'difference',
  mixer: DIODE_RING,
  filterGainDb,
  filterPlusMinusDb: 4,
  bandLowHertz: 14e6,
  bandHighHertz: 14.35e6,
  goalDb: 60,
};

describe('levels of products against class facts', () => {
  const levels = { loDbm: 7, ifDbm: -10 };
  const product = (m: number, n: number) => {
    return {
      hertz: 1e6,
      loMultiple: m,
      ifMultiple: n,
      sign: '-',
      order: m + n,
      name: '',
      isInverted: false,
    } as const;
  };

  it('fact-01: a level-7 ring takes 5.01 mW, 1.416 V peak to peak in 50 ohm', () => {
    within(wattsFromDbm(dBm(7)), 5.01e-3, 5e-6);
    within(voltsPeakToPeakFromDbm(dBm(7), ohms(50)), 1.416, 5e-4);
  });

  it('fact-02, fact-03: the ring assumed lies within what its class has', () => {
    expect(DIODE_RING.conversionLoss.db).toBeGreaterThanOrEqual(5.5);
    expect(DIODE_RING.conversionLoss.db).toBeLessThanOrEqual(7);
    expect(DIODE_RING.loLeakage.db).toBeGreaterThanOrEqual(25);
    expect(DIODE_RING.loLeakage.db).toBeLessThanOrEqual(50);
  });

  it('fact-04, fact-05: its class compresses 4 to 7 dB under the drive and intercepts 5 to 10 dB over it', () => {
    const row = (id: string) => table.class_facts.find((known) => known.id === id)?.expected;
    const { compressionBelowDriveDb, interceptAboveDriveDb } = DIODE_RING_RANGES;
    const [compression, intercept] = [row('fact-04'), row('fact-05')];
    expect(compressionBelowDriveDb).toEqual({
      least: compression?.below_LO_dB_min,
      greatest: compression?.below_LO_dB_max,
    });
    expect(interceptAboveDriveDb).toEqual({
      least: intercept?.above_LO_dB_min,
      greatest: intercept?.above_LO_dB_max,
    });
    const assumed = DIODE_RING.inputInterceptDbm - levels.loDbm;
    expect(assumed).toBeGreaterThanOrEqual(interceptAboveDriveDb.least);
    expect(assumed).toBeLessThanOrEqual(interceptAboveDriveDb.greatest);
  });

  it('fact-06: oscillator leakage against the wanted product', () => {
    const mixer: MixerFigures = {
      ...DIODE_RING,
      conversionLoss: { db: 6, plusMinusDb: 1 },
      loLeakage: { db: 40, plusMinusDb: 10 },
    };
    const leak = productLevel({ ...product(1, 0), sign: '' }, levels, mixer);
    const wanted = productLevel(product(1, 1), levels, mixer);
    within(leak.dbm, -33, 1e-3);
    within(wanted.dbm, -16, 1e-3);
    within(leak.dbm - wanted.dbm, -17, 1e-3);
  });

  it('fact-08: a third-order product 50 dB down at −10 dBm under an intercept of +15 dBm', () => {
    const wanted = productLevel(product(1, 1), levels, DIODE_RING);
    const third = productLevel(product(1, 3), levels, DIODE_RING);
    within(third.dbm - wanted.dbm, -50, 1e-3);
  });

  it('never rise with order, even over the intercept', () => {
    const over = { loDbm: 7, ifDbm: 20 };
    expect(productLevel(product(1, 5), over, DIODE_RING).dbm).toBeLessThanOrEqual(
      productLevel(product(1, 1), over, DIODE_RING).dbm,
    );
  });
});

describe('products judged', () => {
  const { wanted, conversion, others, nearestAbove, nearestBelow } = judgeProducts(bench);

  it('tell the wanted product with its level before and after the filter', () => {
    expect(wanted.name).toBe('LO − IF');
    within(wanted.levelDbm, -16.5, 1e-9);
    within(wanted.filteredDbm, -19, 1e-9);
    expect([wanted.verdict, conversion.sideband]).toEqual(['pass', 'inverted']);
  });

  it('leave out none and put the least in hand first', () => {
    expect(others).toHaveLength(55);
    const inHand = others.map((product) => product.inHandDb);
    expect(inHand).toEqual([...inHand].sort((a, b) => a - b));
  });

  it('are too close to call when the filter’s spread straddles the goal', () => {
    const sum = others.find(({ name }) => name === 'LO + IF');
    within(sum?.belowWantedDb, 63.5, 1e-9);
    within(sum?.plusMinusDb, 4, 1e-9);
    expect(sum?.verdict).toBe('too close to call');
  });

  it('carry the spread of leakage, loss and filter into a leak', () => {
    const leak = others.find(({ name }) => name === 'LO');
    within(leak?.levelDbm, -28, 1e-9);
    within(leak?.plusMinusDb, Math.hypot(10, 4, 1), 1e-9);
    within(leak?.inHandDb, 75 - Math.hypot(10, 4, 1) - 60, 1e-9);
  });

  it('name the nearest outside the band, which the filter takes least', () => {
    expect(nearestBelow?.name).toBe('4·IF − LO');
    within(nearestBelow?.fromBandHertz, 14e6 - 12.401e6, 1e-3);
    // 2·IF, at 17.734 MHz, is nearer than 2·LO − 3·IF.
    expect(nearestAbove?.name).toBe('2·IF');
  });

  it('say not yet when the wanted product misses its band', () => {
    expect(judgeProducts({ ...bench, loHertz: 22e6 }).wanted.verdict).toBe('not yet');
  });

  it('give a product in the band no help from the filter’s spread', () => {
    const { others: wide } = judgeProducts({ ...bench, bandLowHertz: 10e6, bandHighHertz: 40e6 });
    const sum = wide.find(({ name }) => name === 'LO + IF');
    expect([sum?.place, sum?.plusMinusDb]).toEqual(['in the band', 0]);
  });

  it('never pass while the guard band says no', () => {
    const goal = between(0, 150);
    const spread = between(0, 30);
    fc.assert(
      fc.property(goal, spread, fc.integer({ min: 2, max: 9 }), (goalDb, filterPlusMinusDb, maxOrder) => {
        for (const product of judgeProducts({ ...bench, goalDb, filterPlusMinusDb, maxOrder }).others) {
          expect(product.verdict === 'pass').toBe(product.belowWantedDb - product.plusMinusDb >= goalDb);
        }
      }),
      { numRuns: 40 },
    );
  });

  it('keep to the order asked for', () => {
    expect(
      judgeProducts({ ...bench, maxOrder: 1 })
        .others.map(({ name }) => name)
        .sort(),
    ).toEqual(['IF', 'LO']);
  });
});
