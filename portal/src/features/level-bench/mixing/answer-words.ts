import { formatQuantity, type DriveCheck } from '@ferrite-row/levels';
import { capital, counted, fixed, signed } from '../../../lib/text';
import { decibels, megahertz } from './words';
import type { Mixing } from './work-out';

/** "In 14.000 to 14.350 MHz. No other product to order 7 is." */
export function placeWords({ wanted, band, others, values }: Mixing): string {
  const edges = `${megahertz(band.lowHertz)} to ${megahertz(band.highHertz)} MHz`;
  if (wanted.verdict !== 'pass') return `In no amateur band. The nearest is ${band.band}, ${edges}.`;
  const inBand = others.filter(({ place }) => place === 'in the band').length;
  const order = `to order ${values.maxOrder}`;
  if (inBand === 0) return `In ${edges}. No other product ${order} is.`;
  return `In ${edges}. So ${inBand === 1 ? 'is' : 'are'} ${counted(inBand, 'other')} ${order}.`;
}

/** What becomes of the sideband. */
export function sidebandWords({ conversion: { sideband } }: Mixing): string {
  return sideband === 'inverted'
    ? 'Lower at the IF comes out upper on the air.'
    : 'Upper at the IF stays upper on the air.';
}

interface DriveWords {
  /** What to do, set in bold. */
  advice: string;
  /** What comes of it. */
  then: string;
}

export function driveWords({ drive, overDb, pad, deliveredDbm }: DriveCheck): DriveWords {
  if (drive === 'too weak') {
    const then = 'No pad mends that: the ring loses more and bends sooner.';
    return { advice: `${decibels(-overDb)} too weak.`, then };
  }
  if (!pad) return { advice: 'As rated.', then: `Within 1 dB of it.` };
  const gives = `give ${fixed(pad.fitted.lossDb, 2)} dB, ${signed(deliveredDbm, 2)} dBm.`;
  return {
    advice: `Use a ${decibels(overDb)} pad.`,
    then: `Nearest values ${gives}${ratingWords(pad)}`,
  };
}

/** The smallest resistors are taken for granted. */
const USUAL_WATTS = 0.25;

function ratingWords({ resistors }: NonNullable<DriveCheck['pad']>): string {
  const ratings = resistors.flatMap((resistor) => resistor.ratings);
  if (ratings.some(({ ratingWatts }) => ratingWatts === undefined))
    return ' It takes more power than one resistor stands.';
  const most = Math.max(...ratings.map(({ ratingWatts = 0 }) => ratingWatts));
  return most > USUAL_WATTS ? ` Resistors of ${formatQuantity(most, 'W')} or more.` : '';
}

const KILOHM = 1000;

/** Ohms as they stand in a drawing: '18', '17.61', '292', '24.7k'. */
export function ohmsText(ohms: number): string {
  if (ohms >= KILOHM) return `${Number((ohms / KILOHM).toPrecision(3))}k`;
  return String(Number(ohms.toFixed(ohms < 100 ? 2 : 0)));
}

type Pad = NonNullable<DriveCheck['pad']>;

export const padText = ({ resistors }: Pad): string =>
  `${resistors.map(({ ohms }) => ohmsText(ohms)).join(', ')} ohm`;

export const exactText = ({ resistors }: Pad): string =>
  resistors.map(({ exactOhms }) => ohmsText(exactOhms)).join(', ');

/** The whole answer in a sentence, for a screen reader. */
export function spokenAnswer(mixing: Mixing): string {
  const { wanted, conversion, values, drive } = mixing;
  const { advice } = driveWords(drive);
  return [
    `${wanted.name} is ${megahertz(wanted.hertz)} MHz.`,
    `${placeWords(mixing)}`,
    `Sideband ${conversion.sideband}.`,
    `Drive ${signed(values.sourceDbm)} dBm against ${signed(values.ratedDbm)}. ${advice}`,
  ].join(' ');
}

export const sidebandFigure = ({ conversion }: Mixing): string => capital(conversion.sideband);
