import { bandsOf, IARU_REGION_1, US_97 } from '@ferrite-row/levels';
import { outside } from './field-names';
import type { FilterValues } from './inputs';

/** Where the transmitter works. */
export interface Carrier {
  /** '20 m'; none where the frequencies were typed. */
  band?: string;
  lowHertz: number;
  highHertz: number;
}

/** The US set tells 75 m from 80 m; a filter does not. */
const ALSO: Readonly<Record<string, string>> = { '80 m': '75 m' };

const ITU_REGION = 1;

/** The band as the chosen rule set has it today, or the frequencies typed. */
export function carrierOf(
  values: Pick<FilterValues, 'band' | 'rule' | 'carrierLowHertz' | 'carrierHighHertz'>,
  day = new Date().toISOString().slice(0, 10),
): Carrier {
  const { band, rule } = values;
  if (band === 'other') return typedCarrier(values);
  const bands = rule.startsWith('US') ? bandsOf(US_97, day) : bandsOf(IARU_REGION_1, day, ITU_REGION);
  const spans = bands.filter((one) => one.band === band || one.band === ALSO[band]);
  return {
    band,
    lowHertz: Math.min(...spans.map(({ lowHertz }) => lowHertz)),
    highHertz: Math.max(...spans.map(({ highHertz }) => highHertz)),
  };
}

const LEAST_HERTZ = 1e3;
const GREATEST_HERTZ = 1e9;

function typedCarrier({
  carrierLowHertz: lowHertz,
  carrierHighHertz: highHertz,
}: Pick<FilterValues, 'carrierLowHertz' | 'carrierHighHertz'>): Carrier {
  if (!(lowHertz >= LEAST_HERTZ && lowHertz <= GREATEST_HERTZ)) {
    throw outside('carrierLowHertz', 'Carrier from', lowHertz, '1 kHz to 1 GHz');
  }
  if (!(highHertz >= lowHertz && highHertz < 2 * lowHertz)) {
    throw outside('carrierHighHertz', 'Carrier to', highHertz, 'from the lowest carrier to under twice that');
  }
  return { lowHertz, highHertz };
}
