import fc from 'fast-check';
import table from '../../reference/mixers.json';
import { between } from '../../testing/between';
import { errorOf } from '../../testing/error-of';
import { within } from '../../testing/within';
import {
  convert,
  DIODE_RING,
  DRIVE_WINDOW_DB,
  driveCheck,
  judgeProducts,
  type JudgeInput,
  mixingProducts,
  OutOfDomainError,
  receiveImage,
  scanProducts,
  type WantedProduct,
} from '../index';

// Values, tolerances and sources: api/levels/reference/mixers.json, each row with its own source.

const MHZ = 1e6;
/** Megahertz are what the tables print; their tolerance is 1 Hz. */
const near = (hertz: number, megahertz: number) => within(hertz / MHZ, megahertz, 1e-6);

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

  it('inv-8: two conversions that each turn the sideband leave it as it was', () => {
    const first = convert(9.3e6, 5.5e6, 'difference');
    const second = convert(20e6, first.hertz, 'difference');
    expect([first.sideband, second.sideband]).toEqual(['inverted', 'inverted']);
    const moved = convert(20e6, convert(9.3e6, 5.501e6, 'difference').hertz, 'difference');
    const isInverted = moved.hertz < second.hertz;
    expect(isInverted).toBe(table.inversion.find(({ id }) => id === 'inv-8')?.expected.spectrum_inverted);
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
      fc.property(between(8.1, 40), (sourceDbm) => {
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
