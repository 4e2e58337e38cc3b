import { formatQuantity, levelFigures, levelFrom, ohms, type LevelFigures } from '@ferrite-row/levels';
import { signed } from '../../../lib/text';
import type { Figure } from '../results/sheet';
import type { ConversionValues } from './inputs';
import type { ConversionSheet } from './sheet';

const SIGNIFICANT = 4;

export const voltText = (value: number): string => formatQuantity(value, 'V', SIGNIFICANT);

export const dbmText = (dbm: number): string => `${signed(dbm, 2)} dBm`;

/** The rows of the table, the level first. */
function figureRows(figures: LevelFigures): Figure[] {
  return [
    { name: 'Level', figure: dbmText(figures.dbm) },
    { name: 'Power', figure: formatQuantity(figures.watts, 'W', SIGNIFICANT) },
    { name: 'Volts rms', figure: voltText(figures.voltsRms) },
    { name: 'Volts peak', figure: voltText(figures.voltsPeak) },
    { name: 'Volts peak-to-peak', figure: voltText(figures.voltsPeakToPeak) },
    { name: 'Amperes rms', figure: formatQuantity(figures.amperesRms, 'A', SIGNIFICANT) },
    { name: 'Voltage level', figure: `${signed(figures.dbMicrovolt, 2)} dBµV` },
    { name: 'Voltage level', figure: `${signed(figures.dbv, 2)} dBV` },
    { name: 'Voltage level', figure: `${signed(figures.dbu, 2)} dBu` },
  ];
}

/** Every way to tell the level that was typed. */
export function workLevel(values: ConversionValues): ConversionSheet {
  const resistance = ohms(values.resistance, 'resistance');
  const figures = levelFigures(levelFrom(values.from, values[values.from], resistance), resistance);
  const inOhms = formatQuantity(resistance, 'ohm');
  return {
    title: `In ${inOhms}, a sine`,
    heading: 'Every way to say it',
    figures: figureRows(figures),
    marks: [{ db: figures.dbm, words: `${signed(figures.dbm, 1)} dBm`, tone: 'copper' }],
    ohms: resistance,
    cells: [
      { name: `Level in ${inOhms}`, figure: signed(figures.dbm, 2), unit: 'dBm' },
      { name: 'Power', figure: formatQuantity(figures.watts, 'W') },
      {
        name: 'On an oscilloscope',
        figure: formatQuantity(figures.voltsPeakToPeak, 'V'),
        unit: 'p-p',
        words: 'of a sine',
      },
    ],
  };
}
