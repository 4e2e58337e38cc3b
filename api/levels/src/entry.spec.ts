import { ENTRY_METHODS, entryFields, methodGives, readEntry, readingFromInputs, scopeInput } from './index';

/** Numbers by the same road as the design's own picture of the stage page: 20 mV/div, 3.3 div, ×10, 50 ohm. */
const SCOPE = {
  voltsPerDivision: '20m',
  divisionsPeakToPeak: '3,3',
  readToDivisions: '0.1',
  probeRatio: '10',
  loadOhms: '50',
};

describe('readEntry', () => {
  it('reads each field as typed and says what it understood where that is not plain', () => {
    const { inputs, understoodAs, problems } = readEntry('oscilloscope', SCOPE, 'V');
    expect(inputs).toEqual({
      voltsPerDivision: 0.02,
      divisionsPeakToPeak: 3.3,
      readToDivisions: 0.1,
      probeRatio: 10,
      loadOhms: 50,
    });
    expect(Object.keys(understoodAs)).toEqual(['voltsPerDivision', 'divisionsPeakToPeak']);
    expect(problems).toEqual([]);
  });

  it('names every field that cannot be read, not only the first', () => {
    const { problems } = readEntry('meter', { value: 'plenty' }, 'mA');
    expect(problems.map(({ input }) => input)).toEqual(['value', 'readToValue']);
  });

  it('refuses a probe the club does not have', () => {
    const { problems } = readEntry('oscilloscope', { ...SCOPE, probeRatio: '100' }, 'V');
    expect(problems.map(({ input, message }) => ({ input, message }))).toEqual([
      { input: 'probeRatio', message: 'Probe: ×1 or ×10.' },
    ]);
  });
});

