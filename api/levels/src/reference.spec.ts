import levelTable from '../reference/levels.json';
import uncertaintyTable from '../reference/uncertainty.json';
import {
  mismatchBounds,
  COVERAGE_FACTOR,
  dB,
  dBm,
  dbFromPowerRatio,
  dbFromPowerTolerance,
  dbFromVoltageRatio,
  dbFromVoltageTolerance,
  dbmFromVoltsPeakToPeak,
  dbmFromVoltsRms,
  dbmFromWatts,
  type Distribution,
  formatReading,
  ohms,
  oscilloscopeReading,
  OutOfDomainError,
  powerRatioFromDb,
  type UncertaintySource,
  uncertaintyBudget,
  verdictOf,
  volts,
  voltsPeakToPeakFromDbm,
  voltsRmsFromDbm,
  watts,
  wattsFromDbm,
  wattsFromVoltsRms,
} from './index';

// Values, tolerances and sources: api/levels/reference/*.json, each row with its own source.

const within = (actual: number, expected: number, tolerance: number) => {
  expect(Math.abs(actual - expected)).toBeLessThanOrEqual(tolerance);
};

describe('conversions against the definitions of IEC 60027-3 and ITU-R V.574', () => {
  it.each(levelTable.entries)(
    '$id: $inputs.dBm dBm in watts and volts',
    ({ inputs, expected, tolerance }) => {
      const level = dBm(inputs.dBm);
      const resistance = ohms(inputs.R_ohm);
      within(wattsFromDbm(level), expected.W, expected.W * tolerance.rel);
      within(voltsRmsFromDbm(level, resistance), expected.Vrms, expected.Vrms * tolerance.rel);
      within(voltsPeakToPeakFromDbm(level, resistance), expected.Vpp, expected.Vpp * tolerance.rel);
      within(dbmFromWatts(watts(expected.W)), inputs.dBm, tolerance.dB);
      within(dbmFromVoltsRms(volts(expected.Vrms), resistance), inputs.dBm, tolerance.dB);
    },
  );

  it.each(levelTable.voltageToLevel)('$id: $inputs.V V $inputs.kind is $expected.dBm dBm', (row) => {
    const { inputs, expected, tolerance } = row;
    const toLevel = inputs.kind === 'pp' ? dbmFromVoltsPeakToPeak : dbmFromVoltsRms;
    const level = toLevel(volts(inputs.V), ohms(inputs.R_ohm));
    within(level, expected.dBm, tolerance.dB);
    within(wattsFromDbm(level), expected.W, expected.W * tolerance.rel);
    if (inputs.kind === 'rms') {
      within(wattsFromVoltsRms(volts(inputs.V), ohms(inputs.R_ohm)), expected.W, expected.W * tolerance.rel);
    }
  });

  it.each(levelTable.ratios)('$id: a ratio of two is $expected.dB dB', ({ inputs, expected, tolerance }) => {
    const ratio = inputs.power_ratio === undefined ? dbFromVoltageRatio(2) : dbFromPowerRatio(2);
    within(ratio, expected.dB, tolerance.abs);
    expect(powerRatioFromDb(dB(0))).toBe(1);
  });

  it('edge-01 to edge-03: no power, negative power and no resistance have no level', () => {
    expect(() => dbmFromWatts(watts(0))).toThrow(OutOfDomainError);
    expect(() => watts(-1)).toThrow(OutOfDomainError);
    expect(() => ohms(0)).toThrow(OutOfDomainError);
  });
});

