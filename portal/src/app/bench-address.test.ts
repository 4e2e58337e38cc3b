import { ENTRY_METHODS, entryFields, methodUnit, type EntryMethod } from '@ferrite-row/levels';
import { describe, expect, it } from 'vitest';
import { benchAddress, gainAddress } from '../features/builds/logic/bench-address';
import { liveReading } from '../features/builds/logic/live-reading';
import { aCheck, aReading } from '../features/builds/testing/build.fixture';
import { textsOf } from '../features/level-bench/inputs/address';
import { readValues } from '../features/level-bench/inputs/read-values';
import { INPUTS } from '../features/level-bench/readings/inputs';
import { STARTS } from '../features/level-bench/readings/starts';
import { work } from '../features/level-bench/readings/work';

/** What the level bench makes of an address. */
function opened(path: string | undefined) {
  if (!path) throw new Error('there is an address');
  const [room, search = ''] = path.split('?');
  const read = readValues(INPUTS, textsOf(INPUTS, search));
  if (!read.isComplete) throw new Error(JSON.stringify(read.problems));
  return { room, ...work(read.values) };
}

/** Unlike what either page would take by itself. */
const PLANNED = { padToleranceDb: 0.2, tapToleranceDb: 0.35, diodeDropPlusMinusVolts: 0.07 };
const FIGURES = {
  ...{ amplitudeAccuracyDb: 0.7, scaleFidelityDb: 0.3, flatnessDb: 0.6, conformityDb: 0.45 },
  ...{ verticalGainToleranceRel: 0.021, timeBaseToleranceRel: 0.017, timeBasePpm: 0.4, accuracyRel: 0.006 },
};

const checkOf = (method: EntryMethod) => {
  const unit = method === 'meter' ? 'mA' : methodUnit(method, 'mA');
  const isPeak = method === 'intermodulation' && { againstPeakEnvelopePower: 1 };
  return aCheck({
    ...{
      method,
      unit,
      windowLow: unit === 'Hz' ? 1e6 : -60,
      windowHigh: unit === 'Hz' ? 9e6 : 60,
      target: null,
    },
    defaults: { ...PLANNED, ...isPeak },
  });
};

const entryOf = (method: EntryMethod) => {
  const entry = method === 'meter' ? { value: '22.4', readToValue: '0.2' } : STARTS[method];
  expect(Object.keys(entry).sort()).toEqual(
    entryFields(method, 'mA')
      .map(({ name }) => name)
      .sort(),
  );
  return { ...entry };
};

describe('a check opened on the level bench', () => {
  it.each(ENTRY_METHODS)('comes to the same value, uncertainty and verdict there: %s', (method) => {
    const [check, entry] = [checkOf(method), entryOf(method)];
    const here = liveReading(check, entry, FIGURES);
    if (here.state !== 'read') throw new Error(JSON.stringify(here));
    const there = opened(benchAddress(check, entry, FIGURES));
    expect(there.room).toBe('/level-bench/readings');
    expect(there.reading.value).toBeCloseTo(here.reading.value, 6);
    expect(there.reading.expandedUncertainty / here.reading.expandedUncertainty).toBeCloseTo(1, 9);
    expect(there.verdict).toBe(here.verdict);
  });

  it('takes a gain there with its two levels', () => {
    const gain = aCheck({
      method: 'gain',
      unit: 'dB',
      windowLow: 19,
      windowHigh: 22,
      fromCheckIds: ['a', 'b'],
    });
    const levels = [aReading({ value: 1.5, expandedUncertainty: 0.4 }), aReading({ value: -19.2 })];
    const { reading, window } = opened(gainAddress(gain, levels));
    expect(reading.value).toBeCloseTo(20.7, 9);
    expect(reading.expandedUncertainty).toBeCloseTo(Math.hypot(0.4, 0.47), 9);
    expect(window).toMatchObject({ low: 19, high: 22 });
    expect(gainAddress(gain, [levels[0], undefined])).toBeUndefined();
  });
});