describe('readingFromInputs', () => {
  const of = (
    method: Parameters<typeof readEntry>[0],
    entry: Record<string, string>,
    unit: 'V' | 'mA' = 'V',
  ) => readingFromInputs(method, readEntry(method, entry, unit).inputs, {}, unit);

  it('gives the level of a scope entry', () => {
    // By hand: (0.02 V × 3.3 × 10 / 2√2)² / 50 ohm = 1.089 mW, 10 log10 of it in mW is +0.370 dBm.
    expect(of('oscilloscope', SCOPE).value).toBeCloseTo(0.3703, 3);
    expect(of('oscilloscope', SCOPE).watts).toBeCloseTo(1.089e-3, 9);
  });

  it('gives watts in a dummy load, dBm before the pads, dBc below the carrier, hertz and milliamperes', () => {
    const load = { ...SCOPE, voltsPerDivision: '1', divisionsPeakToPeak: '4.5' };
    // 45 V peak to peak in 50 ohm: 45² / (8 × 50) = 5.0625 W.
    expect(of('dummy-load', load)).toMatchObject({ unit: 'W', value: expect.closeTo(5.0625, 9) as number });
    const analyzer = {
      referenceLevelDbm: '0',
      divisionsDown: '3.2',
      dbPerDivision: '10',
      readToDivisions: '0.05',
    };
    expect(of('analyzer', { ...analyzer, padsInLineDb: '20 dB' }).value).toBeCloseTo(-12, 9);
    const peaks = {
      fundamentalDivisionsDown: '0.5',
      harmonicDivisionsDown: '3.7',
      dbPerDivision: '10',
      readToDivisions: '0.05',
    };
    expect(of('harmonic', peaks)).toMatchObject({ unit: 'dBc', value: expect.closeTo(-32, 9) as number });
    expect(of('counter', { frequencyMegahertz: '8.8685', gateSeconds: '1' }).value).toBeCloseTo(8_868_500, 6);
    expect(of('meter', { value: '22.4', readToValue: '0.1' }, 'mA')).toMatchObject({
      unit: 'mA',
      value: 22.4,
    });
  });

  it('reads a detector by its line, a diode probe, a time base and a load by its tap', () => {
    // By hand: 1.5 V / 25 mV per dB = 60 dB over the intercept of -85 dBm, 20 dB of pads before it.
    const detector = {
      ...{ volts: '1.5', readToVolts: '5m', voltsPerDb: '25m', interceptDbm: '-85' },
      ...{ validFromDbm: '-70', validToDbm: '5', padsInLineDb: '20' },
    };
    expect(of('log-detector', detector)).toMatchObject({
      unit: 'dBm',
      value: expect.closeTo(-5, 9) as number,
    });
    // By hand: 9.7 V and 0.3 V across the diode are 10 V peak, 1 W in 50 ohm, +30 dBm.
    const probe = { directVolts: '9.7', readToVolts: '0.05', diodeDropVolts: '0.3', loadOhms: '50' };
    expect(of('diode-probe', probe).value).toBeCloseTo(30, 9);
    // By hand: three cycles in 0.8 µs are 3.75 MHz.
    const trace = { cycles: '3', divisions: '4', secondsPerDivision: '0.2 us/div', readToDivisions: '0.1' };
    expect(of('time-base', trace)).toMatchObject({ unit: 'Hz', value: expect.closeTo(3.75e6, 3) as number });
    // By hand: 0 − 3 + 10 + 30 dBm = +37 dBm, 10^3.7 mW.
    const tap = {
      ...{ referenceLevelDbm: '0', divisionsDown: '0.3', dbPerDivision: '10', readToDivisions: '0.05' },
      ...{ padsInLineDb: '10', tapLossDb: '30' },
    };
    expect(of('dummy-load-tap', tap)).toMatchObject({
      unit: 'W',
      value: expect.closeTo(5.0119, 4) as number,
    });
  });

  it('tells two tones as peak envelope power, and their products below a tone or below the peak', () => {
    // 47 CFR 97.3(b): power at the crest of the envelope. 200 V peak to peak in 50 ohm: 200² / (8 × 50) = 100 W.
    const envelope = { ...SCOPE, voltsPerDivision: '5', divisionsPeakToPeak: '4' };
    expect(of('two-tone-envelope', envelope)).toMatchObject({
      unit: 'dBm',
      watts: expect.closeTo(100, 9) as number,
    });
    const lines = {
      ...{ toneDivisionsDown: '0.6', productDivisionsDown: '3.6' },
      ...{ dbPerDivision: '10', readToDivisions: '0.05' },
    };
    const { inputs } = readEntry('intermodulation', lines, 'V');
    const told = (assumptions: Record<string, number>) =>
      readingFromInputs('intermodulation', inputs, assumptions, 'V').value;
    expect(told({})).toBeCloseTo(-30, 9);
    // PEP is four times each tone: 6.02 dB.
    expect(told({ againstPeakEnvelopePower: 1 })).toBeCloseTo(-36.02, 2);
  });

  it('takes the accuracy it is told in place of the common one', () => {
    const { inputs } = readEntry('meter', { value: '100', readToValue: '0.1' }, 'mA');
    const common = readingFromInputs('meter', inputs, {}, 'mA').expandedUncertainty;
    expect(readingFromInputs('meter', inputs, { accuracyRel: 0.005 }, 'mA').expandedUncertainty).toBeLessThan(
      common,
    );
  });

  it('names the field the member typed when a number is out of domain', () => {
    expect(() => of('oscilloscope', { ...SCOPE, divisionsPeakToPeak: '33' })).toThrow(
      expect.objectContaining({ input: 'divisionsPeakToPeak', suggestion: 3.3 }),
    );
    expect(() => of('counter', { frequencyMegahertz: '0', gateSeconds: '1' })).toThrow(
      expect.objectContaining({ input: 'frequencyMegahertz' }),
    );
    expect(() => scopeInput({ probeRatio: 3 }, {})).toThrow(expect.objectContaining({ input: 'probeRatio' }));
  });
});

describe('entry fields', () => {
  it('tells which unit a method gives', () => {
    expect(methodGives('oscilloscope', 'dBm')).toBe(true);
    expect(methodGives('counter', 'dBm')).toBe(false);
    expect(methodGives('meter', 'kohm')).toBe(true);
  });

  it.each(ENTRY_METHODS)('%s: what is left out is named, whichever field it is', (method) => {
    const { problems } = readEntry(method, {}, 'V');
    expect(problems.map(({ input }) => input)).toEqual(entryFields(method, 'V').map(({ name }) => name));
  });

  it('asks a meter in the unit of its reading', () => {
    expect(entryFields('meter', 'mA').map(({ unit }) => unit)).toEqual(['mA', 'mA']);
  });
});