describe('uncertainty against the GUM (JCGM 100:2008)', () => {
  it.each(uncertaintyTable.conversions)('$id: a tolerance in decibels, to first order', (row) => {
    const { voltage_uncertainty_pct: voltage, power_uncertainty_pct: power } = row.inputs;
    const limit =
      voltage === undefined
        ? dbFromPowerTolerance((power ?? NaN) / 100)
        : dbFromVoltageTolerance(voltage / 100);
    within(limit, row.expected.dB_linearised, row.tolerance.abs);
    expect(limit).toBeGreaterThan(row.expected.dB_plus);
    expect(limit).toBeLessThan(-row.expected.dB_minus);
  });

  const distributionOf: Record<string, Distribution> = {
    rectangular: 'rectangular',
    triangular: 'triangular',
    'U-shaped (mismatch)': 'U-shaped',
    'U-shaped': 'U-shaped',
    'normal, expanded at k=2': 'normal, k = 2',
    'normal k=2': 'normal, k = 2',
    standard: 'standard',
  };
  const source = (name: string, limit: number, distribution: string): UncertaintySource => {
    return { name, limit, distribution: distributionOf[distribution] ?? 'standard' };
  };

  it.each(uncertaintyTable.distributions)(
    '$id: $inputs.distribution limit of 1',
    ({ inputs, expected, tolerance }) => {
      const { standardUncertainty } = uncertaintyBudget([source('x', 1, inputs.distribution)]);
      within(standardUncertainty, expected.standard_uncertainty, tolerance.abs);
    },
  );

  it.each(uncertaintyTable.budgets)('$id: budget of $inputs.measurand', ({ inputs, expected, tolerance }) => {
    const budget = uncertaintyBudget(
      inputs.components.map(({ name, value, distribution }) => source(name, value, distribution)),
    );
    budget.components.forEach((component, index) => {
      within(component.standardUncertainty, expected.u[index] ?? NaN, tolerance.abs);
    });
    within(budget.standardUncertainty, expected.uc, tolerance.abs);
    within(budget.expandedUncertainty, expected.U, tolerance.abs);
  });

  it('bud-1: an oscilloscope of 3 %, 0.1 of 5 divisions and a load of 1 % gives that budget from its raw inputs', () => {
    const reading = oscilloscopeReading({
      voltsPerDivision: 0.4,
      divisionsPeakToPeak: 5,
      readToDivisions: 0.1,
      probeRatio: 1,
      loadOhms: 50,
      verticalGainToleranceRel: 0.03,
      probeToleranceRel: 0,
      loadToleranceRel: 0.01,
    });
    within(reading.value, 10, 1e-9);
    within(reading.expandedUncertainty, 0.36508, 2e-5);
  });

  it('resolution: half a step of a display, rectangular', () => {
    const [row] = uncertaintyTable.resolution;
    const half = (row?.inputs.display_step ?? NaN) / 2;
    const { standardUncertainty } = uncertaintyBudget([source('display', half, 'rectangular')]);
    within(standardUncertainty, row?.expected.standard_uncertainty ?? NaN, 1e-6);
  });

  it('corr-1: sources that know nothing of each other add as squares', () => {
    const row = uncertaintyTable.combining.find(({ id }) => id === 'corr-1');
    const { u1 = NaN, u2 = NaN } = row?.inputs ?? {};
    const { standardUncertainty } = uncertaintyBudget([
      source('a', u1, 'standard'),
      source('b', u2, 'standard'),
    ]);
    within(standardUncertainty, row?.expected.uc ?? NaN, 1e-9);
  });

  it('mismatch-1: two reflections facing each other, either way', () => {
    const row = uncertaintyTable.combining.find(({ id }) => id === 'mismatch-1');
    const found = mismatchBounds(row?.inputs.rho_source ?? NaN, row?.inputs.rho_load ?? NaN);
    within(-found.leastDb, row?.expected.plus_dB ?? NaN, 1e-4);
    within(-found.greatestDb, row?.expected.minus_dB ?? NaN, 1e-4);
  });

  /** Part of a normal distribution under `k`, by Simpson's rule. */
  const normalUnder = (k: number): number => {
    const [from, steps] = [-9, 20_000];
    const width = (k - from) / steps;
    const weight = (index: number) => (index === 0 || index === steps ? 1 : index % 2 === 1 ? 4 : 2);
    const heights = Array.from({ length: steps + 1 }, (_step, index) => {
      return weight(index) * Math.exp(-((from + index * width) ** 2) / 2);
    });
    return (heights.reduce((sum, height) => sum + height, 0) * width) / 3 / Math.sqrt(2 * Math.PI);
  };

  it('cov-k2: the factor taken covers 95.45 % of a normal distribution', () => {
    const [row] = uncertaintyTable.coverage;
    expect(COVERAGE_FACTOR).toBe(row?.inputs.k);
    within(100 * (2 * normalUnder(COVERAGE_FACTOR) - 1), row?.expected.coverage_pct ?? NaN, 0.01);
  });

  it('risk-2: the nearest value that passes is wrongly passed under 2.5 times in a hundred', () => {
    const [row] = uncertaintyTable.risk;
    const [limit, expanded] = [-43, 1.2];
    const nearest = limit - expanded;
    expect(verdictOf(nearest, expanded, { high: limit })).toBe('pass');
    expect(verdictOf(nearest + 1e-9, expanded, { high: limit })).not.toBe('pass');
    const wronglyPassed = 100 * (1 - normalUnder((limit - nearest) / (expanded / COVERAGE_FACTOR)));
    within(wronglyPassed, row?.expected.false_accept_max_pct ?? NaN, 0.3);
    expect(wronglyPassed).toBeLessThan(2.5);
  });

  it('round-1: value and uncertainty are shown to the same decimals', () => {
    const harmonic = { value: -47.2183, unit: 'dBc', expandedUncertainty: 0.9872 } as const;
    expect(formatReading(harmonic, 1)).toBe('−47.2 ± 1.0 dBc');
  });
});

describe('verdicts against ILAC-G8:09/2019 and ISO 14253-1', () => {
  // The rule here is ILAC's with three outcomes; both its conditional ones are too close to call.
  const words: Record<string, string> = {
    pass: 'pass',
    'conditional pass': 'too close to call',
    'conditional fail': 'too close to call',
    fail: 'not yet',
  };

  it.each(uncertaintyTable.decisionsUpper)('$id: $inputs.value_dBc dBc under a limit of -43 dBc', (row) => {
    const { value_dBc: value, U_dB: uncertainty, upper_limit_dBc: high } = row.inputs;
    const verdict = verdictOf(value, uncertainty, { high });
    expect(verdict).toBe(words[row.expected.guarded_non_binary]);
    expect(verdict === 'pass').toBe(row.expected.iso_14253_1 === 'conformity proven');
  });

  it.each(uncertaintyTable.decisionsLower)('$id: $inputs.value_W W over $inputs.lower_limit_W W', (row) => {
    const verdict = verdictOf(row.inputs.value_W, row.inputs.U_W, { low: row.inputs.lower_limit_W });
    expect(verdict === 'pass').toBe(row.expected.guarded_binary === 'pass');
    expect(verdict === 'not yet').toBe(row.expected.guarded_non_binary === 'fail');
  });
});
