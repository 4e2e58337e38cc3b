import {
  assumptionsWith,
  ENTRY_METHODS,
  entryFields,
  figuresFor,
  figureWords,
  INSTRUMENT_FIGURES,
} from './index';

const ALL = Object.fromEntries(INSTRUMENT_FIGURES.map((name, index) => [name, (index + 1) / 1000]));

describe('an instrument’s own figures', () => {
  it('serve some method, each of them, and every method takes some', () => {
    const used = ENTRY_METHODS.map((method) => Object.keys(figuresFor(method, 'V', ALL)));
    expect(new Set(used.flat())).toEqual(new Set(INSTRUMENT_FIGURES));
    expect(used.filter((names) => names.length === 0)).toEqual([]);
  });

  it('outrank what the plan takes for granted, and leave the rest of the plan alone', () => {
    const planned = { amplitudeAccuracyDb: 1.5, padToleranceDb: 0.3 };
    expect(assumptionsWith('analyzer', 'dBm', planned, { amplitudeAccuracyDb: 0.8, flatnessDb: 2 })).toEqual({
      amplitudeAccuracyDb: 0.8,
      padToleranceDb: 0.3,
    });
  });

  it('do not make a part of the value out of decibels a meter shows', () => {
    const planned = { accuracyRel: 0, accuracyFixed: 0.15 };
    expect(assumptionsWith('meter', 'dB', planned, { accuracyRel: 0.01 })).toEqual(planned);
    expect(assumptionsWith('meter', 'mA', planned, { accuracyRel: 0.008 }).accuracyRel).toBe(0.008);
  });

  it('that stand in a field of the form are no limits', () => {
    const fields = ENTRY_METHODS.flatMap((method) => entryFields(method, 'V').map(({ name }) => name));
    const words = figureWords(ALL);
    expect(words.map(({ name }) => name)).toEqual(INSTRUMENT_FIGURES);
    for (const { name, words: text } of words) expect(text.startsWith('±')).toBe(!fields.includes(name));
  });
});
