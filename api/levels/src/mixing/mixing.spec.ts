import fc from 'fast-check';
import table from '../../reference/mixers.json';
import { errorOf } from '../../testing/error-of';
import { within } from '../../testing/within';
import {
  convert,
  crossovers,
  DIODE_RING,
  DRIVE_WINDOW_DB,
  dBm,
  driveCheck,
  judgeProducts,
  type JudgeInput,
  type MixerFigures,
  mixingProducts,
  ohms,
  OutOfDomainError,
  productLevel,
  receiveImage,
  scanProducts,
  voltsPeakToPeakFromDbm,
  wattsFromDbm,
  type WantedProduct,
} from '../index';

// Values, tolerances and sources: api/levels/reference/mixers.json, each row with its own source.

const MHZ = 1e6;
/** Megahertz are what the tables print; their tolerance is 1 Hz. */
const near = (hertz: number, megahertz: number) => within(hertz / MHZ, megahertz, 1e-6);

describe('conversions against the published table', () => {
  it.each(table.conversion)('$id: LO $inputs.LO_MHz, IF $inputs.IF_MHz', ({ inputs, expected }) => {
    const [lo, intermediate] = [inputs.LO_MHz * MHZ, inputs.IF_MHz * MHZ];
    const sum = convert(lo, intermediate, 'sum');
    const difference = convert(lo, intermediate, 'difference');
    near(sum.hertz, expected.sum_MHz);
    near(difference.hertz, expected.difference_MHz);
    expect([sum.sideband, difference.sideband]).toEqual([
      expected.sum_sideband,
      expected.difference_sideband,
    ]);
    near(Math.abs(sum.hertz - lo), expected.LO_to_sum_MHz);
    near(Math.abs(difference.hertz - lo), expected.LO_to_difference_MHz);
  });

  it.each<[string, number, number, WantedProduct]>([
    ['inv-1', 5.2, 9, 'sum'],
    ['inv-2', 5.2, 9, 'difference'],
    ['inv-3', 9.3, 5.5, 'difference'],
    ['inv-6', 1.7, 3.8, 'sum'],
  ])('%s: whether the sideband turns', (id, lo, intermediate, wanted) => {
    const published = table.inversion.find((row) => row.id === id)?.expected.spectrum_inverted;
    expect(convert(lo * MHZ, intermediate * MHZ, wanted).sideband === 'inverted').toBe(published);
  });

  it('inv-4, inv-5: a receiver turns the sideband when its oscillator is above', () => {
    const signal = { signalHertz: 14.2e6, ifHertz: 9e6 };
    expect(receiveImage({ ...signal, injection: 'high side' }).sideband).toBe('inverted');
    expect(receiveImage({ ...signal, injection: 'low side' }).sideband).toBe('kept');
  });

  it('inv-7: by number, a tone above the carrier comes out below it exactly when inverted', () => {
    const bothWays = fc.tuple(
      fc.integer({ min: 1e6, max: 5e7 }),
      fc.integer({ min: 1e6, max: 5e7 }),
      fc.constantFrom('sum' as const, 'difference' as const),
    );
    fc.assert(
      fc.property(bothWays, ([lo, intermediate, wanted]) => {
        fc.pre(Math.abs(lo - intermediate) > 2000);
        const carrier = convert(lo, intermediate, wanted);
        const tone = convert(lo, intermediate + 1000, wanted);
        expect(tone.hertz < carrier.hertz).toBe(carrier.sideband === 'inverted');
      }),
    );
  });

  it.each(table.images)('$id: image and half-IF of $inputs.RF_MHz MHz, $inputs.injection side', (row) => {
    const { inputs, expected } = row;
    const found = receiveImage({
      signalHertz: inputs.RF_MHz * MHZ,
      ifHertz: inputs.IF_MHz * MHZ,
      injection: inputs.injection === 'high' ? 'high side' : 'low side',
    });
    near(found.loHertz, expected.LO_MHz);
    near(found.imageHertz, expected.image_MHz);
    near(found.halfIfHertz, expected.half_IF_RF_MHz);
  });
});

