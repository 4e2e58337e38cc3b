import { formatQuantity, levelFigures, levelFrom, ohms, type LevelFigures } from '@ferrite-row/levels';
import { signed } from '../../../lib/text';
import type { ConversionValues } from './inputs';

export interface Converted {
  figures: LevelFigures;
  ohms: number;
}

/** Every way to tell the level that was typed. */
export function convert(values: ConversionValues): Converted {
  const resistance = ohms(values.resistance, 'resistance');
  const level = levelFrom(values.from, values[values.from], resistance);
  return { figures: levelFigures(level, resistance), ohms: values.resistance };
}

export interface FigureRow {
  name: string;
  figure: string;
}

const SIGNIFICANT = 4;

/** The rows of the table, the level first. */
export function figureRows({ figures }: Converted): FigureRow[] {
  const volts = (value: number) => formatQuantity(value, 'V', SIGNIFICANT);
  return [
    { name: 'Level', figure: `${signed(figures.dbm, 2)} dBm` },
    { name: 'Power', figure: formatQuantity(figures.watts, 'W', SIGNIFICANT) },
    { name: 'Volts rms', figure: volts(figures.voltsRms) },
    { name: 'Volts peak', figure: volts(figures.voltsPeak) },
    { name: 'Volts peak-to-peak', figure: volts(figures.voltsPeakToPeak) },
    { name: 'Amperes rms', figure: formatQuantity(figures.amperesRms, 'A', SIGNIFICANT) },
    { name: 'Voltage level', figure: `${signed(figures.dbMicrovolt, 2)} dBµV` },
    { name: 'Voltage level', figure: `${signed(figures.dbv, 2)} dBV` },
    { name: 'Voltage level', figure: `${signed(figures.dbu, 2)} dBu` },
  ];
}

export const inText = (converted: Converted): string =>
  [
    `In ${formatQuantity(converted.ohms, 'ohm')}, a sine:`,
    ...figureRows(converted).map(({ name, figure }) => `${name}: ${figure}`),
  ].join('\n');
