import {
  dBm,
  dbmFromVoltsRms,
  formatQuantity,
  loadedLevel,
  ohms,
  voltageLevel,
  volts,
  wattsFromDbm,
} from '@ferrite-row/levels';
import { signed } from '../../../lib/text';
import type { ConversionValues } from './inputs';
import { dbmText, voltText } from './level';
import type { ConversionSheet } from './sheet';

/** What a source gives into a load, and what it would give into its own resistance. */
export function workLoaded(values: ConversionValues): ConversionSheet {
  const { emfVoltsRms, sourceOhms, loadOhms } = values;
  const loaded = loadedLevel({ emfVoltsRms, sourceOhms, loadOhms });
  const available = dbmFromVoltsRms(volts(emfVoltsRms / 2), ohms(sourceOhms));
  const load = formatQuantity(loadOhms, 'ohm');
  return {
    title: `${voltText(emfVoltsRms)} rms behind ${formatQuantity(sourceOhms, 'ohm')}, into ${load}`,
    heading: 'At the load',
    ohms: loadOhms,
    marks: [
      { db: loaded.dbm, words: `in the load ${signed(loaded.dbm, 1)}`, tone: 'copper' },
      { db: available, words: `matched ${signed(available, 1)}`, tone: 'ink' },
    ],
    cells: [
      { name: `Level in ${load}`, figure: signed(loaded.dbm, 2), unit: 'dBm' },
      {
        name: 'Across the load',
        figure: formatQuantity(loaded.voltsRms, 'V'),
        unit: 'rms',
        words: `${formatQuantity(loaded.voltsRms * 2 * Math.SQRT2, 'V')} p-p of a sine`,
      },
      {
        name: 'Against a matched load',
        figure: signed(loaded.mismatchDb, 2),
        unit: 'dB',
        words: `${dbmText(available)} into ${formatQuantity(sourceOhms, 'ohm')}`,
      },
    ],
    figures: [
      { name: 'Level', figure: dbmText(loaded.dbm) },
      { name: 'Power', figure: formatQuantity(wattsFromDbm(dBm(loaded.dbm)), 'W', 4) },
      { name: 'Volts rms', figure: voltText(loaded.voltsRms) },
      { name: 'Volts peak-to-peak', figure: voltText(loaded.voltsRms * 2 * Math.SQRT2) },
      {
        name: 'Open circuit, voltage level',
        figure: `${signed(voltageLevel(volts(emfVoltsRms), 'dBµV'), 2)} dBµV`,
      },
      { name: 'Available from the source', figure: dbmText(available) },
      { name: 'Against a matched load', figure: `${signed(loaded.mismatchDb, 2)} dB` },
    ],
  };
}