describe('products against complete enumerations', () => {
  it.each(table.products)('$id: LO $inputs.LO_MHz, IF $inputs.IF_MHz to order 7', ({ inputs, expected }) => {
    const products = mixingProducts({
      loHertz: inputs.LO_MHz * MHZ,
      ifHertz: inputs.IF_MHz * MHZ,
      maxOrder: inputs.max_order_m_plus_n,
    });
    expect(products).toHaveLength(expected.count);
    const [low = NaN, high = NaN] = inputs.band_MHz;
    const inBand = products.filter(({ hertz }) => hertz >= low * MHZ - 1 && hertz <= high * MHZ + 1);
    expect(inBand.map(({ loMultiple, ifMultiple, sign }) => [loMultiple, ifMultiple, sign])).toEqual(
      expected.in_band.map(({ m_LO, n_IF, sign }) => [m_LO, n_IF, sign]),
    );
    expected.all?.forEach(([megahertz, m, n, sign, order], index) => {
      const product = products[index];
      near(product?.hertz ?? NaN, Number(megahertz));
      expect([product?.loMultiple, product?.ifMultiple, product?.sign || '0', product?.order]).toEqual([
        m,
        n,
        sign,
        order,
      ]);
    });
  });

  it('equal brute force over every pair of multiples, at any order', () => {
    const frequency = fc.integer({ min: 1, max: 1e9 });
    fc.assert(
      fc.property(frequency, frequency, fc.integer({ min: 1, max: 15 }), (lo, intermediate, maxOrder) => {
        const brute: number[] = [];
        for (let m = -15; m <= 15; m++)
          for (let n = -15; n <= 15; n++) {
            const order = Math.abs(m) + Math.abs(n);
            // m·LO + n·IF and its negative are one product.
            const isFirst = m > 0 || (m === 0 && n > 0);
            if (isFirst && order >= 1 && order <= maxOrder) brute.push(Math.abs(m * lo + n * intermediate));
          }
        const found = mixingProducts({ loHertz: lo, ifHertz: intermediate, maxOrder }).map(
          ({ hertz }) => hertz,
        );
        expect(found).toEqual(brute.sort((a, b) => a - b));
      }),
    );
  });

  it.each(table.crossovers)(
    '$id: crossovers of IF $inputs.IF_MHz, $inputs.wanted',
    ({ inputs, expected }) => {
      const [low = NaN, high = NaN] = inputs.band_MHz;
      const found = crossovers({
        ifHertz: inputs.IF_MHz * MHZ,
        wanted: inputs.wanted === 'LO+IF' ? 'sum' : 'difference',
        bandLowHertz: low * MHZ,
        bandHighHertz: high * MHZ,
        maxOrder: inputs.max_order,
      });
      expect(found).toHaveLength(expected.crossovers.length);
      expected.crossovers.forEach((published, index) => {
        near(found[index]?.wantedHertz ?? NaN, published.RF_MHz);
        near(found[index]?.loHertz ?? NaN, published.LO_MHz);
        const { loMultiple, ifMultiple, order } = found[index] ?? {};
        expect([loMultiple, ifMultiple, order]).toEqual([published.m_LO, published.n_IF, published.order]);
      });
    },
  );

  it('crossovers are where two products of the list have one frequency', () => {
    const found = crossovers({
      ifHertz: 9e6,
      wanted: 'difference',
      bandLowHertz: 1.8e6,
      bandHighHertz: 30e6,
      maxOrder: 15,
    });
    expect(found.length).toBeGreaterThan(5);
    for (const { wantedHertz, loHertz, loMultiple, ifMultiple } of found) {
      const all = mixingProducts({ loHertz, ifHertz: 9e6, maxOrder: 15 });
      const same = all.filter(
        (product) => product.loMultiple === loMultiple && product.ifMultiple === ifMultiple,
      );
      const distances = same.map(({ hertz }) => Math.abs(hertz - wantedHertz));
      expect(Math.min(...distances)).toBeLessThan(1e-3);
    }
  });

  it('crossovers of a difference with the oscillator below', () => {
    const found = crossovers({
      ifHertz: 9e6,
      wanted: 'difference',
      loIsAbove: false,
      bandLowHertz: 2e6,
      bandHighHertz: 8e6,
      maxOrder: 5,
    });
    expect(found.map(({ loHertz }) => loHertz)).toContain(3e6);
    for (const { wantedHertz, loHertz } of found) within(9e6 - loHertz, wantedHertz, 1e-3);
  });
});

