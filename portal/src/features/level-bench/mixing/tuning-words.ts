import type { Crossover } from '@ferrite-row/levels';
import { counted } from '../../../lib/text';
import { megahertz } from './words';
import type { Mixing } from './work-out';

/** '2·LO and 4·IF': whether they are added or subtracted follows from where they meet. */
export function crossingName({ loMultiple, ifMultiple }: Crossover): string {
  const multiple = (count: number, of: string) => (count === 1 ? of : `${count}·${of}`);
  const parts = [loMultiple > 0 && multiple(loMultiple, 'LO'), ifMultiple > 0 && multiple(ifMultiple, 'IF')];
  return parts.filter(Boolean).join(' and ');
}

/** "With the LO from 22.867 to 23.217 MHz no other product to order 7 falls in the band." */
export function tuningWords({ tuning, values, band }: Mixing): string {
  const { loHertz, settings, troubled, mostAtOnce } = tuning;
  if (!loHertz) return `No LO reaches all of ${band.band} from this IF.`;
  const range = `With the LO from ${megahertz(loHertz[0])} to ${megahertz(loHertz[1])} MHz`;
  if (troubled === 0) return `${range} no other product to order ${values.maxOrder} falls in the band.`;
  const share = Math.max(1, Math.round((100 * troubled) / settings));
  const most = mostAtOnce === 1 ? 'one other product' : `up to ${counted(mostAtOnce, 'other product')}`;
  const fall = mostAtOnce === 1 ? 'falls' : 'fall';
  return `${range} ${most} to order ${values.maxOrder} ${fall} in the band, at ${share} % of the settings.`;
}

/** The same LO and IF as a receiver's. */
export function receiveWords({ tuning: { receive }, wanted }: Mixing): string | undefined {
  if (!receive) return undefined;
  const { imageHertz, halfIfHertz } = receive;
  return `Turned round, as a receiver on ${megahertz(wanted.hertz)} MHz, its image is ${megahertz(imageHertz)} MHz and half the IF away it hears ${megahertz(halfIfHertz)} MHz.`;
}
