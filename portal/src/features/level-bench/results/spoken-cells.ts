import type { AnswerCell } from './answer-line';

/** The answer line as a sentence to be read aloud. */
export const spokenCells = (cells: readonly AnswerCell[]): string =>
  cells.map(({ name, figure, unit = '' }) => `${name} ${figure} ${unit}`.trim()).join('. ');
