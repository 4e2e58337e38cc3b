import { ENTRY_METHODS, entryFields, type EntryMethod } from '@ferrite-row/levels';
import { describe, expect, it } from 'vitest';
import { aCheck, aReading } from '../testing/build.fixture';
import { prefillOf } from './prefill';
import { sheetWords } from './sheet-words';

const detector = aCheck({
  ...{ id: 'filter', method: 'log-detector', target: -24, windowLow: -26, windowHigh: -22 },
  defaults: { readToVolts: 0.005, padsInLineDb: 0 },
});
const fr041 = {
  ...{ id: 'fr-041', tag: 'FR-041' },
  damageLevelDbm: 15,
  figures: {
    ...{ voltsPerDb: 0.025, interceptDbm: -85, validFromDbm: -70, validToDbm: 5 },
    ...{ conformityDb: 0.5, accuracyRel: 0.003 },
  },
};

describe('what the form holds before anybody types', () => {
  /** What each method's instrument shows, and nothing else of its form. */
  const shown: Record<EntryMethod, string[]> = {
    oscilloscope: ['divisionsPeakToPeak'],
    'dummy-load': ['divisionsPeakToPeak'],
    'two-tone-envelope': ['divisionsPeakToPeak'],
    analyzer: ['divisionsDown'],
    'dummy-load-tap': ['divisionsDown'],
    harmonic: ['fundamentalDivisionsDown', 'harmonicDivisionsDown'],
    intermodulation: ['toneDivisionsDown', 'productDivisionsDown'],
    meter: ['value'],
    counter: ['frequencyMegahertz'],
    'log-detector': ['volts'],
    'diode-probe': ['directVolts'],
    'time-base': ['cycles', 'divisions'],
  };

  it.each(ENTRY_METHODS)(
    'leaves open what %s shows, and only that, with plan and instrument in hand',
    (method) => {
      const names = entryFields(method, 'V').map(({ name }) => name);
      const all = Object.fromEntries(names.map((name) => [name, 1]));
      const { entry, sources } = prefillOf(aCheck({ method, unit: 'V', defaults: all }), []);
      expect(names.filter((name) => entry[name] === '')).toEqual(shown[method]);
      expect(Object.keys(sources)).toEqual(names.filter((name) => !shown[method].includes(name)));
    },
  );

  it('takes a detector’s line from its own sheet, whatever an earlier reading or the plan says', () => {
    const earlier = aReading({
      method: 'log-detector',
      instrumentId: 'fr-041',
      entry: { voltsPerDb: '20m', padsInLineDb: '10' },
    });
    const { entry, sources } = prefillOf({ ...detector, readings: [earlier] }, [], fr041);
    expect([entry.voltsPerDb, sources.voltsPerDb]).toEqual(['0.025', 'from FR-041']);
    expect([entry.interceptDbm, entry.validFromDbm, entry.validToDbm]).toEqual(['-85', '-70', '5']);
    expect([entry.readToVolts, sources.readToVolts]).toEqual(['0.005', 'from the plan']);
    expect([entry.padsInLineDb, sources.padsInLineDb]).toEqual(['10', 'from your reading of 15 Oct']);
  });

  it('takes nothing that belongs to one instrument from a reading on another', () => {
    const elsewhere = aReading({
      ...{ method: 'log-detector', instrumentId: 'fr-040' },
      entry: { voltsPerDb: '20m', padsInLineDb: '30', readToVolts: '2m' },
    });
    const bare = { ...fr041, figures: {} };
    const { entry } = prefillOf({ ...detector, readings: [elsewhere] }, [], bare);
    expect([entry.voltsPerDb, entry.padsInLineDb, entry.readToVolts]).toEqual(['', '0', '2m']);
  });

  it('takes the settings last typed on the check, then the plan, then those of the stage’s others', () => {
    const entries = (voltsPerDivision: string, takenAt: string) =>
      aReading({ entry: { voltsPerDivision, divisionsPeakToPeak: '6', probeRatio: '1' }, takenAt });
    const own = aCheck({
      readings: [entries('10m', '2026-11-14T20:00:00Z'), entries('5m', '2026-11-15T20:00:00Z')],
    });
    const other = aCheck({ id: 'other', readings: [entries('50m', '2026-11-16T20:00:00Z')] });
    const there = prefillOf(own, [own, other]);
    expect([there.entry.voltsPerDivision, there.sources.voltsPerDivision]).toEqual([
      '5m',
      'from your reading of 15 Nov',
    ]);
    expect(there.entry.divisionsPeakToPeak).toBe('');
    const fresh = prefillOf(aCheck(), [own, other]);
    expect([fresh.entry.voltsPerDivision, fresh.entry.probeRatio]).toEqual(['50m', '10']);
    const current = aCheck({ method: 'meter', unit: 'mA' });
    expect(prefillOf(current, [current, own]).sources).toEqual({});
  });

  it('chooses a range on which everything that passes is on the screen', () => {
    // +3 dBm in 50 ohm: 0.893 V peak to peak, 8.9 divisions at 10 mV behind the probe, 4.5 at 20 mV.
    const scope = prefillOf(aCheck(), []);
    expect([scope.entry.voltsPerDivision, scope.sources.voltsPerDivision]).toEqual([
      '20 mV/div',
      'from the plan, for its window',
    ]);
    // 6.3 W in 50 ohm: 50.2 V peak to peak.
    const watts = aCheck({ method: 'dummy-load', unit: 'W', windowLow: 4, windowHigh: 6.3, target: 5 });
    expect(prefillOf(watts, []).entry.voltsPerDivision).toBe('1 V/div');
    const analyzer = { ...{ method: 'analyzer', windowHigh: -14.5 }, defaults: { padsInLineDb: 20 } };
    expect(prefillOf(aCheck(analyzer), []).entry.referenceLevelDbm).toBe('-30');
    // Three cycles of 8.8685 MHz take 338 ns.
    const seen = aCheck({ method: 'time-base', unit: 'Hz', target: 8_868_500, defaults: {} });
    expect(prefillOf(seen, []).entry.secondsPerDivision).toBe('50 ns/div');
  });

  it('counts attenuation built into the instrument to the pads of the plan, until somebody types', () => {
    const check = aCheck({ method: 'analyzer', defaults: { padsInLineDb: 20 } });
    const builtIn = { id: 'fr-032', tag: 'FR-032', figures: { padsInLineDb: 10 } };
    const { entry, sources } = prefillOf(check, [], builtIn);
    expect([entry.padsInLineDb, sources.padsInLineDb]).toEqual([
      '30',
      '20 dB from the plan, the rest built into FR-032',
    ]);
    const before = aReading({ method: 'analyzer', instrumentId: 'fr-032', entry: { padsInLineDb: '40' } });
    expect(prefillOf({ ...check, readings: [before] }, [], builtIn).entry.padsInLineDb).toBe('40');
  });
});

describe('an instrument’s sheet beside the form', () => {
  it('says what the reading is worked out with and what harms it, not what a field says already', () => {
    expect(sheetWords(fr041, detector)).toBe(
      'From FR-041: shown value ± 0.3 %, fit of its line ± 0.5 dB, never above +15 dBm at its input.',
    );
    expect(sheetWords({ tag: 'FR-051', figures: {}, damageLevelDbm: null }, detector)).toBeUndefined();
  });
});
