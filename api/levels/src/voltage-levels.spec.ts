import fc from 'fast-check';
import table from '../reference/levels.json';
import { between } from '../testing/between';
import { errorOf } from '../testing/error-of';
import { within, withinRel } from '../testing/within';
import {
  dBm,
  dbFromNepers,
  emfLevelFromMatched,
  levelFigures,
  levelFrom,
  type LevelQuantity,
  loadedLevel,
  ohms,
  OutOfDomainError,
  sumOfLevels,
  twoToneEnvelopeReading,
  voltageLevel,
  type VoltageLevelUnit,
  volts,
  voltsRmsFromLevel,
} from './index';

// Values, tolerances and sources: api/levels/reference/levels.json, each row with its own source.

const relation = (id: string) => {
  const row = table.relations.find((known) => known.id === id);
  if (row === undefined) throw new Error(`no row ${id}`);
  return row.expected;
};

describe('voltage levels against ITU-R V.574', () => {
  it.each(table.voltageLevels)('$id: $inputs.dBm dBm', ({ inputs, expected, tolerance }) => {
    const found = levelFigures(dBm(inputs.dBm), ohms(inputs.R_ohm));
    within(found.dbMicrovolt, expected.dBuV, tolerance.dB);
    within(found.dbv, expected.dBV, tolerance.dB);
    withinRel(found.voltsPeak, expected.Vpk, tolerance.rel);
    withinRel(found.amperesRms, expected.Irms_A, tolerance.rel);
  });

  it('rel-01 to rel-03: 0 dBu is 0.7746 V, 1 mW in 600 ohm only', () => {
    const in600 = levelFigures(dBm(0), ohms(600));
    within(in600.voltsRms, relation('rel-01').Vrms ?? NaN, 1e-4);
    within(in600.dbu, relation('rel-01').dBu ?? NaN, 1e-4);
    within(in600.dbv, relation('rel-01').dBV ?? NaN, 1e-4);
    within(levelFigures(dBm(0), ohms(50)).dbu, relation('rel-02').dBu ?? NaN, 1e-3);
    within(voltsRmsFromLevel(4, 'dBu'), relation('rel-03').Vrms ?? NaN, 1e-3);
    within(levelFrom('dbu', 4, ohms(600)), relation('rel-03').dBm_in_600 ?? NaN, 1e-3);
    within(levelFrom('dbu', 4, ohms(50)), relation('rel-03').dBm_in_50 ?? NaN, 1e-3);
  });

  it('rel-04 to rel-06: microvolts across a load, and the emf behind them', () => {
    within(levelFigures(dBm(0), ohms(75)).dbMicrovolt, relation('rel-04').dBuV ?? NaN, 1e-3);
    within(levelFrom('dbMicrovolt', 107, ohms(50)), relation('rel-05').dBm ?? NaN, 1e-3);
    within(emfLevelFromMatched(34), relation('rel-06').dBuV_emf ?? NaN, 1e-3);
  });

  it('rel-07 to rel-09, rel-12: sums of levels, and nepers', () => {
    within(sumOfLevels([0, 0], 'power'), relation('rel-07').dBm ?? NaN, 1e-3);
    within(sumOfLevels([0, 0], 'voltage'), relation('rel-08').dBm ?? NaN, 1e-3);
    within(sumOfLevels([0, -10], 'power'), relation('rel-09').dBm ?? NaN, 1e-3);
    within(dbFromNepers(1), relation('rel-12').dB ?? NaN, 1e-4);
  });

  it('rel-13, rel-14: a source into its load, and into none', () => {
    const matched = loadedLevel({ emfVoltsRms: 1, sourceOhms: 50, loadOhms: 50 });
    within(matched.voltsRms, relation('rel-13').Vrms_load ?? NaN, 1e-3);
    within(matched.dbm, relation('rel-13').dBm ?? NaN, 1e-3);
    expect(matched.mismatchDb).toBe(0);
    const open = loadedLevel({ emfVoltsRms: 1, sourceOhms: 50, loadOhms: 1e6 });
    withinRel(open.voltsRms / matched.voltsRms, relation('rel-14').Vpp_actual ?? NaN, 1e-3);
  });

  it('rel-15: two tones of 100 W peak', () => {
    const { Vpk_envelope: peak = NaN, avg_W: average = NaN, each_tone_dBm: tone = NaN } = relation('rel-15');
    const found = twoToneEnvelopeReading({
      voltsPerDivision: 5,
      divisionsPeakToPeak: (2 * peak) / 50,
      readToDivisions: 0.1,
      probeRatio: 10,
      loadOhms: 50,
    });
    withinRel(found.watts, 100, 1e-4);
    withinRel(found.averageWatts, average, 1e-4);
    withinRel(found.eachToneDbm, tone, 1e-4);
  });
});

