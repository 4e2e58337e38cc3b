import { oscilloscopeReading } from '@ferrite-row/levels';
import { counts, isSettled, missingToSend, missingToSignOff, type CheckStanding } from './checks.rules';
import { photoTypeOf } from './photos.rules';
import { asksForTick, judgeDerived, judgeEntry, type AskedMeasure } from './readings.rules';

const LEVEL: AskedMeasure = {
  ...{ method: 'oscilloscope', unit: 'dBm', windowLow: 0, windowHigh: 3 },
  defaults: { probeRatio: 10, loadOhms: 50 },
};
const ENTRY = {
  ...{ voltsPerDivision: '20m', divisionsPeakToPeak: '3.3', readToDivisions: '0.1' },
  ...{ probeRatio: '10', loadOhms: '50' },
};

const judged = (asked: AskedMeasure, entry: Record<string, unknown>, method = asked.method ?? '') => {
  const judgement = judgeEntry(asked, method, entry);
  if ('problems' in judgement) throw new Error(JSON.stringify(judgement.problems));
  return judgement;
};
const problems = (asked: AskedMeasure, entry: Record<string, unknown>, method = asked.method ?? '') => {
  const judgement = judgeEntry(asked, method, entry);
  return 'problems' in judgement ? judgement.problems : [];
};

describe('judging an entry', () => {
  it('works out level, uncertainty and verdict from what was typed', () => {
    // The worked case of the levels package: 20 mV/div, 3.3 div, ×10, 50 ohm is +0.37 ± 0.47 dBm.
    const { reading, verdict, inputs } = judged(LEVEL, ENTRY);
    expect(reading.value).toBeCloseTo(0.37, 2);
    expect(reading.expandedUncertainty).toBeCloseTo(0.47, 2);
    expect(verdict).toBe('too close to call');
    expect(inputs).toMatchObject({ voltsPerDivision: 0.02, divisionsPeakToPeak: 3.3, probeRatio: 10 });
  });

  it('never rounds before judging: a hair over the window’s end is too close', () => {
    const { value, expandedUncertainty } = oscilloscopeReading({
      ...{
        voltsPerDivision: 0.02,
        divisionsPeakToPeak: 3.3,
        readToDivisions: 0.1,
        probeRatio: 10,
        loadOhms: 50,
      },
    });
    const end = value - expandedUncertainty;
    expect(judged({ ...LEVEL, windowLow: end }, ENTRY).verdict).toBe('pass');
    expect(judged({ ...LEVEL, windowLow: end + 1e-9 }, ENTRY).verdict).toBe('too close to call');
  });

  it('takes the accuracy the instrument states', () => {
    const asked = { ...LEVEL, method: 'analyzer', windowLow: -30, windowHigh: 0 };
    const entry = {
      referenceLevelDbm: '0',
      divisionsDown: '1.9',
      dbPerDivision: '10',
      readToDivisions: '0.02',
      padsInLineDb: '0',
    };
    const good = judgeEntry(asked, 'analyzer', entry, { amplitudeAccuracyDb: 0.3, flatnessDb: 2 });
    const common = judgeEntry(asked, 'analyzer', entry);
    if ('problems' in good || 'problems' in common) throw new Error('both can be read');
    expect(good.reading.expandedUncertainty).toBeLessThan(common.reading.expandedUncertainty);
    expect(good.inputs.amplitudeAccuracyDb).toBe(0.3);
    expect(good.inputs).not.toHaveProperty('flatnessDb');
  });

  it('names each field that cannot be read, is out of domain, is strange or is no text', () => {
    expect(problems(LEVEL, { ...ENTRY, divisionsPeakToPeak: '33' })[0]?.pointer).toBe(
      '#/entry/divisionsPeakToPeak',
    );
    expect(
      problems(LEVEL, { ...ENTRY, loadOhms: 'fifty', voltsPerDivision: '' }).map(({ pointer }) => pointer),
    ).toEqual(['#/entry/voltsPerDivision', '#/entry/loadOhms']);
    expect(problems(LEVEL, { ...ENTRY, value: '1.5' })).toEqual([
      { pointer: '#/entry/value', detail: 'There is no field named value.' },
    ]);
    expect(problems(LEVEL, { ...ENTRY, loadOhms: 50 })).toEqual([
      { pointer: '#/entry/loadOhms', detail: 'Send what was typed, as text.' },
    ]);
    expect(problems(LEVEL, ENTRY, 'analyzer')).toEqual([
      { pointer: '#/method', detail: 'This check is taken by oscilloscope.' },
    ]);
    expect(problems({ ...LEVEL, method: 'gain' }, {})).toEqual([
      { pointer: '#/method', detail: 'This value works itself out.' },
    ]);
  });
});

