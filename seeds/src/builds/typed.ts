import { dBm, ohms, voltsPeakToPeakFromDbm, dbmFromWatts, watts } from '@ferrite-row/levels';
import type { PlanCheck } from '@ferrite-row/api/plans/plan-check.entity';
import { DETECTOR } from '../detector';

export type Entry = Record<string, string>;

const PROBE = 10;
const LOAD = 50;
/** A scope's usual steps, volts per division: common practice. */
const STEPS = [0.002, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5];
const TALLEST = 7.6;

/** Volts as members type them: `20m`, `0.5`. */
const typedVolts = (volts: number): string => (volts < 0.1 ? `${Math.round(volts * 1000)}m` : String(volts));

/** What somebody types who sees this level on the oscilloscope through a ×10 probe across 50 ohm. */
function scopeEntry(levelDbm: number): Entry {
  const shown = voltsPeakToPeakFromDbm(dBm(levelDbm), ohms(LOAD)) / PROBE;
  const step = STEPS.find((volts) => shown / volts <= TALLEST) ?? 5;
  return {
    voltsPerDivision: typedVolts(step),
    divisionsPeakToPeak: (shown / step).toFixed(2),
    readToDivisions: '0.1',
    probeRatio: String(PROBE),
    loadOhms: String(LOAD),
  };
}

function analyzerEntry(levelDbm: number, { defaults }: PlanCheck): Entry {
  const { referenceLevelDbm = 0, dbPerDivision = 10, readToDivisions = 0.02, padsInLineDb = 0 } = defaults;
  return {
    referenceLevelDbm: String(referenceLevelDbm),
    divisionsDown: ((referenceLevelDbm + padsInLineDb - levelDbm) / dbPerDivision).toFixed(2),
    dbPerDivision: String(dbPerDivision),
    readToDivisions: String(readToDivisions),
    padsInLineDb: String(padsInLineDb),
  };
}

function harmonicEntry(levelDbc: number, { defaults }: PlanCheck): Entry {
  const { dbPerDivision = 10, readToDivisions = 0.05 } = defaults;
  const carrierDown = 0.5;
  return {
    fundamentalDivisionsDown: carrierDown.toFixed(2),
    harmonicDivisionsDown: (carrierDown - levelDbc / dbPerDivision).toFixed(2),
    dbPerDivision: String(dbPerDivision),
    readToDivisions: String(readToDivisions),
  };
}

/** Three figures of a hand-held meter, read to the last of them. */
function meterEntry(value: number): Entry {
  const decimals = Math.max(0, 2 - Math.floor(Math.log10(Math.abs(value) || 1)));
  return { value: value.toFixed(decimals), readToValue: (10 ** -decimals).toFixed(decimals) };
}

/** An analyzer on the tap shows the power less tap and pads. */
function tapEntry(powerWatts: number, check: PlanCheck): Entry {
  const { tapLossDb = 30 } = check.defaults;
  const atTap = dbmFromWatts(watts(powerWatts)) - tapLossDb;
  return { ...analyzerEntry(atTap, check), tapLossDb: String(tapLossDb) };
}

/** Each tone lies 6.02 dB below the peak that the product is told against. */
function productEntry(belowPeakDb: number, { defaults }: PlanCheck): Entry {
  const { dbPerDivision = 10, readToDivisions = 0.05 } = defaults;
  const toneDown = 0.6;
  return {
    toneDivisionsDown: toneDown.toFixed(2),
    productDivisionsDown: (toneDown - (belowPeakDb + 20 * Math.log10(2)) / dbPerDivision).toFixed(2),
    dbPerDivision: String(dbPerDivision),
    readToDivisions: String(readToDivisions),
  };
}

function detectorEntry(levelDbm: number, { defaults }: PlanCheck): Entry {
  const { padsInLineDb = 0, readToVolts = 0.005 } = defaults;
  const { voltsPerDb, interceptDbm, validFromDbm, validToDbm } = DETECTOR;
  return {
    volts: ((levelDbm - padsInLineDb - interceptDbm) * voltsPerDb).toFixed(3),
    ...{
      readToVolts: String(readToVolts),
      voltsPerDb: String(voltsPerDb),
      interceptDbm: String(interceptDbm),
    },
    ...{ validFromDbm: String(validFromDbm), validToDbm: String(validToDbm) },
    padsInLineDb: String(padsInLineDb),
  };
}

function probeEntry(levelDbm: number, { defaults }: PlanCheck): Entry {
  const { readToVolts = 0.01, diodeDropVolts = 0.3, loadOhms = LOAD } = defaults;
  const peak = voltsPeakToPeakFromDbm(dBm(levelDbm), ohms(loadOhms)) / 2;
  return {
    directVolts: (peak - diodeDropVolts).toFixed(2),
    ...{
      readToVolts: String(readToVolts),
      diodeDropVolts: String(diodeDropVolts),
      loadOhms: String(loadOhms),
    },
  };
}

/** Four whole cycles, on the fastest sweep that still shows them all. */
function timeBaseEntry(hertz: number): Entry {
  const cycles = 4;
  const step = [5, 10, 20, 50, 100, 200, 500].find((nano) => cycles / hertz / (nano * 1e-9) <= 10) ?? 1000;
  return {
    cycles: String(cycles),
    divisions: (cycles / hertz / (step * 1e-9)).toFixed(2),
    secondsPerDivision: `${step}n`,
    readToDivisions: '0.1',
  };
}

/** What somebody types who finds this value, by the check's own method; undefined for what works itself out. */
export function entryFor(check: PlanCheck, value: number): Entry | undefined {
  switch (check.method) {
    case 'oscilloscope':
    case 'two-tone-envelope':
      return scopeEntry(value);
    case 'dummy-load-tap':
      return tapEntry(value, check);
    case 'intermodulation':
      return productEntry(value, check);
    case 'log-detector':
      return detectorEntry(value, check);
    case 'diode-probe':
      return probeEntry(value, check);
    case 'time-base':
      return timeBaseEntry(value);
    case 'analyzer':
      return analyzerEntry(value, check);
    case 'harmonic':
      return harmonicEntry(value, check);
    case 'counter':
      return { frequencyMegahertz: (value / 1e6).toFixed(6), gateSeconds: '1' };
    case 'meter':
      return meterEntry(value);
    default:
      return undefined;
  }
}
