import type { EntryMethod, MeterUnit } from '@ferrite-row/levels';
import type { Way } from './ways';

const ON_A_SCREEN = { dbPerDivision: '10', readToDivisions: '0.05' };

/** What the forms start with, as if it had been typed: readings as the plan Larkmoor Twenty asks for them. */
export const STARTS: Record<Exclude<EntryMethod, 'meter'>, Readonly<Record<string, string>>> = {
  oscilloscope: {
    ...{ voltsPerDivision: '20 mV', divisionsPeakToPeak: '3.3', readToDivisions: '0.1' },
    ...{ probeRatio: '10', loadOhms: '50' },
  },
  'dummy-load': {
    ...{ voltsPerDivision: '1', divisionsPeakToPeak: '4.5', readToDivisions: '0.1' },
    ...{ probeRatio: '10', loadOhms: '50' },
  },
  'two-tone-envelope': {
    ...{ voltsPerDivision: '1', divisionsPeakToPeak: '4.5', readToDivisions: '0.1' },
    ...{ probeRatio: '10', loadOhms: '50' },
  },
  analyzer: { ...ON_A_SCREEN, referenceLevelDbm: '0', divisionsDown: '1.64', padsInLineDb: '0' },
  'dummy-load-tap': {
    ...{ ...ON_A_SCREEN, referenceLevelDbm: '0', divisionsDown: '0.3', padsInLineDb: '10' },
    tapLossDb: '30',
  },
  harmonic: { ...ON_A_SCREEN, fundamentalDivisionsDown: '0.5', harmonicDivisionsDown: '3.7' },
  intermodulation: { ...ON_A_SCREEN, toneDivisionsDown: '0.6', productDivisionsDown: '3.6' },
  counter: { frequencyMegahertz: '8.86852', gateSeconds: '1' },
  'log-detector': {
    ...{ volts: '1.66', readToVolts: '5m', voltsPerDb: '25m', interceptDbm: '-85' },
    ...{ validFromDbm: '-70', validToDbm: '5', padsInLineDb: '20' },
  },
  'diode-probe': { directVolts: '3.05', readToVolts: '0.01', diodeDropVolts: '0.3', loadOhms: '50' },
  'time-base': { cycles: '3', divisions: '4.2', secondsPerDivision: '50 ns', readToDivisions: '0.1' },
};

export const METER_STARTS: Record<MeterUnit, readonly [value: string, readTo: string]> = {
  V: ['13.8', '0.1'],
  mV: ['224', '1'],
  A: ['0.95', '0.01'],
  mA: ['22.4', '0.1'],
  ohm: ['50.2', '0.1'],
  kohm: ['4.68', '0.01'],
  W: ['5.0', '0.1'],
  mW: ['112', '1'],
  dB: ['20.5', '0.1'],
};

export const START_WINDOWS: Partial<Record<Way, { low?: string; high?: string; target?: string }>> = {
  oscilloscope: { low: '0', high: '3', target: '1.5' },
  analyzer: { low: '-18.5', high: '-14.5', target: '-16.5' },
  harmonic: { high: '-25' },
  counter: { low: '8.8684', high: '8.8686', target: '8.8685' },
  'dummy-load': { low: '4', high: '6.3', target: '5' },
  'dummy-load-tap': { low: '4', high: '6.3', target: '5' },
  'two-tone-envelope': { low: '36', high: '38', target: '37' },
  'diode-probe': { low: '19', high: '22', target: '20.5' },
  gain: { low: '19', high: '22', target: '20.5' },
};

export const METER_WINDOWS: Partial<Record<MeterUnit, { low: string; high: string; target: string }>> = {
  mA: { low: '19', high: '25', target: '22' },
};