const resistance = between(0.1, 1e5).map((value) => ohms(value));
const level = between(-150, 80).map((value) => dBm(value));

describe('every figure of a level', () => {
  const names: LevelQuantity[] = [
    'dbm',
    'watts',
    'voltsRms',
    'voltsPeak',
    'voltsPeakToPeak',
    'amperesRms',
    'dbv',
    'dbMicrovolt',
    'dbu',
  ];

  it.each(names)('%s leads back to the level, in any resistance', (name) => {
    fc.assert(
      fc.property(level, resistance, (value, load) => {
        expect(levelFrom(name, levelFigures(value, load)[name], load)).toBeCloseTo(value, 8);
      }),
    );
  });

  it('agrees with every other: P = V·I, V = I·R, peak to peak twice the peak', () => {
    fc.assert(
      fc.property(level, resistance, (value, load) => {
        const found = levelFigures(value, load);
        expect((found.voltsRms * found.amperesRms) / found.watts).toBeCloseTo(1, 9);
        expect((found.amperesRms * load) / found.voltsRms).toBeCloseTo(1, 9);
        expect(found.voltsPeakToPeak / found.voltsPeak).toBeCloseTo(2, 12);
        expect(found.dbMicrovolt - found.dbv).toBeCloseTo(120, 9);
      }),
    );
  });

  it('comes back from every unit of voltage level', () => {
    const unit = fc.constantFrom<VoltageLevelUnit>('dBV', 'dBµV', 'dBu');
    fc.assert(
      fc.property(unit, between(-200, 200), (name, value) => {
        expect(voltageLevel(voltsRmsFromLevel(value, name), name)).toBeCloseTo(value, 8);
      }),
    );
  });

  it('is never less together than the strongest alone, nor more in power than in voltage', () => {
    fc.assert(
      fc.property(fc.array(level, { minLength: 1, maxLength: 8 }), (levels) => {
        const power = sumOfLevels(levels, 'power');
        expect(power).toBeGreaterThanOrEqual(Math.max(...levels) - 1e-9);
        expect(sumOfLevels(levels, 'voltage')).toBeGreaterThanOrEqual(power - 1e-9);
      }),
    );
  });

  it.each<[string, string, () => unknown]>([
    ['no voltage', 'voltsRms', () => voltageLevel(volts(0), 'dBV')],
    ['no current', 'amperesRms', () => levelFrom('amperesRms', 0, ohms(50))],
    ['a power that is no number', 'watts', () => levelFrom('watts', NaN, ohms(50))],
    ['a level beyond sense', 'level', () => voltsRmsFromLevel(500, 'dBu')],
    ['no levels', 'levels', () => sumOfLevels([], 'power')],
    ['no emf', 'emfVoltsRms', () => loadedLevel({ emfVoltsRms: 0, sourceOhms: 50, loadOhms: 50 })],
    ['no load', 'loadOhms', () => loadedLevel({ emfVoltsRms: 1, sourceOhms: 50, loadOhms: 0 })],
  ])('%s is refused by the name of the input', (_title, input, call) => {
    const error = errorOf(call);
    expect(error).toBeInstanceOf(OutOfDomainError);
    expect(error.input).toBe(input);
  });
});
