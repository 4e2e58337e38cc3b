import type { QuantityUnit } from '@ferrite-row/levels';

/** What can be typed of a stage besides its name, in the order it is asked. */
export const COLUMNS = [
  { name: 'gainDb', label: 'Gain, a loss negative', unit: 'dB' },
  { name: 'toleranceDb', label: 'Window, ±', unit: 'dB' },
  { name: 'noiseFigureDb', label: 'Noise figure', unit: 'dB' },
  { name: 'outputInterceptDbm', label: 'Intercept out', unit: 'dBm' },
  { name: 'outputCompressionDbm', label: '1 dB less at', unit: 'dBm' },
  { name: 'limitDbm', label: 'Limit', unit: 'dBm' },
  { name: 'measuredDbm', label: 'Measured', unit: 'dBm' },
  { name: 'expandedUncertaintyDb', label: 'Measured, ±', unit: 'dB' },
] as const satisfies readonly { name: string; label: string; unit: QuantityUnit }[];

export type ColumnName = (typeof COLUMNS)[number]['name'];

/** A stage as it was typed. */
export type StageTexts = { name: string } & Record<ColumnName, string>;

/** Neither stands in a quantity, and both stay as they are in an address. */
const [CELL, ROW] = ['_', '*'];
const LONGEST_NAME = 30;
export const GREATEST_STAGES = 24;

const FIELDS = ['name', ...COLUMNS.map(({ name }) => name)] as const;
const BLANK = Object.fromEntries(FIELDS.map((name) => [name, ''])) as StageTexts;

/** What would part a text in two is not taken; the rest stays as typed. */
const clean = (name: string, text: string): string =>
  text.replace(/[_*]/g, ' ').slice(0, name === 'name' ? LONGEST_NAME : undefined);

/** Rows of stages in one text: `Mixer_-6.5_2*Pre-driver_20.5`. */
export const stagesText = (stages: readonly StageTexts[]): string =>
  stages
    .map((stage) =>
      FIELDS.map((name) => clean(name, stage[name]))
        .join(CELL)
        .replace(/_+$/, ''),
    )
    .join(ROW);

export const stagesOf = (text: string): StageTexts[] =>
  text === ''
    ? []
    : text
        .split(ROW)
        .slice(0, GREATEST_STAGES)
        .map((row) => {
          const cells = row.split(CELL);
          return Object.fromEntries(FIELDS.map((name, index) => [name, cells[index] ?? ''])) as StageTexts;
        });

export const withTyped = (
  stages: readonly StageTexts[],
  index: number,
  name: keyof StageTexts,
  text: string,
): StageTexts[] => stages.map((stage, at) => (at === index ? { ...stage, [name]: text } : stage));

export const without = (stages: readonly StageTexts[], index: number): StageTexts[] =>
  stages.filter((_stage, at) => at !== index);

/** The stage one place further on, or back with −1. */
export function moved(stages: readonly StageTexts[], index: number, by: 1 | -1): StageTexts[] {
  const next = [...stages];
  const [stage] = next.splice(index, 1);
  if (stage) next.splice(index + by, 0, stage);
  return next;
}

export const added = (stages: readonly StageTexts[]): StageTexts[] => [
  ...stages,
  { ...BLANK, name: `Stage ${stages.length + 1}`, gainDb: '0' },
];
