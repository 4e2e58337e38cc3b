import fc from 'fast-check';
import { between } from '../../testing/between';
import { errorOf } from '../../testing/error-of';
import { within } from '../../testing/within';
import { logDetectorReading, type LogDetectorInput } from '../index';

const RECTANGULAR = Math.sqrt(3);
const line = { voltsPerDb: 0.025, interceptDbm: -85, validFromDbm: -70, validToDbm: 5 };
const detector: LogDetectorInput = {
  volts: 1.5,
  readToVolts: 0.005,
  meterAccuracyRel: 0.01,
  calibration: line,
  conformityDb: 1,
  padsInLineDb: 20,
  padToleranceDb: 0.3,
};

describe('a logarithmic detector', () => {
  it('gives the level its slope and intercept say, before the pads', () => {
    expect(logDetectorReading(detector).value).toBeCloseTo(-85 + 1.5 / 0.025 + 20, 12);
  });

  it('has its four limits in its budget, each in decibels', () => {
    const { components, expandedUncertainty } = logDetectorReading(detector);
    const limits = [0.005 / 0.025, (0.01 * 1.5) / 0.025, 1, 0.3];
    components.forEach(({ limit }, index) => within(limit, limits[index] ?? NaN, 1e-12));
    within(expandedUncertainty, (2 * Math.hypot(...limits)) / RECTANGULAR, 1e-12);
  });

  it('may fall with level: the slope is negative, the budget is not', () => {
    const falling = { ...line, voltsPerDb: -0.025, interceptDbm: 15, validFromDbm: -60, validToDbm: 0 };
    const found = logDetectorReading({ ...detector, volts: 1.25, calibration: falling });
    within(found.value, -35 + 20, 1e-9);
    expect(found.components.every(({ limit }) => limit >= 0)).toBe(true);
  });

  it.each([
    ['just in', 0.375, true],
    ['at the top', 2.25, true],
    ['in the noise', 0.374, false],
    ['saturated', 2.251, false],
  ])('%s: %d V is read only where the line holds', (_title, volts, isValid) => {
    const read = () => logDetectorReading({ ...detector, volts });
    if (isValid) expect(read().value).toBeLessThan(30);
    else
      expect(errorOf(read)).toMatchObject({ input: 'volts', permitted: 'at least 0.375 and at most 2.25 V' });
  });

  it('reads its own table by straight lines, in any order, and what the line says where the table is that line', () => {
    const points = [-60, 0, -30].map((dbm) => ({ dbm, volts: (dbm + 85) * 0.025 }));
    fc.assert(
      fc.property(between(-60, 0), (dbm) => {
        const volts = (dbm + 85) * 0.025;
        const byTable = logDetectorReading({ ...detector, volts, calibration: { points } });
        const byLine = logDetectorReading({ ...detector, volts });
        expect(byTable.value).toBeCloseTo(byLine.value, 9);
        expect(byTable.expandedUncertainty).toBeCloseTo(byLine.expandedUncertainty, 9);
      }),
    );
  });

  it('takes the slope of the stretch it reads in', () => {
    const points = [
      { dbm: -40, volts: 0.5 },
      { dbm: -20, volts: 1 },
      { dbm: 0, volts: 2 },
    ];
    const at = (volts: number) =>
      logDetectorReading({ ...detector, volts, padsInLineDb: 0, calibration: { points } });
    within(at(0.75).value, -30, 1e-9);
    within(at(1.5).value, -10, 1e-9);
    within(at(0.75).components[0]?.limit, 0.005 / 0.025, 1e-12);
    within(at(1.5).components[0]?.limit, 0.005 / 0.05, 1e-12);
    expect(errorOf(() => at(2.01)).input).toBe('volts');
  });

  it.each([
    ['one point', [{ dbm: 0, volts: 1 }]],
    [
      'a level twice',
      [
        { dbm: 0, volts: 1 },
        { dbm: 0, volts: 2 },
      ],
    ],
    [
      'a turn in it',
      [
        { dbm: -10, volts: 1 },
        { dbm: 0, volts: 2 },
        { dbm: 10, volts: 1.5 },
      ],
    ],
  ])('refuses a table with %s', (_title, points) => {
    expect(errorOf(() => logDetectorReading({ ...detector, calibration: { points } })).input).toBe('points');
  });
});
