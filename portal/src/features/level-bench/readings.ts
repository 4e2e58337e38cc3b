import {
  entryFields,
  formatQuantity,
  formatReading,
  LevelsError,
  readEntry,
  readingFromInputs,
} from '@ferrite-row/levels';

/** The ways of measuring that stand on the bench so far: both give dBm. */
export const WAYS = ['oscilloscope', 'analyzer'] as const;
export type Way = (typeof WAYS)[number];

/** What a form starts with, as if it had been typed. */
export const STARTS: Record<Way, Record<string, string>> = {
  oscilloscope: { readToDivisions: '0.1', probeRatio: '10', loadOhms: '50' },
  analyzer: { referenceLevelDbm: '0', dbPerDivision: '10', readToDivisions: '0.05', padsInLineDb: '0' },
};

export const fieldsOf = (way: Way) => entryFields(way, 'V');

export type Worked = { level: string; beside: string } | { why: string };

/** The level of an entry in words, or what is still missing. Unit and uncertainty are the levels package's. */
export function workOut(way: Way, entry: Record<string, string>): Worked {
  const { inputs, problems } = readEntry(way, entry, 'V');
  if (problems.length > 0) return { why: 'The level shows here as you type.' };
  try {
    const reading = readingFromInputs(way, inputs, {}, 'V');
    const parts = [
      reading.voltsPeakToPeak !== undefined && `${formatQuantity(reading.voltsPeakToPeak, 'V')} p-p`,
      reading.watts !== undefined && formatQuantity(reading.watts, 'W'),
      'at 95 %',
    ];
    return { level: formatReading(reading), beside: parts.filter(Boolean).join(', ') };
  } catch (error) {
    if (!(error instanceof LevelsError)) throw error;
    return { why: error.message };
  }
}