describe('a scan over many settings', () => {
  it('finds the same products in the band as the list does, setting by setting', () => {
    const settings = fc.array(fc.integer({ min: 1e6, max: 6e7 }), { minLength: 1, maxLength: 20 });
    const wanteds = fc.constantFrom('sum' as const, 'difference' as const);
    const band = fc.tuple(fc.integer({ min: 1e6, max: 3e7 }), fc.integer({ min: 1000, max: 2e6 }));
    fc.assert(
      fc.property(
        settings,
        wanteds,
        band,
        fc.integer({ min: 2, max: 15 }),
        (los, wanted, [low, width], maxOrder) => {
          const scan = scanProducts({
            loHertz: Float64Array.from(los),
            ifHertz: 9e6,
            wanted,
            maxOrder,
            bandLowHertz: low,
            bandHighHertz: low + width,
          });
          los.forEach((loHertz, setting) => {
            const others = mixingProducts({ loHertz, ifHertz: 9e6, maxOrder }).filter(
              ({ hertz, loMultiple, ifMultiple, sign }) =>
                hertz >= low &&
                hertz <= low + width &&
                !(loMultiple === 1 && ifMultiple === 1 && sign === (wanted === 'sum' ? '+' : '-')),
            );
            expect(scan.inBand[setting]).toBe(others.length);
            const pair = scan.lowestOrder[setting] ?? NaN;
            const order =
              pair === -1 ? undefined : (scan.table.lo[pair] ?? 0) + Math.abs(scan.table.if[pair] ?? 0);
            expect(order).toBe(
              others.length === 0 ? undefined : Math.min(...others.map((other) => other.order)),
            );
          });
        },
      ),
    );
  });
});

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
    const goal = fc.double({ min: 0, max: 150, noNaN: true });
    const spread = fc.double({ min: 0, max: 30, noNaN: true });
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

describe('the drive of a mixer', () => {
  it('a source of +10 dBm for a level-7 ring wants a 3 dB pad, 300, 18 and 300 ohm', () => {
    const { drive, overDb, pad, deliveredDbm } = driveCheck({ ratedDbm: 7, sourceDbm: 10 });
    expect([drive, overDb]).toEqual(['too strong', 3]);
    expect(pad?.resistors.map(({ ohms: value }) => value)).toEqual([300, 18, 300]);
    within(deliveredDbm, 7.005, 0.001);
  });

  it('fact-07: +4 dBm is too weak for it, and no pad is offered', () => {
    expect(driveCheck({ ratedDbm: 7, sourceDbm: 4 })).toEqual({
      drive: 'too weak',
      overDb: -3,
      deliveredDbm: 4,
    });
  });

  it('is right to the edge of its window', () => {
    expect(driveCheck({ ratedDbm: 7, sourceDbm: 8 }).drive).toBe('right');
    expect(driveCheck({ ratedDbm: 7, sourceDbm: 6 }).drive).toBe('right');
    expect(driveCheck({ ratedDbm: 7, sourceDbm: 8.01 }).drive).toBe('too strong');
    expect(driveCheck({ ratedDbm: 7, sourceDbm: 5.99 }).drive).toBe('too weak');
  });

  it('is brought into its window by E24 values, whatever the source gives', () => {
    fc.assert(
      fc.property(fc.double({ min: 8.1, max: 40, noNaN: true }), (sourceDbm) => {
        expect(Math.abs(driveCheck({ ratedDbm: 7, sourceDbm }).deliveredDbm - 7)).toBeLessThan(
          DRIVE_WINDOW_DB,
        );
      }),
    );
  });
});

describe('what mixing is not asked for', () => {
  it.each<[string, string, () => unknown]>([
    ['no oscillator', 'loHertz', () => mixingProducts({ loHertz: 0, ifHertz: 9e6, maxOrder: 7 })],
    ['an IF that is no number', 'ifHertz', () => mixingProducts({ loHertz: 5e6, ifHertz: NaN, maxOrder: 7 })],
    ['order 16', 'maxOrder', () => mixingProducts({ loHertz: 5e6, ifHertz: 9e6, maxOrder: 16 })],
    ['order 2.5', 'maxOrder', () => mixingProducts({ loHertz: 5e6, ifHertz: 9e6, maxOrder: 2.5 })],
    ['a difference of nothing', 'loHertz', () => convert(9e6, 9e6, 'difference')],
    ['a word that is no product', 'wanted', () => convert(5e6, 9e6, 'both' as 'sum')],
    [
      'injection below a signal under the IF',
      'signalHertz',
      () => receiveImage({ signalHertz: 7e6, ifHertz: 9e6, injection: 'low side' }),
    ],
    ['a band upside down', 'bandHighHertz', () => judgeProducts({ ...bench, bandHighHertz: 13e6 })],
    [
      'a filter that gives no number',
      'filterGainDb',
      () => judgeProducts({ ...bench, filterGainDb: () => NaN }),
    ],
    ['a negative goal', 'goalDb', () => judgeProducts({ ...bench, goalDb: -1 })],
    ['no settings', 'loHertz', () => scanProducts({ ...bench, loHertz: new Float64Array(0) })],
    ['a setting of 0 Hz', 'loHertz', () => scanProducts({ ...bench, loHertz: Float64Array.of(1e6, 0) })],
    [
      'a loss that is a gain',
      'conversionLoss',
      () => judgeProducts({ ...bench, mixer: { ...DIODE_RING, conversionLoss: { db: -3, plusMinusDb: 1 } } }),
    ],
    ['a drive that is no number', 'sourceDbm', () => driveCheck({ ratedDbm: 7, sourceDbm: NaN })],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
