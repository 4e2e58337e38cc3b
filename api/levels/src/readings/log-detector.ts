import { accuracy, decibels, padLimit, rectangular } from '../analyzer';
import { wattsFromDbm } from '../conversions';
import { requireSome, requireWithin } from '../domain';
import { OutOfDomainError } from '../errors';
import { readingOf } from '../reading';
import type { LevelReading } from '../reading';
import { dBm } from '../units';

/** A detector's line: its output rises by a slope for each decibel, from 0 V at its intercept. */
export interface DetectorLine {
  /** Above 0, or below 0 for a detector whose output falls. */
  voltsPerDb: number;
  interceptDbm: number;
  /** Levels between which the line holds. */
  validFromDbm: number;
  validToDbm: number;
}

/** Points of a detector's own calibration, two or more; output must rise (or fall) all the way with level. */
export interface DetectorTable {
  points: readonly { dbm: number; volts: number }[];
}

/** What a voltmeter behind a logarithmic detector shows. */
export interface LogDetectorInput {
  volts: number;
  /** Half width within which it was read, V. */
  readToVolts: number;
  /** Of the voltmeter, relative to the reading; 0.005 where left out (common practice for a digital meter). */
  meterAccuracyRel?: number;
  calibration: DetectorLine | DetectorTable;
  /** How well line or table fits the detector at this frequency and temperature, ± dB. */
  conformityDb: number;
  /** Before the detector, 0 or more. */
  padsInLineDb: number;
  padToleranceDb?: number;
}

/** Common practice for a digital meter on a direct voltage. */
export const ASSUMED_METER_ACCURACY_REL = 0.005;

/**
 * Level before the pads from a logarithmic detector and a voltmeter.
 *
 * @returns dBm; uncertainties in dB; four rectangular components: reading resolution, voltmeter, conformity, pads; watts.
 * @throws OutOfDomainError naming the input; `volts` where the level at the detector is outside its valid range: there
 *   it saturates or shows noise, and no formula helps.
 * @example logDetectorReading({ volts: 1.5, readToVolts: 0.005, calibration: { voltsPerDb: 0.025, interceptDbm: -85, validFromDbm: -70, validToDbm: 5 }, conformityDb: 1, padsInLineDb: 20 }).value //=> -5
 * @see JCGM 100:2008 (GUM), 5.1.2; slope and intercept as data sheets of logarithmic detectors define them
 */
export function logDetectorReading(input: LogDetectorInput): LevelReading {
  const { volts, readToVolts, meterAccuracyRel = ASSUMED_METER_ACCURACY_REL, padsInLineDb } = input;
  requireWithin({ input: 'volts', label: 'Voltage', unit: 'V', atLeast: -100, atMost: 100 }, volts);
  requireWithin(
    { input: 'readToVolts', label: 'Read to within', unit: 'V', above: 0, atMost: 10 },
    readToVolts,
  );
  requireWithin(
    { input: 'meterAccuracyRel', label: 'Accuracy of the voltmeter', atLeast: 0, atMost: 0.25 },
    meterAccuracyRel,
  );
  const { dbm, voltsPerDb } = levelAtDetector(input.calibration, volts);
  const level = dBm(dbm + decibels('padsInLineDb', 'Pads in line', padsInLineDb));
  const slope = Math.abs(voltsPerDb);
  const reading = readingOf('logarithmic-detector/1', level, 'dBm', [
    rectangular('reading resolution', readToVolts / slope),
    rectangular('voltmeter', (meterAccuracyRel * Math.abs(volts)) / slope),
    rectangular('conformity', accuracy('conformityDb', 'Conformity of the detector', input.conformityDb)),
    rectangular('pads', padLimit(input)),
  ]);
  return { ...reading, watts: wattsFromDbm(level) };
}

interface DetectorPoint {
  dbm: number;
  voltsPerDb: number;
}

function levelAtDetector(calibration: DetectorLine | DetectorTable, volts: number): DetectorPoint {
  return 'points' in calibration ? fromTable(calibration, volts) : fromLine(calibration, volts);
}

function fromLine(
  { voltsPerDb, interceptDbm, validFromDbm, validToDbm }: DetectorLine,
  volts: number,
): DetectorPoint {
  requireSlope(voltsPerDb);
  dBm(interceptDbm, 'interceptDbm');
  const from = dBm(validFromDbm, 'validFromDbm');
  const range = {
    input: 'validToDbm',
    label: 'End of the valid range',
    unit: 'dBm',
    above: from,
    atMost: 300,
  };
  requireWithin(range, validToDbm);
  const voltsAt = (dbm: number) => (dbm - interceptDbm) * voltsPerDb;
  requireInRange(volts, voltsAt(from), voltsAt(validToDbm));
  return { dbm: interceptDbm + volts / voltsPerDb, voltsPerDb };
}

function requireSlope(voltsPerDb: number): void {
  const domain = { input: 'voltsPerDb', label: 'Slope', unit: 'V/dB', atLeast: 1e-5, atMost: 10 };
  requireWithin(domain, Math.abs(voltsPerDb));
}

/** Straight lines between the points. */
function fromTable({ points }: DetectorTable, volts: number): DetectorPoint {
  const sorted = requireTable(points);
  const all = sorted.map((point) => point.volts);
  requireInRange(volts, Math.min(...all), Math.max(...all));
  const upper = sorted.findIndex(
    (point, index) => index > 0 && isUpTo(volts, point.volts, sorted[0]?.volts ?? 0),
  );
  const last = upper === -1 ? sorted.length - 1 : upper;
  const [below, above] = [sorted[last - 1], sorted[last]];
  if (below === undefined || above === undefined) throw new Error('a checked table has two points or more');
  const voltsPerDb = (above.volts - below.volts) / (above.dbm - below.dbm);
  return { dbm: below.dbm + (volts - below.volts) / voltsPerDb, voltsPerDb };
}

/** On the way from the first point's voltage, whichever way that goes. */
function isUpTo(volts: number, end: number, start: number): boolean {
  return end >= start ? volts <= end : volts >= end;
}

function requireTable(points: DetectorTable['points']): { dbm: number; volts: number }[] {
  requireSome({ input: 'points', label: 'Points of the calibration' }, points);
  const sorted = [...points].sort((a, b) => a.dbm - b.dbm);
  for (const { dbm, volts } of sorted) {
    dBm(dbm, 'points');
    requireWithin(
      { input: 'points', label: 'Voltage of a point', unit: 'V', atLeast: -100, atMost: 100 },
      volts,
    );
  }
  const steps = sorted.slice(1).map((point, index) => {
    const before = sorted[index] ?? point;
    return (point.volts - before.volts) / (point.dbm - before.dbm);
  });
  const isOneWay =
    steps.length > 0 && steps.every((step) => step * (steps[0] ?? 0) > 0 && Number.isFinite(step));
  if (isOneWay) return sorted;
  const permitted = 'two points or more, each level once, with the voltage rising or falling all the way';
  throw new OutOfDomainError('points', points, permitted, `Calibration: needed are ${permitted}.`);
}

/** Twelve digits, so that neither bound nor reading is refused for binary noise. */
function requireInRange(volts: number, atOneEnd: number, atOther: number): void {
  const tidy = (value: number) => Number(value.toPrecision(12));
  const [low, high] = [Math.min(atOneEnd, atOther), Math.max(atOneEnd, atOther)];
  const domain = { input: 'volts', label: 'Voltage, for the valid range of the detector', unit: 'V' };
  requireWithin({ ...domain, atLeast: tidy(low), atMost: tidy(high) }, tidy(volts));
}
