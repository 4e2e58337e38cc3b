import fc from 'fast-check';
import { between } from '../testing/between';
import {
  dB,
  dBm,
  dbFromPowerRatio,
  dbFromVoltageRatio,
  dbmFromVoltsPeakToPeak,
  dbmFromVoltsRms,
  dbmFromWatts,
  gainBetween,
  hertz,
  levelAfter,
  ohms,
  OutOfDomainError,
  powerRatioFromDb,
  voltageRatioFromDb,
  volts,
  voltsPeakToPeakFromDbm,
  voltsRmsFromDbm,
  watts,
  wattsFromDbm,
} from './index';

const level = between(-200, 100).map((value) => dBm(value));
const ratio = between(-200, 200).map((value) => dB(value));
const gains = between(-100, 100).map((value) => dB(value));
const resistance = between(-2, 6)
  .map((exponent) => 10 ** exponent)
  .map((value) => ohms(value));

describe('conversions invert', () => {
  it('level to power and back', () => {
    fc.assert(fc.property(level, (value) => expect(dbmFromWatts(wattsFromDbm(value))).toBeCloseTo(value, 9)));
  });

  it('level to volts rms and peak to peak and back, in any resistance', () => {
    fc.assert(
      fc.property(level, resistance, (value, load) => {
        expect(dbmFromVoltsRms(voltsRmsFromDbm(value, load), load)).toBeCloseTo(value, 9);
        expect(dbmFromVoltsPeakToPeak(voltsPeakToPeakFromDbm(value, load), load)).toBeCloseTo(value, 9);
      }),
    );
  });

  it('decibels to ratios and back', () => {
    fc.assert(
      fc.property(ratio, (value) => {
        expect(dbFromPowerRatio(powerRatioFromDb(value))).toBeCloseTo(value, 9);
        expect(dbFromVoltageRatio(voltageRatioFromDb(value))).toBeCloseTo(value, 9);
      }),
    );
  });

  it('a gain is what lies between a level and the level after it', () => {
    fc.assert(
      fc.property(level, gains, (before, gain) => {
        expect(gainBetween(before, levelAfter(before, gain))).toBeCloseTo(gain, 9);
      }),
    );
  });
});

describe('units', () => {
  it.each<[string, (value: number) => number, number[]]>([
    ['a level', dBm, [300.1, -300.1]],
    ['a ratio', dB, [1000.1, -1000.1]],
    ['a power', watts, [-1e-12]],
    ['a voltage', volts, [-1e-12]],
    ['a resistance', ohms, [0, -50]],
    ['a frequency', hertz, [0, -14.1e6]],
  ])('%s that cannot be is refused, as are NaN and infinity', (_title, unit, impossible) => {
    for (const value of [...impossible, NaN, Infinity, -Infinity]) {
      expect(() => unit(value)).toThrow(OutOfDomainError);
    }
  });

  it('report under the name the caller gives', () => {
    expect(() => ohms(-50, 'loadOhms')).toThrow(expect.objectContaining({ input: 'loadOhms', value: -50 }));
  });

  it('keep nonsense that would overflow out of a result', () => {
    expect(() => dbmFromVoltsRms(volts(1e18), ohms(1e-12))).toThrow(OutOfDomainError);
    expect(() => dbmFromVoltsRms(volts(1e-200), ohms(50))).toThrow(OutOfDomainError);
  });
});
