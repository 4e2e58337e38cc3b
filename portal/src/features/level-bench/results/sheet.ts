import type { AnswerCell } from './answer-line';

/** A figure with its name, as a row of a table and a line of text. */
export interface Figure {
  name: string;
  figure: string;
}

/** What every calculation of the page comes to; each adds what its picture needs. */
export interface Sheet {
  /** Over the text: what was worked out. */
  title: string;
  cells: AnswerCell[];
  figures: Figure[];
  /** What the figures leave out or assume. */
  note?: string;
}

export const sheetText = ({ title, figures }: Sheet): string =>
  [`${title}:`, ...figures.map(({ name, figure }) => `${name}: ${figure}`)].join('\n');

/** The first figures as cells of the answer: '44.6 dB' becomes figure and unit. */
export function cellOf({ name, figure }: Figure, words?: string): AnswerCell {
  const [number = '', ...unit] = figure.split(' ');
  return /\d/.test(number)
    ? { name, figure: number, unit: unit.join(' ') || undefined, words }
    : { name, figure, words };
}