describe('a value that works itself out', () => {
  const kept = (value: number, expandedUncertainty: number) => ({
    ...{ value, unit: 'dBm', uncertaintyUnit: 'dB', expandedUncertainty },
    ...{ standardUncertainty: expandedUncertainty / 2, components: [], voltsPeakToPeak: null, watts: null },
    calculation: 'oscilloscope/1',
  });

  it('is output less input, with both uncertainties root-sum-squared', () => {
    const asked = { ...LEVEL, method: 'gain', unit: 'dB', windowLow: 19, windowHigh: 22 };
    const gain = judgeDerived(asked, [kept(0.4, 0.3), kept(-19.4, 0.4)]);
    expect(gain?.reading.value).toBeCloseTo(19.8, 9);
    // √(0.3² + 0.4²) = 0.5
    expect(gain?.reading.expandedUncertainty).toBeCloseTo(0.5, 9);
    expect(gain?.verdict).toBe('pass');
  });

  it('is carried over with its uncertainty and calculation, and judged by the window it comes into', () => {
    const asked = { ...LEVEL, method: 'carried', windowLow: -19, windowHigh: -17 };
    expect(judgeDerived(asked, [kept(-19.4, 0.5)])).toMatchObject({
      verdict: 'too close to call',
      reading: { value: -19.4, expandedUncertainty: 0.5, calculation: 'oscilloscope/1' },
    });
  });

  it('waits until everything it is made of is there', () => {
    expect(judgeDerived({ ...LEVEL, method: 'gain' }, [kept(0.4, 0.3)])).toBeUndefined();
    expect(judgeDerived({ ...LEVEL, method: 'carried' }, [])).toBeUndefined();
  });
});

describe('a checklist', () => {
  const check = (overrides: Partial<CheckStanding>): CheckStanding => ({
    ...{ id: 'a', title: 'A', kind: 'tick', isRequired: true, isMarked: false, photos: 0 },
    ...overrides,
  });

  it('is settled by a pass, a photo or a mark, each on its own kind', () => {
    expect(isSettled(check({ kind: 'measure', verdict: 'pass' }))).toBe(true);
    expect(isSettled(check({ kind: 'measure', verdict: 'too close to call' }))).toBe(false);
    expect(isSettled(check({ kind: 'measure', isMarked: true }))).toBe(false);
    expect(isSettled(check({ kind: 'photo', photos: 1 }))).toBe(true);
    expect(isSettled(check({ isMarked: true }))).toBe(true);
  });

  it('waits for a mentor’s eyes only to be signed off, and for safety even when it is not required', () => {
    const checks = [
      check({ id: 'eyes', kind: "mentor's eyes" }),
      check({ id: 'safety', kind: 'safety', isRequired: false }),
      check({ id: 'extra', isRequired: false }),
    ];
    expect(missingToSend(checks).map(({ id }) => id)).toEqual(['safety']);
    expect(missingToSignOff(checks).map(({ id }) => id)).toEqual(['eyes', 'safety']);
    expect(checks.map(counts)).toEqual([true, true, false]);
  });

  it('asks for a tick with each reading where it can burn or be heard', () => {
    expect(asksForTick(['load before power', 'hot parts'])).toBe(false);
    expect(asksForTick(['hot parts', 'rf power'])).toBe(true);
  });
});

describe('a photo', () => {
  it('is what its first bytes say', () => {
    const webp = Buffer.from('RIFF\u0001\u0002\u0003\u0004WEBPVP8 ', 'latin1');
    expect(photoTypeOf(Buffer.from([0xff, 0xd8, 0xff, 0xe0]))).toBe('image/jpeg');
    expect(photoTypeOf(Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]))).toBe('image/png');
    expect(photoTypeOf(webp)).toBe('image/webp');
    expect(photoTypeOf(Buffer.from('<svg xmlns="http://www.w3.org/2000/svg">'))).toBeUndefined();
    expect(photoTypeOf(Buffer.from('GIF89a'))).toBeUndefined();
    expect(photoTypeOf(Buffer.from([]))).toBeUndefined();
  });
});
